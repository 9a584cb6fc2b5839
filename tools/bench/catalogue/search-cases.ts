import { searchSpecifications } from '@seamwright/catalogue/contracts';
import type { CallInput } from '@seamwright/shared/contracts';
import type { BenchCase } from '../bench';
import type { CatalogueStage } from './catalogue-stage';
import { sayAgain } from './said-sql';

type Query = NonNullable<CallInput<typeof searchSpecifications>['query']>;

const SEARCHES: readonly (readonly [name: string, query: Query])[] = [
  ['three filters', { species: 'beef', boneState: 'boneless', fat: 'to-6' }],
  ['a word and two filters', { q: 'steak', species: 'beef', portionFrom: 150, portionTo: 300 }],
  ['a mistyped word and two filters', { q: 'shuolder', species: 'lamb', pack: 'vacuum' }],
  ['nothing but the first page', {}],
];

const AS_SQL = 1.5;
const MOST_MS = 50;

/** A page of 50 with the counts of every filter, over HTTP; beside it the very statements that it sends, by `pg` alone. */
export async function searchCases({ api, plain, listened, token }: CatalogueStage): Promise<BenchCase[]> {
  const cases: BenchCase[] = [];
  for (const [name, query] of SEARCHES) {
    const ours = () => api.call(token(), searchSpecifications, { query });
    const { counts } = await ours();
    const size = `${counts.species.reduce((sum, { count }) => sum + count, 0)} counted by species`;
    const said = await listened.saidBy(ours);
    const floor = () => sayAgain(plain, said);
    cases.push({ name: `search: ${name}`, size, target: AS_SQL, by: 'p95', ours, floor });
    cases.push({ name: `search: ${name}, under ${MOST_MS} ms`, size, limitMs: MOST_MS, ours });
  }
  return cases;
}
