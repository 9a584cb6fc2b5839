import { offeredNumbers } from './offered-numbers';
import { SpecificationApiActions, SpecificationPageActions } from './specification.actions';
import { specificationFeature } from './specification.feature';
import { aPublicSpecification } from '@seamwright/catalogue/data-access/testing';

const { reducer } = specificationFeature;
const nothing = reducer(undefined, { type: 'start' });
const opened = reducer(nothing, SpecificationPageActions.opened({ code: 'BF-901' }));
const specification = aPublicSpecification();
const ready = reducer(opened, SpecificationApiActions.loaded({ specification }));
const chose = (state: typeof ready, choice: string, value: string) =>
  reducer(state, SpecificationPageActions.valueChosen({ choice, value }));
const resolvedOf = (state: typeof ready) =>
  specificationFeature.selectResolved.projector(
    specificationFeature.selectOffer.projector(state.specification),
    state.chosen,
  );

describe('the specification that is open', () => {
  it('has nothing resolved until it is loaded', () => {
    expect(opened.specification.status).toBe('loading');
    expect(resolvedOf(opened)).toBeNull();
    expect(resolvedOf(ready)).toMatchObject({ choiceKey: 'finish=plain;trim=6', fatCoverMm: 6 });
  });

  it('applies what is chosen with the function that the server runs', () => {
    expect(resolvedOf(chose(ready, 'trim', '0'))).toMatchObject({ fatCoverMm: 0, priceChangeMinorPerKg: 280 });
  });

  it('keeps what is chosen when the same one is opened again, and drops it for another', () => {
    const chosen = chose(ready, 'trim', '0');
    expect(reducer(chosen, SpecificationPageActions.opened({ code: 'BF-901' })).chosen).toEqual({ trim: '0' });
    const other = reducer(chosen, SpecificationPageActions.opened({ code: 'LM-104' }));
    expect([other.chosen, other.specification.data]).toEqual([{}, null]);
  });

  it('goes back to the usual value of what a newer version no longer offers', () => {
    const chosen = chose(ready, 'trim', '0');
    const without = { ...specification, choices: specification.choices.filter(({ key }) => key !== 'trim') };
    expect(reducer(chosen, SpecificationApiActions.loaded({ specification: without })).chosen).toEqual({});
  });

  it('keeps showing the old when the newer can not be fetched', () => {
    const problem = { type: '', title: '', status: 500, detail: 'x', instance: '', code: 'unexpected', errors: [] };
    const failed = reducer(ready, SpecificationApiActions.loadFailed({ problem }));
    expect(failed.specification).toEqual({ status: 'failed', data: specification, problem });
  });

  it('takes whole grams only from the wire', () => {
    expect(() => offeredNumbers({ ...specification, pieceNominalGrams: 280.5 })).toThrow(RangeError);
  });
});
