import { getSpecification, searchSpecifications } from '@seamwright/catalogue/contracts';
import { listDeliveryDays } from '@seamwright/ordering/contracts';
import { checkPrices } from '@seamwright/pricing/contracts';
import type { BenchCase } from '../bench';
import { idsIn, readClosures, readCutTree, readPrices, readSites, readVersionsByCode } from './rows';
import { known, type Stage } from './stage';
import { THREE_LINES, type ThreadDays } from './scenario';

const WORD = 'shoulder';
const CODE = 'BF-201';
const DAYS = 10;

/** What a buyer reads before she orders. */
export async function catalogueCases({ api, plain, as }: Stage, days: ThreadDays): Promise<BenchCase[]> {
  const token = () => as('lucian').token;
  const customerId = known(as('lucian').customerId, 'customer');
  const codes = THREE_LINES.map(({ code }) => code);
  const { items } = await api.call(token(), searchSpecifications, { query: { q: WORD } });
  const found = items.map(({ code }) => code);
  const { days: offered } = await api.call(token(), listDeliveryDays, { query: { count: DAYS } });

  return [
    {
      name: searchSpecifications.id,
      size: `${found.length} found`,
      target: 3,
      ours: () => api.call(token(), searchSpecifications, { query: { q: WORD } }),
      floor: () =>
        plain.inTransaction(async () => {
          await plain.query(`select term from search_terms where term like '%' || $1 || '%'`, [WORD]);
          await plain.query(
            `select specification_id, code, ts_rank(lexemes, to_tsquery('simple', $1)) as score
             from specification_search where lexemes @@ to_tsquery('simple', $1) order by score desc, code limit 51`,
            [WORD],
          );
          await readVersionsByCode(plain, found);
          await readCutTree(plain);
          await plain.query(
            `select species, primal_node_id, cut_node_id, bone_states, fat_bands, portion_bands, ageing_kind, pack_types,
               count(*)
             from specification_search where lexemes @@ to_tsquery('simple', $1)
             group by grouping sets ((species), (primal_node_id), (cut_node_id), (bone_states), (fat_bands),
               (portion_bands), (ageing_kind), (pack_types))`,
            [WORD],
          );
        }),
    },
    {
      name: getSpecification.id,
      size: '1 version',
      target: 3,
      ours: () => api.call(token(), getSpecification, { params: { code: CODE } }),
      floor: () =>
        plain.inTransaction(async () => {
          await readVersionsByCode(plain, [CODE]);
          await readCutTree(plain);
        }),
    },
    {
      name: checkPrices.id,
      size: `${THREE_LINES.length} lines`,
      target: 3,
      ours: () => api.call(token(), checkPrices, { body: { deliveryDay: days.placing, lines: [...THREE_LINES] } }),
      floor: () =>
        plain.inTransaction(async () => {
          await plain.query('select * from customers where id = $1', [customerId]);
          const versions = await readVersionsByCode(plain, codes);
          await readPrices(plain, [customerId], idsIn(versions, 'specification_id'));
        }),
    },
    {
      name: listDeliveryDays.id,
      size: `${DAYS} days`,
      target: 3,
      ours: () => api.call(token(), listDeliveryDays, { query: { count: DAYS } }),
      floor: () =>
        plain.inTransaction(async () => {
          await readSites(plain, [customerId]);
          await readClosures(plain);
          await plain.query('select delivery_day, state from cutting_days where delivery_day = any ($1)', [
            offered.map(({ day }) => day),
          ]);
        }),
    },
  ];
}
