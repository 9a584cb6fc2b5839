import type { QuoteDetail, QuoteListItem } from '@seamwright/pricing/contracts';
import type { Problem } from '@seamwright/shared/contracts';
import { NewQuotePageActions, QuoteListPageActions, QuotePageActions, QuotesApiActions } from './quotes.actions';
import { quotesFeature, type QuotesState } from './quotes.feature';

const item = (id: string, of: Partial<QuoteListItem> = {}): QuoteListItem => ({
  id,
  rowVersion: 2,
  number: 201,
  customerId: 'customer',
  customerName: 'Test pub',
  state: 'sent',
  currency: 'GBP',
  pricesFrom: '2026-12-02',
  pricesUntil: '2026-12-31',
  answerBy: '2026-12-11',
  createdAt: '2026-12-01T12:00:00.000Z',
  sentAt: '2026-12-01T12:05:00.000Z',
  decidedAt: null,
  lineCount: 1,
  ...of,
});

const detail = (id: string, of: Partial<QuoteDetail> = {}): QuoteDetail => {
  const { lineCount: _lines, ...head } = item(id);
  return { ...head, notes: '', writtenBy: 'Rae Rep', decidedBy: null, lines: [], ...of };
};

const problem: Problem = {
  type: '/problems/quote-expired',
  title: 'Conflict',
  status: 409,
  detail: 'It expired.',
  instance: '',
  code: 'quote-expired',
  errors: [],
};

const after = (...actions: Parameters<typeof quotesFeature.reducer>[1][]): QuotesState =>
  actions.reduce<QuotesState | undefined>((state, action) => quotesFeature.reducer(state, action), undefined) ??
  quotesFeature.reducer(undefined, { type: 'start' });

describe('the quotes that a screen knows', () => {
  it('grow by a page when more is wanted, and begin anew for another state', () => {
    const first = QuotesApiActions.listLoaded({ items: [item('a')], nextCursor: 'next', first: true });
    const second = QuotesApiActions.listLoaded({ items: [item('b')], nextCursor: null, first: false });
    const opened = QuoteListPageActions.opened({ state: null });
    const both = after(opened, first, QuoteListPageActions.moreWanted(), second);
    expect(both.list.data?.map(({ id }) => id)).toEqual(['a', 'b']);
    expect(both.nextCursor).toBeNull();

    const other = quotesFeature.reducer(both, QuoteListPageActions.opened({ state: 'sent' }));
    expect(other.list).toMatchObject({ status: 'loading', data: null });
    const again = quotesFeature.reducer(both, opened);
    expect(again.list).toMatchObject({ status: 'loading', data: both.list.data });
  });

  it('show a deed in the open quote and in the list', () => {
    const state = after(
      QuotesApiActions.listLoaded({ items: [item('a'), item('b')], nextCursor: null, first: true }),
      QuotePageActions.opened({ quoteId: 'a' }),
      QuotesApiActions.loaded({ quote: detail('a') }),
      QuotePageActions.deedPressed({ deed: 'accept', quoteId: 'a', rowVersion: 2 }),
      QuotesApiActions.deedDone({ deed: 'accept', quote: detail('a', { state: 'accepted', rowVersion: 3 }) }),
    );
    expect(state.quote.data).toMatchObject({ state: 'accepted', rowVersion: 3 });
    expect(state.list.data?.map((each) => [each.id, each.state])).toEqual([
      ['a', 'accepted'],
      ['b', 'sent'],
    ]);
    expect(state.deed).toEqual({ running: false, problem: null });
  });

  it('keep the quote on screen when a deed is refused, and forget the refusal with another quote', () => {
    const refused = after(
      QuotePageActions.opened({ quoteId: 'a' }),
      QuotesApiActions.loaded({ quote: detail('a') }),
      QuotePageActions.deedPressed({ deed: 'accept', quoteId: 'a', rowVersion: 2 }),
      QuotesApiActions.deedFailed({ problem }),
    );
    expect(refused.quote.data?.id).toBe('a');
    expect(refused.deed).toEqual({ running: false, problem });
    const other = quotesFeature.reducer(refused, QuotePageActions.opened({ quoteId: 'b' }));
    expect(other.deed.problem).toBeNull();
    expect(other.quote.data).toBeNull();
  });

  it('do not put a late answer for another quote on the page', () => {
    const state = after(QuotePageActions.opened({ quoteId: 'b' }), QuotesApiActions.loaded({ quote: detail('a') }));
    expect(state.quote.data).toBeNull();
  });

  it('tell how saving went, until the form is opened again', () => {
    const failed = after(QuotesApiActions.saveFailed({ problem }));
    expect(failed.saving.problem).toBe(problem);
    expect(quotesFeature.reducer(failed, NewQuotePageActions.opened()).saving.problem).toBeNull();
    const saved = quotesFeature.reducer(failed, QuotesApiActions.saved({ quote: detail('c', { state: 'draft' }) }));
    expect(saved).toMatchObject({ quoteId: 'c', saving: { running: false, problem: null } });
  });
});
