import { stateTable } from './state-table';

type State = 'draft' | 'sent' | 'accepted';
type Move = 'send' | 'accept' | 'withdraw';

describe('a state table', () => {
  const quote = stateTable<State, Move>({
    draft: { send: 'sent' },
    sent: { accept: 'accepted', withdraw: 'draft' },
    accepted: {},
  });

  it('leads from state to state by the moves it holds', () => {
    expect(quote.next('draft', 'send')).toEqual({ ok: true, value: 'sent' });
    expect(quote.next('sent', 'withdraw')).toEqual({ ok: true, value: 'draft' });
  });

  it('refuses every other move', () => {
    expect(quote.next('draft', 'accept')).toEqual({
      ok: false,
      refusal: { code: 'move-not-allowed', params: { from: 'draft', move: 'accept' } },
    });
    expect(quote.next('accepted', 'toString' as Move).ok).toBe(false);
  });

  it('lists the moves that a state allows', () => {
    expect(quote.allowedMoves('sent')).toEqual(['accept', 'withdraw']);
    expect(quote.allowedMoves('accepted')).toEqual([]);
  });
});
