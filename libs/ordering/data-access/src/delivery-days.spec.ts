import { minutesLeft } from './delivery-days';

describe('the time left to the cut-off', () => {
  it('is whole minutes by the server’s clock, never rounded up', () => {
    const cutOff = '2026-12-01T14:00:00.000Z';
    const at = (iso: string) => Date.parse(iso);
    expect(minutesLeft(cutOff, at('2026-12-01T13:21:01Z'), 0)).toBe(38);
    expect(minutesLeft(cutOff, at('2026-12-01T13:51:00Z'), -30 * 60_000)).toBe(39);
    expect(minutesLeft(cutOff, at('2026-12-01T14:00:01Z'), 0)).toBe(-1);
  });
});
