import type { CutNode } from '@seamwright/catalogue/domain';
import { inTransaction, system, type Database } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { addCutNodes } from '../../src';

export interface TestTree {
  readonly beefId: string;
  readonly striploinId: string;
  readonly steakId: string;
  readonly lambId: string;
  readonly shoulderId: string;
  readonly rolledShoulderId: string;
}

/** A small cut tree: beef → Striploin → Striploin steak, lamb → Shoulder → Rolled shoulder. */
export async function addTestTree(database: Database): Promise<TestTree> {
  const [beefId, striploinId, steakId] = [newId(), newId(), newId()];
  const [lambId, shoulderId, rolledShoulderId] = [newId(), newId(), newId()];
  await inTransaction(database, system('seed'), (tx) =>
    addCutNodes(tx, [
      node(lambId, null, 'lamb', 'species', 'Lamb', 1),
      node(shoulderId, lambId, 'lamb', 'primal', 'Shoulder', 1),
      node(rolledShoulderId, shoulderId, 'lamb', 'cut', 'Rolled shoulder', 1),
      node(beefId, null, 'beef', 'species', 'Beef', 2),
      node(striploinId, beefId, 'beef', 'primal', 'Striploin', 1),
      node(steakId, striploinId, 'beef', 'cut', 'Striploin steak', 1),
    ]),
  );
  return { beefId, striploinId, steakId, lambId, shoulderId, rolledShoulderId };
}

function node(
  id: string,
  parentId: string | null,
  species: CutNode['species'],
  level: CutNode['level'],
  name: string,
  sort: number,
): CutNode {
  return { id, parentId, species, level, name, uneceItem: null, uneceItemSeen: false, region: null, sort };
}
