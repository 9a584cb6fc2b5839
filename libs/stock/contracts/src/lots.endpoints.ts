import * as z from 'zod';
import {
  defineEndpoint,
  gramsWire,
  id,
  line,
  pageOf,
  pageQuery,
  plantDay,
  rowVersion,
  staffOnly,
} from '@seamwright/shared/contracts';

const lotState = z.enum(['received', 'on-hold', 'released', 'used-up', 'recalled']);
const country = z
  .string()
  .regex(/^[A-Z]{2}$/)
  .meta({ description: 'ISO 3166-1 alpha-2 code' });
const pieces = z.int().min(1).max(100_000);

const origin = z.strictObject({
  bornIn: country,
  rearedIn: country,
  slaughteredIn: country,
  slaughterhouse: line(40).meta({ description: 'Approval number of the slaughterhouse' }),
});

const lot = z.strictObject({
  id,
  rowVersion,
  code: z.string(),
  nodeId: id,
  nodeName: z.string(),
  supplier: z.string(),
  killDate: plantDay,
  receivedOn: plantDay,
  useBy: plantDay.nullable(),
  receivedGrams: gramsWire,
  receivedPieces: pieces,
  remainingGrams: gramsWire.meta({ description: 'Received less what packing has used, by simple yield' }),
  state: lotState,
  holdReason: z.string().nullable(),
  origin,
});
export type LotWire = z.infer<typeof lot>;

export const listLots = defineEndpoint({
  id: 'lots.list',
  summary: 'Lots, first expired first',
  method: 'GET',
  path: '/lots',
  access: staffOnly('planner', 'technical', 'floor'),
  query: { ...pageQuery, state: lotState.optional(), nodeId: id.optional() },
  response: pageOf(lot),
});

export const getLot = defineEndpoint({
  id: 'lots.get',
  summary: 'One lot',
  method: 'GET',
  path: '/lots/:id',
  access: staffOnly('planner', 'technical', 'floor'),
  params: { id },
  response: lot,
});

export const receiveLot = defineEndpoint({
  id: 'lots.receive',
  summary: 'Books pieces of a primal in; they wait until they are released',
  method: 'POST',
  path: '/lots',
  access: staffOnly('planner', 'technical'),
  idempotent: true,
  status: 201,
  body: z.strictObject({
    code: z
      .string()
      .trim()
      .regex(/^[A-Z0-9][A-Z0-9-]{1,19}$/)
      .meta({ description: 'Capitals, digits and hyphens, at most 20: it stands on the label' }),
    nodeId: id,
    supplier: line(120),
    killDate: plantDay,
    receivedOn: plantDay,
    useBy: plantDay.nullable(),
    receivedGrams: z.int().min(1).max(100_000_000),
    receivedPieces: pieces,
    origin,
  }),
  response: lot,
});

export const holdLot = defineEndpoint({
  id: 'lots.hold',
  summary: 'Puts a lot on hold: nothing more is cut or packed from it',
  method: 'POST',
  path: '/lots/:id/hold',
  access: staffOnly('planner', 'technical'),
  guarded: true,
  params: { id },
  body: z.strictObject({ reason: line(300) }),
  response: lot,
});

export const releaseLot = defineEndpoint({
  id: 'lots.release',
  summary: 'Releases a lot for cutting',
  method: 'POST',
  path: '/lots/:id/release',
  access: staffOnly('planner', 'technical'),
  guarded: true,
  params: { id },
  response: lot,
});

export const listLotNodes = defineEndpoint({
  id: 'lots.list-primals',
  summary: 'What a lot can be booked in as: primals and sub-primals of the cut tree',
  method: 'GET',
  path: '/lot-primals',
  access: staffOnly('planner', 'technical', 'floor'),
  response: z.strictObject({
    items: z.array(z.strictObject({ id, name: z.string(), species: z.enum(['lamb', 'beef', 'pork']) })),
  }),
});
