import { quoteStages, type QuoteLife } from './quote-seam';

const life = (of: Partial<QuoteLife>): QuoteLife => ({
  state: 'draft',
  createdAt: '2026-12-01T12:00:00.000Z',
  sentAt: null,
  decidedAt: null,
  answerBy: '2026-12-11',
  ...of,
});
const seam = (of: Partial<QuoteLife>) => quoteStages(life(of), 'en-GB').map(({ label, state }) => `${label} ${state}`);

describe('the seam of a quote', () => {
  it('turns solid from writing to the answer', () => {
    expect(seam({})).toEqual(['Written now', 'Sent ahead', 'Answer ahead']);
    const sentAt = '2026-12-02T12:00:00.000Z';
    expect(seam({ state: 'sent', sentAt })).toEqual(['Written passed', 'Sent now', 'Answer ahead']);
    const decidedAt = '2026-12-03T12:00:00.000Z';
    expect(seam({ state: 'declined', sentAt, decidedAt })).toEqual([
      'Written passed',
      'Sent passed',
      'Declined passed',
    ]);
  });

  it('says until when an answer is awaited', () => {
    expect(quoteStages(life({ state: 'sent' }), 'en-GB')[2]?.note).toContain('11 Dec');
  });
});
