import { sql, type RawBuilder } from 'kysely';
import { plainWords } from '@seamwright/catalogue/domain';
import type { Tx } from '@seamwright/shared/server';

/** A word of what was asked. `mistyped` where no text has it, so that what is like it is looked for. */
export interface SearchWord {
  readonly word: string;
  readonly mistyped: boolean;
}

type Condition = RawBuilder<unknown>;

const MOST_WORDS = 8;
/** How alike a word must be to count as mistyped; "shuolder" is like "shoulder" by 0.385, two letters changed over. */
const ALIKE = '0.38';

const pattern = (text: string): string => text.replace(/[\\%_]/g, '\\$&');
const inside = (word: string): string => `%${pattern(word)}%`;

/** The word as the beginning of a lexeme, whatever signs are in it, or its stem. */
const lexemesLike = (word: string): Condition =>
  sql`(${`'${word.replace(/\\/g, '\\\\').replace(/'/g, "''")}':*`}::tsquery || plainto_tsquery('english', ${word}))`;

/** Stands in the text: as a word, as the beginning or stem of one, or inside of one. */
const standsThere = (word: string): Condition => sql`(lexemes @@ ${lexemesLike(word)} or words ilike ${inside(word)})`;

/** Splits what was asked and finds out which words stand nowhere in the catalogue. */
export async function searchWords(tx: Tx, q = ''): Promise<SearchWord[]> {
  const words = plainWords(q).split(' ').filter(Boolean).slice(0, MOST_WORDS);
  if (words.length === 0) return [];
  const known = words.map((word) => sql`exists (select from specification_search where ${standsThere(word)})`);
  const { rows } = await sql<{ known: boolean[] }>`select array[${sql.join(known)}] as known`.execute(tx);
  const found = words.map((word, at) => ({ word, mistyped: !rows[0]?.known[at] }));
  if (found.some(({ mistyped }) => mistyped)) {
    // The operator that the trigram index serves reads its limit from a setting, kept to this transaction.
    await sql`select set_config('pg_trgm.word_similarity_threshold', ${ALIKE}, true)`.execute(tx);
  }
  return found;
}

/** Every word stands in the text, or nearly where it is mistyped. */
export function fits(words: readonly SearchWord[]): Condition {
  if (words.length === 0) return sql`true`;
  return sql.join(
    words.map(({ word, mistyped }) => (mistyped ? sql`${word}::text <% words` : standsThere(word))),
    sql` and `,
  );
}

/**
 * How well the words fit, in whole numbers, so that a page's end can be written into its cursor: code before name before
 * another name before anything else, and a whole word before a part of one.
 */
export function scoreOf(words: readonly SearchWord[]): RawBuilder<number> {
  if (words.length === 0) return sql<number>`0`;
  const each = words.map(({ word, mistyped }) =>
    mistyped
      ? sql`(round(word_similarity(${word}, name) * 1000) + round(word_similarity(${word}, words) * 300))::int`
      : sql`(
          case when code ilike ${`${pattern(word)}%`} then 4000 when name ilike ${inside(word)} then 2000
            when also ilike ${inside(word)} then 1000 else 0 end
          + round(ts_rank('{0.1, 0.2, 0.6, 1}', lexemes, ${lexemesLike(word)}) * 1000)::int
        )`,
  );
  return sql<number>`(${sql.join(each, sql` + `)})`;
}
