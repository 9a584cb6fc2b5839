import * as catalogue from '@seamwright/catalogue/contracts';
import { ofHouse, type Row } from '../row';
import { aSpecification } from '../testing/trade';

export const catalogueRows: readonly Row[] = [
  ofHouse(catalogue.searchSpecifications, () => ({ query: { q: 'steak' } })),
  ofHouse(catalogue.getSpecification, ({ steak }) => ({ params: { code: steak.code } })),
  ofHouse(catalogue.getStaffSpecification, ({ steak }) => ({ params: { code: steak.code } })),
  ofHouse(catalogue.listVersions, () => ({})),
  ofHouse(catalogue.withdrawSpecification, async (world) => {
    const params = { code: await aSpecification(world) };
    const { rowVersion } = await world.deed(world.staff.admin, catalogue.getStaffSpecification, { params });
    return { params, body: { reason: 'No longer cut' }, ifMatch: rowVersion };
  }),
  ofHouse(catalogue.getCutTree, () => ({})),
];
