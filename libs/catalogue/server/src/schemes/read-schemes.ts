import * as z from 'zod';
import type { SchemeRecord, SchemeRow } from '@seamwright/catalogue/contracts';
import {
  addedPpm,
  blendLean,
  leanWithin,
  recipeShares,
  schemeLossPpm,
  shareInPpm,
  type CutNode,
  type SchemeContent,
} from '@seamwright/catalogue/domain';
import { sayRefusal } from '@seamwright/shared/contracts';
import { notFound, pageFrom, readCursor, type Tx } from '@seamwright/shared/server';
import { fraction, type Fraction } from '@seamwright/shared/util';
import { cutNodes } from '../cut-nodes.repository';
import { namesOf } from '../specifications.repository';
import { countTests } from '../yields/cutting-tests.repository';
import { schemeFaults } from './scheme-faults';
import { newestSchemes, schemeVersions, type SchemeVersion } from './schemes.repository';

/** A version as staff see it: the one asked for, else the newest. Throws `not-found`. */
export async function readScheme(tx: Tx, code: string, asked?: number): Promise<SchemeRecord> {
  const versions = await schemeVersions(tx, code);
  const version = asked === undefined ? versions[0] : versions.find((each) => each.version === asked);
  if (!version) throw notFound();
  const { content } = version;
  const nodes = await cutNodes(tx);
  const names = await namesOf(tx, [version.authoredBy, ...(version.approvedBy === null ? [] : [version.approvedBy])]);
  const faults = version.state === 'approved' ? [] : await schemeFaults(tx, code, content);
  return {
    schemeId: version.schemeId,
    versionId: version.id,
    code,
    species: version.species,
    rowVersion: version.rowVersion,
    version: version.version,
    state: version.state,
    standing: version.standing,
    content: contentWire(content),
    nodeNames: nodeNames(content, nodes),
    addedPpm: addedPpm(content),
    lossPpm: schemeLossPpm(content),
    lean: leanOf(content),
    recipe: recipeOf(content),
    faults: faults.map((fault) => ({ code: fault.code, pointer: fault.pointer ?? '', message: sayRefusal(fault) })),
    authorName: names.get(version.authoredBy) ?? '',
    approverName: version.approvedBy === null ? null : (names.get(version.approvedBy) ?? ''),
    approvedAt: version.approvedAt?.toISOString() ?? null,
    tests: await countTests(tx, version.schemeId),
    versions: versions.map((each) => ({
      version: each.version,
      state: each.state,
      standing: each.standing,
      since: each.since?.toISOString() ?? null,
      reason: each.reason,
    })),
  };
}

/** A page of the list. */
export async function listNewestSchemes(
  tx: Tx,
  query: {
    readonly cursor?: string | undefined;
    readonly limit: number;
    readonly q?: string | undefined;
    readonly inputNodeId?: string | undefined;
  },
): Promise<{ items: SchemeRow[]; nextCursor: string | null }> {
  const { cursor, limit, q, inputNodeId } = query;
  const nodes = await cutNodes(tx);
  const after = cursor ? readCursor(cursor, z.tuple([z.string()]))[0] : null;
  const rows = await newestSchemes(tx, { q, inputNodeId, after, limit: limit + 1 });
  return pageFrom(
    rows,
    limit,
    ({ code }) => [code],
    (row) => presentRow(row, nodes),
  );
}

const presentRow = (
  { code, species, version, state, standing, content }: SchemeVersion,
  nodes: ReadonlyMap<string, CutNode>,
): SchemeRow => ({
  code,
  name: content.name,
  kind: content.kind,
  species,
  inputNodeId: content.inputNodeId,
  inputName: nodes.get(content.inputNodeId)?.name ?? '',
  outputs: content.outputs.length,
  lossPpm: schemeLossPpm(content),
  version,
  state,
  standing,
});

const contentWire = ({ outputs, ingredients, blend, ...rest }: SchemeContent): SchemeRecord['content'] => ({
  ...rest,
  outputs: outputs.map((output) => ({ ...output })),
  ingredients: ingredients.map(({ allergens, ...each }) => ({ ...each, allergens: [...allergens] })),
  blend: blend && { ...blend, parts: blend.parts.map((part) => ({ ...part })) },
});

function nodeNames({ inputNodeId, outputs }: SchemeContent, nodes: ReadonlyMap<string, CutNode>) {
  const ids = [inputNodeId, ...outputs.flatMap(({ nodeId }) => (nodeId === null ? [] : [nodeId]))];
  return Object.fromEntries(ids.flatMap((id) => (nodes.has(id) ? [[id, nodes.get(id)?.name ?? '']] : [])));
}

function leanOf({ blend }: SchemeContent): SchemeRecord['lean'] {
  const parts = (blend?.parts ?? []).filter(({ sharePpm }) => sharePpm > 0);
  if (!blend || parts.length === 0) return null;
  const lean = blendLean(parts.map(({ sharePpm, ...part }) => ({ ...part, weight: sharePpm })));
  const asPpm = (value: Fraction): number => shareInPpm(fraction(value.n, value.d * 100n));
  return {
    statedPpm: asPpm(lean.stated),
    leastPpm: asPpm(lean.least),
    mostPpm: asPpm(lean.most),
    within: leanWithin(blend, lean),
  };
}

function recipeOf({ kind, ingredients }: SchemeContent): SchemeRecord['recipe'] {
  if (kind !== 'recipe' || ingredients.some(({ ppmOfInput }) => ppmOfInput < 0)) return [];
  return recipeShares(ingredients).ingredients.map((each) => ({ ...each }));
}
