import { sql, type RawBuilder } from 'kysely';
import { plainWords } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

/** A word of what was asked, and the catalogue's own words that it may stand for. */
export interface SearchWord {
  /** As typed, or the catalogue's word that is most like it when that stands nowhere. */
  readonly word: string;
  /** Other words of the catalogue: that it is a part of, or that are like it. */
  readonly others: readonly string[];
}

type Condition = RawBuilder<unknown>;

const MOST_WORDS = 8;
/** How many of the catalogue's words one word may stand for. */
const MOST_OTHERS = 40;
const MOST_ALIKE = 4;
/** How alike a word must be to count as mistyped; "shuolder" is like "shoulder" by 0.385, two letters changed over. */
const ALIKE = '0.38';
/** Shorter ones stand inside of too many words; they are looked for at the beginning only. */
const PART_LETTERS = 3;

const pattern = (text: string): string => text.replace(/[\\%_]/g, '\\$&');
const inside = (word: string): string => `%${pattern(word)}%`;
const quoted = (lexeme: string): string => `'${lexeme.replace(/\\/g, '\\\\').replace(/'/g, "''")}'`;

/** A code may be typed without its hyphen. */
const asCode = (word: string): string => word.replace(/^([a-z]{2})(\d{1,3})$/, '$1-$2');

interface KnownTerm {
  readonly at: number;
  readonly term: string;
  readonly alike: boolean;
}

/**
 * Splits what was asked and looks each word up among the words of the catalogue: those it is a part of, else those that it
 * is like. A word with digits is a code or a number, and taken as it is.
 */
export async function searchWords(tx: Tx, q = ''): Promise<SearchWord[]> {
  const words = plainWords(q).split(' ').filter(Boolean).slice(0, MOST_WORDS).map(asCode);
  if (words.length === 0) return [];
  const looked = words.map((word, at) => ({ word, at })).filter(({ word }) => !/\d/.test(word));
  const terms = await termsOf(tx, looked);
  return words.map((word, at) => {
    const own = terms.filter((each) => each.at === at).map(({ term, alike }) => ({ term, alike }));
    const [best] = own;
    const others = own.map(({ term }) => term).filter((term) => best?.alike || !term.startsWith(word));
    return best?.alike ? { word: best.term, others: others.slice(1, MOST_ALIKE) } : { word, others };
  });
}

/** Words of the catalogue that contain a word; where there is none, the most alike first. */
async function termsOf(tx: Tx, looked: readonly { word: string; at: number }[]): Promise<KnownTerm[]> {
  if (looked.length === 0) return [];
  const parts = await lookUp(tx, looked, ({ word, at }) => {
    const like = word.length < PART_LETTERS ? `${pattern(word)}%` : inside(word);
    return sql`(select ${at}::int as at, term, false as alike from search_terms where term like ${like}
      order by length(term), term limit ${MOST_OTHERS})`;
  });
  const unknown = looked.filter(({ at }) => !parts.some((each) => each.at === at));
  if (unknown.length === 0) return parts;
  // The operator that the trigram index serves reads its limit from a setting, kept to this transaction.
  await sql`select set_config('pg_trgm.similarity_threshold', ${ALIKE}, true)`.execute(tx);
  const alike = await lookUp(
    tx,
    unknown,
    ({ word, at }) =>
      sql`(select ${at}::int as at, term, true as alike from search_terms where term % ${word}
        order by similarity(term, ${word}) desc, term limit ${MOST_ALIKE})`,
  );
  return [...parts, ...alike];
}

async function lookUp<Word>(
  tx: Tx,
  words: readonly Word[],
  lookedUp: (word: Word) => RawBuilder<unknown>,
): Promise<KnownTerm[]> {
  const { rows } =
    await sql<KnownTerm>`select * from (${sql.join(words.map(lookedUp), sql` union all `)}) as looked`.execute(tx);
  return rows;
}

/** The word as the beginning of a word, or its stem. */
const asTyped = (word: string): Condition =>
  sql`(${`${quoted(word)}:*`}::tsquery || plainto_tsquery('english', ${word}))`;

/** The word or any that it may stand for. */
const anyOf = ({ word, others }: SearchWord): Condition =>
  others.length === 0 ? asTyped(word) : sql`(${asTyped(word)} || ${others.map(quoted).join(' | ')}::tsquery)`;

/** Every word stands in the text, or one that it may stand for. */
export function fits(words: readonly SearchWord[]): Condition {
  if (words.length === 0) return sql`true`;
  return sql.join(
    words.map((word) => sql`lexemes @@ ${anyOf(word)}`),
    sql` and `,
  );
}

/**
 * How well the words fit, in whole numbers, so that a page's end can be written into its cursor: code before name before
 * another name before anything else, and a whole word before a part of one.
 */
export function scoreOf(words: readonly SearchWord[]): RawBuilder<number> {
  if (words.length === 0) return sql<number>`0`;
  const each = words.map(
    ({ word }) => sql`(
      case when code ilike ${`${pattern(word)}%`} then 4000 when name ilike ${inside(word)} then 2000
        when also ilike ${inside(word)} then 1000 else 0 end
      + round(ts_rank('{0.1, 0.2, 0.6, 1}', lexemes, ${asTyped(word)}) * 1000)::int
    )`,
  );
  return sql<number>`(${sql.join(each, sql` + `)})`;
}
