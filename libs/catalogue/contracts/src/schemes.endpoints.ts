import * as z from 'zod';
import { defineEndpoint, id, line, pageOf, pageQuery, staffOnly } from '@seamwright/shared/contracts';
import { cutOutAnswer, schemeCode, schemeContent, schemeRecord, schemeRow } from './cutting.wire';

const staff = staffOnly('technical', 'rep', 'planner', 'admin');
const technical = staffOnly('technical');

export const listSchemes = defineEndpoint({
  id: 'cutting-schemes.list',
  summary: 'The newest version of every cutting scheme, wherever it stands',
  method: 'GET',
  path: '/cutting-schemes',
  access: staff,
  query: { ...pageQuery, q: z.string().trim().max(100).optional(), inputNodeId: id.optional() },
  response: pageOf(schemeRow),
});

export const getScheme = defineEndpoint({
  id: 'cutting-schemes.get',
  summary: 'A version of a cutting scheme with its loss and faults, and the list of its versions',
  method: 'GET',
  path: '/cutting-schemes/:code',
  access: staff,
  params: { code: schemeCode },
  query: { version: z.int().positive().max(2_147_483_647).optional() },
  response: schemeRecord,
});

export const createScheme = defineEndpoint({
  id: 'cutting-schemes.create',
  summary: 'Opens a cutting scheme under its code, with a first draft',
  method: 'POST',
  path: '/cutting-schemes',
  access: technical,
  body: z.strictObject({ code: schemeCode, content: schemeContent }),
  response: schemeRecord,
  status: 201,
  idempotent: true,
});

export const saveSchemeDraft = defineEndpoint({
  id: 'cutting-schemes.save',
  summary: 'Keeps what its author typed; where the newest version is approved, a next one is begun',
  method: 'PUT',
  path: '/cutting-schemes/:code/draft',
  access: technical,
  params: { code: schemeCode },
  body: schemeContent,
  response: schemeRecord,
  guarded: true,
});

export const moveScheme = defineEndpoint({
  id: 'cutting-schemes.move',
  summary: 'Submits, sends back, approves or withdraws a scheme; the last and sending back need a reason',
  method: 'POST',
  path: '/cutting-schemes/:code/moves',
  access: technical,
  params: { code: schemeCode },
  body: z.strictObject({
    move: z.enum(['submit', 'send-back', 'approve', 'withdraw']),
    reason: line(300).optional(),
  }),
  response: schemeRecord,
  guarded: true,
});

export const getCutOut = defineEndpoint({
  id: 'cut-outs.get',
  summary: 'A piece of a node broken down through the schemes in force, to the end',
  method: 'GET',
  path: '/cut-outs/:nodeId',
  access: staff,
  params: { nodeId: id },
  query: {
    grams: z.int().min(1).max(100_000_000).default(100_000),
    through: z
      .string()
      .max(1_000)
      .regex(/^[A-Z]{2}-\d{3}(,[A-Z]{2}-\d{3})*$/)
      .optional()
      .meta({ description: 'Codes of schemes and specifications to go through; else the first scheme of each node' }),
  },
  response: cutOutAnswer,
});
