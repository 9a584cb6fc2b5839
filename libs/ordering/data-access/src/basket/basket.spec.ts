import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store } from '@ngrx/store';
import { sessionFeature, selectPerson } from '@seamwright/identity/data-access';
import { provideMockStore, MockStore } from '@ngrx/store/testing';
import { firstValueFrom, take, toArray } from 'rxjs';
import { BasketActions, BasketStorageActions } from './basket.actions';
import { emptyDraft, type BasketLine } from './basket-draft';
import { basketEffects } from './basket.effects';
import { basketFeature } from './basket.feature';
import { BasketStorage } from './basket-storage';

const steak = (stated: Partial<BasketLine> = {}): Omit<BasketLine, 'id'> => ({
  specificationId: 'spec-1',
  code: 'BF-901',
  name: 'Striploin steak',
  summary: '280 g · 6 mm fat',
  chosen: { trim: '6', portion: '280' },
  quantity: { unit: 'piece', count: 10 },
  whenShort: 'send-what-there-is',
  note: '',
  ...stated,
});
const ANNA = 'anna';

beforeEach(() => localStorage.clear());

describe('the basket', () => {
  let store: Store;
  const draft = () => store.selectSignal(basketFeature.selectDraft)();
  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [provideStore(), provideState(basketFeature)] });
    store = TestBed.inject(Store);
    store.dispatch(BasketStorageActions.restored({ owner: ANNA, draft: emptyDraft('key-of-before') }));
  });

  it('adds the same cut in the same unit together, and keeps other choices apart', () => {
    store.dispatch(BasketActions.lineAdded(steak()));
    store.dispatch(BasketActions.lineAdded(steak({ chosen: { portion: '280', trim: '6' } })));
    store.dispatch(BasketActions.lineAdded(steak({ chosen: { trim: '3', portion: '280' } })));
    store.dispatch(BasketActions.lineAdded(steak({ quantity: { unit: 'kg', grams: 5000, notLess: false } })));
    expect(draft().lines.map(({ quantity }) => quantity)).toEqual([
      { unit: 'piece', count: 20 },
      { unit: 'piece', count: 10 },
      { unit: 'kg', grams: 5000, notLess: false },
    ]);
  });

  it('is another deed after any change, and the same one until then', () => {
    const keys = [draft().key];
    store.dispatch(BasketActions.lineAdded(steak()));
    keys.push(draft().key);
    const [line] = draft().lines;
    store.dispatch(BasketActions.lineChanged(line?.id ?? '', { quantity: { unit: 'piece', count: 12 } }));
    keys.push(draft().key);
    store.dispatch(BasketActions.detailsChanged({ note: 'back door' }));
    keys.push(draft().key);
    expect(new Set(keys).size).toBe(4);
    expect(draft()).toMatchObject({ note: 'back door', lines: [{ quantity: { count: 12 } }] });
  });

  it('puts a line back where it was', () => {
    for (const code of ['A', 'B', 'C']) store.dispatch(BasketActions.lineAdded(steak({ specificationId: code, code })));
    const second = draft().lines[1] as BasketLine;
    store.dispatch(BasketActions.lineRemoved(second.id));
    expect(draft().lines.map(({ code }) => code)).toEqual(['A', 'C']);
    store.dispatch(BasketActions.linePutBack(second, 1));
    expect(draft().lines.map(({ code }) => code)).toEqual(['A', 'B', 'C']);
  });

  it('keeps site and settlement for the next order when it is emptied', () => {
    store.dispatch(BasketActions.lineAdded(steak()));
    store.dispatch(
      BasketActions.detailsChanged({
        siteId: 'site',
        settlement: 'card',
        cardId: 'card',
        note: 'x',
        deliveryDay: '2026-12-03',
      }),
    );
    store.dispatch(BasketActions.emptied());
    expect(draft()).toMatchObject({
      lines: [],
      siteId: 'site',
      settlement: 'card',
      cardId: 'card',
      note: '',
      deliveryDay: null,
    });
  });
});

describe('the device', () => {
  it('gives back what was kept for a person, and only what is a basket', () => {
    const storage = TestBed.inject(BasketStorage);
    const kept = { ...emptyDraft('key-12345'), lines: [{ ...steak(), id: 'line' }] };
    storage.write(ANNA, kept);
    expect(storage.read(ANNA)).toEqual(kept);
    expect(storage.read('ben').lines).toEqual([]);
    localStorage.setItem('seamwright-basket:ben', '{"lines":[{"price":1}]}');
    expect(storage.read('ben').lines).toEqual([]);
    localStorage.setItem('seamwright-basket:ben', 'not JSON');
    expect(storage.read('ben').key).not.toBe('');
  });

  it('keeps the basket through a sign-out and brings it back at the next sign-in', () => {
    TestBed.configureTestingModule({
      providers: [
        provideStore(),
        provideState(sessionFeature),
        provideState(basketFeature),
        provideEffects({ keep: basketEffects.keep }),
      ],
    });
    const store = TestBed.inject(Store);
    const storage = TestBed.inject(BasketStorage);
    store.dispatch(BasketStorageActions.restored({ owner: ANNA, draft: storage.read(ANNA) }));
    store.dispatch(BasketActions.lineAdded(steak()));
    const { key } = storage.read(ANNA);
    store.dispatch(BasketStorageActions.putAway());
    expect(store.selectSignal(basketFeature.selectCount)()).toBe(0);
    expect(storage.read(ANNA)).toMatchObject({ key, lines: [{ code: 'BF-901' }] });
  });

  it('brings the basket of whoever signs in, and what another tab does to it', async () => {
    TestBed.configureTestingModule({ providers: [provideMockStore()] });
    const store = TestBed.inject(MockStore);
    const storage = TestBed.inject(BasketStorage);
    const anna = { id: ANNA } as NonNullable<ReturnType<typeof selectPerson>>;
    store.overrideSelector(selectPerson, anna);
    const told = firstValueFrom(basketEffects.restore(store, storage).pipe(take(2), toArray()));
    storage.write(ANNA, { ...emptyDraft('of-the-other-tab'), note: 'changed there' });
    window.dispatchEvent(new StorageEvent('storage', { key: `seamwright-basket:${ANNA}` }));
    const [first, second] = await told;
    expect(first).toMatchObject({ type: BasketStorageActions.restored.type, owner: ANNA });
    expect(second).toMatchObject({ draft: { key: 'of-the-other-tab', note: 'changed there' } });
    store.overrideSelector(selectPerson, null);
    const [away] = await firstValueFrom(basketEffects.restore(store, storage).pipe(take(1), toArray()));
    expect(away).toEqual(BasketStorageActions.putAway());
  });
});
