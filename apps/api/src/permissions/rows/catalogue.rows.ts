import * as catalogue from '@seamwright/catalogue/contracts';
import { ofHouse, type Row } from '../row';
import { aReviewedVersion, aSpecification, aSpecificationDraft } from '../testing/trade';
import type { World } from '../testing/world';

const aSynonym = (world: World) => ({
  nodeId: world.tree.striploinId,
  specificationId: null,
  term: `Sirloin ${world.next()}`,
  region: 'England',
});

const aUneceValue = (world: World) => ({
  field: 'item' as const,
  value: String(7_000 + world.next()),
  meaning: 'Head meat',
  species: null,
  source: null,
});

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
  ofHouse(catalogue.listSynonyms, () => ({ query: { q: 'sirloin' } })),
  ofHouse(catalogue.addSynonym, (world) => ({ body: aSynonym(world) })),
  ofHouse(catalogue.removeSynonym, async (world) => {
    const { id } = await world.deed(world.staff.technical, catalogue.addSynonym, { body: aSynonym(world) });
    return { params: { id } };
  }),
  ofHouse(catalogue.listUneceValues, () => ({ query: { field: 'packing' as const } })),
  ofHouse(catalogue.addUneceValue, (world) => ({ body: aUneceValue(world) })),
  ofHouse(catalogue.correctUneceValue, async (world) => {
    const { id, rowVersion } = await world.deed(world.staff.admin, catalogue.addUneceValue, {
      body: aUneceValue(world),
    });
    return { params: { id }, body: { meaning: 'Cheek', source: 'Standard, chapter 5' }, ifMatch: rowVersion };
  }),
  ofHouse(catalogue.readUnece, () => ({ query: { code: '40499000110000030050' } })),
  ofHouse(catalogue.listDrafts, () => ({})),
  ofHouse(catalogue.openSpecification, ({ tree, next }) => ({
    body: { code: `LM-${100 + next()}`, cutNodeId: tree.rolledShoulderId, name: 'Rolled shoulder' },
  })),
  ofHouse(catalogue.openDraft, async (world) => ({ params: { code: await aSpecification(world) } })),
  ofHouse(catalogue.getDraft, async (world) => ({ params: { code: (await aSpecificationDraft(world)).code } })),
  ofHouse(catalogue.saveDraft, async (world) => {
    const { code, rowVersion, content } = await aSpecificationDraft(world);
    return { params: { code }, body: { content: { ...content, fatCoverMm: 9 } }, ifMatch: rowVersion };
  }),
  ofHouse(catalogue.discardDraft, async (world) => {
    const { code, rowVersion } = await aSpecificationDraft(world);
    return { params: { code }, ifMatch: rowVersion };
  }),
  ofHouse(catalogue.submitDraft, async (world) => {
    const { code, rowVersion } = await aSpecificationDraft(world);
    return { params: { code }, ifMatch: rowVersion };
  }),
  ofHouse(catalogue.approveReviewed, aReviewedVersion),
  ofHouse(catalogue.sendBackReviewed, async (world) => ({
    ...(await aReviewedVersion(world)),
    body: { reason: 'Say where the cut ends.' },
  })),
  ofHouse(catalogue.listComments, ({ steak }) => ({ params: { code: steak.code } })),
  ofHouse(catalogue.addComment, ({ steak }) => ({
    params: { code: steak.code },
    body: { version: 1, pointer: '/cuttingLines', body: 'At which rib?' },
  })),
];
