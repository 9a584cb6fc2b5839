import fc from 'fast-check';
import { parseForm } from './form-body';

describe('bracketed form bodies', () => {
  it.each([
    ['', {}],
    ['a=1&b=two+words%21', { a: '1', b: 'two words!' }],
    ['metadata[order_id]=SW-1&metadata[site]=2', { metadata: { order_id: 'SW-1', site: '2' } }],
    ['expand[]=charge&expand[]=customer', { expand: ['charge', 'customer'] }],
    ['expand[1]=b&expand[0]=a', { expand: ['a', 'b'] }],
    ['items[0][price]=1&items[0][n]=2&items[1][price]=3', { items: [{ price: '1', n: '2' }, { price: '3' }] }],
    ['a%5Bb%5D=1', { a: { b: '1' } }],
    ['empty=&bare', { empty: '', bare: '' }],
    ['a=1&a=2', { a: '2' }],
  ])('%s', (text, expected) => {
    expect(parseForm(text)).toEqual(expected);
  });

  it.each(['a[b=1', 'a=%zz', 'a=1&a[b]=2', 'a[b]=1&a=2', '[a]=1', '__proto__[x]=1', `a${'[b]'.repeat(20)}=1`])(
    'refuses %s',
    (text) => {
      expect(() => parseForm(text)).toThrow(expect.objectContaining({ status: 400 }));
    },
  );

  it('gives plain fields back as they were', () => {
    const field = fc.string({ minLength: 1 }).filter((name) => !/[[\]]/.test(name) && name !== '__proto__');
    fc.assert(
      fc.property(fc.dictionary(field, fc.string(), { noNullPrototype: true }), (fields) => {
        expect(parseForm(new URLSearchParams(fields).toString())).toEqual(fields);
      }),
    );
  });
});
