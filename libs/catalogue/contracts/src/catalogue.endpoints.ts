import * as z from 'zod';
import { defineEndpoint, line, pageOf, pageQuery, ROLES, staffOnly, type Access } from '@seamwright/shared/contracts';
import { code } from './code';
import { cutNodeWire, publicSpecification, specificationRow, staffSpecification } from './specification.wire';

/** The catalogue is the same for everybody who is signed in. */
const signedIn: Access = { who: 'roles', roles: ROLES, customer: 'none' };
const words = z.string().trim().max(100);

export const getSpecification = defineEndpoint({
  id: 'catalogue.specification',
  summary: 'The version of a specification that is in force, with its choices',
  method: 'GET',
  path: '/specifications/:code',
  access: signedIn,
  params: { code },
  response: publicSpecification,
});

const staff = staffOnly('technical', 'rep', 'planner', 'admin');

export const getStaffSpecification = defineEndpoint({
  id: 'catalogue.staff-specification',
  summary: 'A version of a specification with yields, work and by-products, and the list of its versions',
  method: 'GET',
  path: '/specifications/:code/record',
  access: staff,
  params: { code },
  query: { version: z.int().positive().optional() },
  response: staffSpecification,
});

export const listVersions = defineEndpoint({
  id: 'catalogue.versions',
  summary: 'The newest version of every specification, wherever it stands',
  method: 'GET',
  path: '/specification-versions',
  access: staff,
  query: { ...pageQuery, q: words.optional() },
  response: pageOf(specificationRow),
});

export const withdrawSpecification = defineEndpoint({
  id: 'catalogue.withdraw',
  summary: 'Takes a specification out of the catalogue, so that it can be neither found nor ordered',
  method: 'POST',
  path: '/specifications/:code/withdrawal',
  access: staffOnly('technical'),
  params: { code },
  body: z.strictObject({ reason: line(300) }),
  response: staffSpecification,
  guarded: true,
});

export const getCutTree = defineEndpoint({
  id: 'catalogue.cut-tree',
  summary: 'Species, primals and cuts, parents before their children',
  method: 'GET',
  path: '/cut-tree',
  access: signedIn,
  response: z.strictObject({ nodes: z.array(cutNodeWire) }),
});
