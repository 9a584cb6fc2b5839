import { ok, refuse, RefusalError, unwrap } from './result';

describe('a result', () => {
  it('gives its value', () => {
    expect(unwrap(ok(12_480))).toBe(12_480);
  });

  it('names a refusal by code, values and field', () => {
    expect(refuse('stock-too-low')).toEqual({ ok: false, refusal: { code: 'stock-too-low', params: {} } });
    expect(refuse('stock-too-low', { grams: 500 }, '/lines/0')).toStrictEqual({
      ok: false,
      refusal: { code: 'stock-too-low', params: { grams: 500 }, pointer: '/lines/0' },
    });
  });

  it('throws its refusal when it is unwrapped', () => {
    const refused = refuse('stock-too-low', { grams: 500 });
    const thrown = (): unknown => {
      try {
        return unwrap(refused);
      } catch (error) {
        return error;
      }
    };
    expect(thrown()).toBeInstanceOf(RefusalError);
    expect(thrown()).toMatchObject({ name: 'RefusalError', refusal: refused.refusal });
  });
});
