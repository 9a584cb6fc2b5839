// The house as data: its storeys from the ground up, its rooms, and the packages a room may not or may only use.
// This table is the only place where the rule is written; boundaries.mjs looks imports up in it.

/** Storeys from the ground up. A storey may use only the storeys under it. */
export const STOREYS = [
  'shared',
  'identity',
  'catalogue',
  'pricing',
  'stock',
  'balance',
  'ordering',
  'plant',
  'accounts',
];

const FEATURE = /^feature-[a-z][a-z-]*$/;
const SHARED_ROOMS = ['util', 'contracts', 'server', 'data-access', 'ui'];
const STOREY_ROOMS = ['domain', 'contracts', 'server', 'data-access', 'ui'];

/** The kind of a room: its folder name, with every `feature-…` being one kind; undefined when the storey has no such room. */
export function roomKind(storey, folder) {
  if (storey === 'shared') return SHARED_ROOMS.includes(folder) ? folder : undefined;
  if (FEATURE.test(folder)) return 'feature';
  return STOREY_ROOMS.includes(folder) ? folder : undefined;
}

/**
 * Rooms with more than one way in: what an application's first load needs stands apart, since the bundler keeps whole
 * files together and one index would pull tables and forms into it.
 */
const FURTHER_ENTRIES = {
  'shared/ui': ['frame', 'table', 'forms'],
  'identity/data-access': ['session'],
  'identity/contracts': ['session'],
  'catalogue/domain': ['choice-key'],
  'ordering/data-access': ['frame'],
  'accounts/ui': ['money-seam'],
};

export const furtherEntries = (storey, room) => FURTHER_ENTRIES[`${storey}/${room}`] ?? [];

// How far a room may reach for a room of another kind, or of its own kind elsewhere.
const OWN = 'own'; // its own storey
const LOWER = 'lower'; // storeys under it
const OWN_OR_LOWER = 'own or lower';
const ANY = 'any';

/** What each room may import: kind of the other room → how far. What is not listed is refused. */
const ROOM_REACH = {
  util: {},
  domain: { util: ANY, domain: OWN_OR_LOWER },
  contracts: { util: ANY, domain: OWN_OR_LOWER, contracts: LOWER },
  server: { util: ANY, domain: OWN_OR_LOWER, contracts: OWN, server: LOWER },
  'data-access': { util: ANY, domain: OWN_OR_LOWER, contracts: OWN, 'data-access': LOWER },
  ui: { util: ANY, domain: OWN_OR_LOWER, ui: LOWER },
  feature: { util: ANY, domain: ANY, contracts: ANY, 'data-access': ANY, ui: ANY },
};

/** Rooms that may use the shared contracts, which hold what every border needs: endpoints, roles, problems, words. */
const USE_SHARED_CONTRACTS = ['contracts', 'server', 'data-access', 'ui'];

const BROWSER_APPLICATION = { util: ANY, domain: ANY, contracts: ANY, 'data-access': ANY, ui: ANY, feature: ANY };
const SERVER_APPLICATION = { util: ANY, domain: ANY, contracts: ANY, server: ANY };
const ALL_BUT_FEATURES = { util: ANY, domain: ANY, contracts: ANY, server: ANY, 'data-access': ANY, ui: ANY };

/** What each place outside libs may import. */
const PLACE_REACH = {
  'apps/storefront': BROWSER_APPLICATION,
  'apps/admin': BROWSER_APPLICATION,
  'apps/api': SERVER_APPLICATION,
  'apps/e2e': ALL_BUT_FEATURES,
  database: { util: ANY },
  seeds: SERVER_APPLICATION,
  tools: ALL_BUT_FEATURES,
};

/** Places outside libs that hold code. */
export const PLACES = Object.keys(PLACE_REACH);

/** Places that may open `@seamwright/database`. */
const DATABASE_USERS = ['server', 'apps/api', 'apps/e2e', 'seeds', 'tools'];

/** Relative imports from one place outside libs into another: a test or a tool may drive what it tests. */
const NEIGHBOURS = {
  'apps/e2e': ['apps/api', 'seeds', 'tools'],
  seeds: ['apps/api'],
  tools: ['apps/api', 'seeds'],
};

/** The API's specs run against the stand-ins. */
const SPEC_NEIGHBOURS = { 'apps/api': ['tools'] };

/** Places whose specs may use the server's testing helpers though the place itself may not import the server. */
const SPECS_WITH_SERVER_HELPERS = ['database'];

const CLIENT = ['data-access', 'ui', 'feature', 'apps/storefront', 'apps/admin'];
const PURE = ['util', 'domain', 'contracts'];
const FRAMEWORKS = /^(@angular|@ngrx)\/|^(express|kysely|rxjs|pg|pg-boss)(\/|$)/;
const SERVER_PACKAGES =
  /^(express|kysely|pg|pg-boss|argon2|stripe|nodemailer|multer|passport|passport-jwt|jsonwebtoken|pino|pino-http|exceljs|pdfkit|helmet)(\/|$)/;

/** Packages that shipped code of the pure rooms may import, by room kind: time zones and identifiers need a library, wire shapes zod. */
const PURE_PACKAGES = { util: ['luxon', 'uuid'], domain: [], contracts: ['zod'] };

/** May code at `from` import the room `to`? Both are places as `boundaries.mjs` makes them. */
export function mayReachRoom(from, to) {
  if (to.kind === 'contracts' && to.rank === 0 && USE_SHARED_CONTRACTS.includes(from.kind)) return true;
  // A server's spec may call the endpoints of the storeys it stands on.
  if (to.kind === 'contracts' && from.kind === 'server' && from.spec && to.rank < from.rank) return true;
  const reach = (ROOM_REACH[from.kind] ?? PLACE_REACH[from.kind])[to.kind];
  if (reach === undefined) {
    return from.spec && to.testing && to.kind === 'server' && SPECS_WITH_SERVER_HELPERS.includes(from.kind);
  }
  if (reach === ANY) return true;
  const step = to.rank - from.rank;
  // A room's own testing entry is its own kind in its own storey.
  if (step === 0) return reach !== LOWER || (to.testing && to.unit === from.unit);
  return step < 0 && reach !== OWN;
}

/** May code at `from` open the database's entry? */
export function mayUseDatabase(from) {
  return DATABASE_USERS.includes(from.kind);
}

/** May code at `from` reach into the place `to` (no library) by a relative path? */
export function mayReachPlace(from, to) {
  return (
    (NEIGHBOURS[from.kind] ?? []).includes(to.kind) ||
    (from.spec && (SPEC_NEIGHBOURS[from.kind] ?? []).includes(to.kind))
  );
}

/** May code at `from` use a room's testing entry? Specs and testing folders may, and what exists for tests only. */
export function mayUseTesting(from) {
  return from.spec || from.kind === 'apps/e2e' || from.kind === 'tools';
}

/** Why code at `from` may not import a module of Node.js; undefined when it may. Specs run in Node.js and ship nowhere. */
export function builtinRefusal(from) {
  if (from.spec) return undefined;
  if (CLIENT.includes(from.kind)) return 'it runs in a browser, which has no Node.js modules';
  if (PURE.includes(from.kind)) return 'it runs on both sides of the border: no input or output here';
  return undefined;
}

/** Why code at `from` may not import the npm package `name`; undefined when it may. */
export function packageRefusal(from, name) {
  if (PURE.includes(from.kind)) {
    if (FRAMEWORKS.test(name)) return 'it is plain TypeScript, without framework or store';
    if (from.spec || PURE_PACKAGES[from.kind].includes(name)) return undefined;
    return `it may use ${PURE_PACKAGES[from.kind].join(', ') || 'no package at all'}`;
  }
  if (CLIENT.includes(from.kind) && SERVER_PACKAGES.test(name))
    return 'it runs in a browser: ask the server by a contract';
  if (from.kind === 'server' && /^(@angular|@ngrx)\//.test(name))
    return 'Angular belongs to data-access, ui and features';
  return undefined;
}
