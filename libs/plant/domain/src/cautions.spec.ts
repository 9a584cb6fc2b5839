import { cautionsOf } from './index';

it('warns of what the work of the day uses', () => {
  const at = (...stations: ('band-saw' | 'boning' | 'packing')[]) =>
    cautionsOf(stations.map((station) => ({ station, seconds: 60 })));
  expect(at('packing')).toEqual([]);
  expect(at('packing', 'band-saw')).toEqual(['band-saw']);
  expect(at('band-saw', 'boning')).toEqual(['knives', 'band-saw']);
});
