import { readWish } from './options';

const known = ['thread', 'optimiser'];

it('runs every bench when none is named', () => {
  expect(readWish([], known)).toEqual({ names: known, json: false, turns: 20 });
});

it('takes names, the form of the answer and the number of turns', () => {
  expect(readWish(['thread', '--json', '--turns=5'], known)).toEqual({ names: ['thread'], json: true, turns: 5 });
});

it.each(['treads', '--turns=0', '--turns=1000', '--quick'])('says how it is used for %s', (word) => {
  expect(() => readWish([word], known)).toThrow('Usage: npm run bench -- [thread|optimiser …]');
});
