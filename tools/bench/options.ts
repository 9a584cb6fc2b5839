export interface Wish {
  readonly names: readonly string[];
  readonly json: boolean;
  /** Timed turns of each case. */
  readonly turns: number;
}

const DEFAULT_TURNS = 20;

/**
 * Reads the words of the command line.
 * @throws Error that says how it is used
 */
export function readWish(words: readonly string[], known: readonly string[]): Wish {
  const names: string[] = [];
  let json = false;
  let turns = DEFAULT_TURNS;
  for (const word of words) {
    const [, count] = /^--turns=([1-9]\d{0,2})$/.exec(word) ?? [];
    if (word === '--json') json = true;
    else if (count) turns = Number(count);
    else if (known.includes(word)) names.push(word);
    else
      throw new Error(`"${word}" is not known. Usage: npm run bench -- [${known.join('|')} …] [--json] [--turns=20]`);
  }
  return { names: names.length > 0 ? names : known, json, turns };
}
