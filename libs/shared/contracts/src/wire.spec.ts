import fc from 'fast-check';
import { line, note } from './wire';

const C0 = Array.from({ length: 32 }, (_, code) => String.fromCharCode(code));
const taken = (schema: ReturnType<typeof line>, text: string): boolean => schema.safeParse(text).success;

describe('a line of text', () => {
  it('is trimmed, and is not empty or too long', () => {
    expect(line(5).parse('  lamb\n')).toBe('lamb');
    expect(['', '  ', 'mutton'].map((text) => taken(line(5), text))).toEqual([false, false, false]);
  });

  it('has no control character within it', () => {
    expect([...C0, '\u007f', '\u0085'].filter((control) => taken(line(), `rolled${control}shoulder`))).toEqual([]);
  });

  it('takes whatever else people write', () => {
    const written = ['Côte de bœuf', '羊肩', 'עגל', '½ side, 6 mm', '🐑 x 3', 'a\u00a0b'];
    expect(written.filter((text) => !taken(line(), text))).toEqual([]);
    fc.assert(fc.property(fc.stringMatching(/^[\p{L}\p{N}\p{P}\p{S}]{1,40}$/u), (text) => taken(line(), text)));
  });
});

describe('a note', () => {
  it('may be empty, and keeps its line breaks and tabs', () => {
    expect(note().parse(' ring\tfirst\nthen wait ')).toBe('ring\tfirst\nthen wait');
    expect(note().parse('')).toBe('');
  });

  it('has no other control character', () => {
    expect(C0.filter((control) => taken(note(), `ring${control}first`))).toEqual(['\t', '\n']);
  });
});
