import { TestBed } from '@angular/core/testing';
import { provideEffects } from '@ngrx/effects';
import { provideState, provideStore, Store, type Action } from '@ngrx/store';
import { sessionFeature, selectPerson } from '@seamwright/identity/data-access/session';
import { provideMockStore, MockStore } from '@ngrx/store/testing';
import { firstValueFrom, take, toArray, type Observable } from 'rxjs';
import { BasketActions, BasketStorageActions } from './basket.actions';
import { emptyDraft, type BasketLine } from './basket-draft';
import { basketEffects } from './basket.effects';
import { basketFeature } from './basket.feature';
import { basketRestored } from './basket.guards';
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

async function until(met: () => boolean): Promise<void> {
  while (!met()) await new Promise((resolve) => setTimeout(resolve));
}

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
  it('gives back what was kept for a person, and only what is a basket', async () => {
    const storage = TestBed.inject(BasketStorage);
    const kept = { ...emptyDraft('key-12345'), lines: [{ ...steak(), id: 'line' }] };
    storage.write(ANNA, kept);
    expect(await storage.read(ANNA)).toEqual(kept);
    expect((await storage.read('ben')).lines).toEqual([]);
    localStorage.setItem('seamwright-basket:ben', '{"lines":[{"price":1}]}');
    expect((await storage.read('ben')).lines).toEqual([]);
    localStorage.setItem('seamwright-basket:ben', 'not JSON');
    const { key, lines } = await storage.read('ben');
    expect([key === '', lines]).toEqual([false, []]);
  });

  it('keeps the basket through a sign-out and brings it back at the next sign-in', async () => {
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
    store.dispatch(BasketStorageActions.restored({ owner: ANNA, draft: await storage.read(ANNA) }));
    store.dispatch(BasketActions.lineAdded(steak()));
    const { key } = await storage.read(ANNA);
    store.dispatch(BasketStorageActions.putAway());
    expect(store.selectSignal(basketFeature.selectCount)()).toBe(0);
    expect(await storage.read(ANNA)).toMatchObject({ key, lines: [{ code: 'BF-901' }] });
  });

  it('brings the basket of whoever signs in, and what another tab does to it', async () => {
    TestBed.configureTestingModule({ providers: [provideMockStore()] });
    const store = TestBed.inject(MockStore);
    const storage = TestBed.inject(BasketStorage);
    const anna = { id: ANNA } as NonNullable<ReturnType<typeof selectPerson>>;
    store.overrideSelector(selectPerson, anna);
    const told: Action[] = [];
    const telling = basketEffects.restore(store, storage).subscribe((action) => told.push(action));
    await until(() => told.length === 1);
    storage.write(ANNA, { ...emptyDraft('of-the-other-tab'), note: 'changed there' });
    window.dispatchEvent(new StorageEvent('storage', { key: `seamwright-basket:${ANNA}` }));
    await until(() => told.length === 2);
    telling.unsubscribe();
    const [first, second] = told;
    expect(first).toMatchObject({ type: BasketStorageActions.restored.type, owner: ANNA });
    expect(second).toMatchObject({ draft: { key: 'of-the-other-tab', note: 'changed there' } });
    store.overrideSelector(selectPerson, null);
    const [away] = await firstValueFrom(basketEffects.restore(store, storage).pipe(take(1), toArray()));
    expect(away).toEqual(BasketStorageActions.putAway());
  });

  it('is asked again when a basket could not be read, and gives nobody an empty one meanwhile', async () => {
    jest.useFakeTimers();
    try {
      TestBed.configureTestingModule({ providers: [provideMockStore()] });
      const store = TestBed.inject(MockStore);
      store.overrideSelector(selectPerson, { id: ANNA } as NonNullable<ReturnType<typeof selectPerson>>);
      const storage = TestBed.inject(BasketStorage);
      const draft = emptyDraft('key-12345');
      jest.spyOn(storage, 'read').mockRejectedValueOnce(new Error('not loaded')).mockResolvedValue(draft);
      const told: Action[] = [];
      const telling = basketEffects.restore(store, storage).subscribe((action) => told.push(action));
      await jest.advanceTimersByTimeAsync(2_000);
      expect(told).toEqual([]);
      await jest.advanceTimersByTimeAsync(2_000);
      expect(told).toEqual([BasketStorageActions.restored({ owner: ANNA, draft })]);
      telling.unsubscribe();
    } finally {
      jest.useRealTimers();
    }
  });
});

describe('a page that shows the basket', () => {
  it('opens once the basket is back', () => {
    TestBed.configureTestingModule({ providers: [provideStore(), provideState(basketFeature)] });
    const opened: unknown[] = [];
    TestBed.runInInjectionContext(() => basketRestored({} as never, {} as never) as Observable<unknown>).subscribe(
      (may) => opened.push(may),
    );
    expect(opened).toEqual([]);
    TestBed.inject(Store).dispatch(BasketStorageActions.restored({ owner: ANNA, draft: emptyDraft('key-12345') }));
    expect(opened).toEqual([true]);
  });
});
