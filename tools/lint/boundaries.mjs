// The boundary rule: what a file may import is read off its place in the tree and the specifier alone, with no look at
// the disk, so that the rule is exact, fast, and the same for files that are not written yet.
import { isBuiltin } from 'node:module';
import path from 'node:path';
import {
  STOREYS,
  PLACES,
  builtinRefusal,
  furtherEntries,
  mayReachPlace,
  mayReachRoom,
  mayUseDatabase,
  mayUseTesting,
  packageRefusal,
  roomKind,
} from './house.mjs';

const ALIAS = '@seamwright/';
const SPEC = /\.spec\.[cm]?tsx?$|\/testing\//;

/**
 * The place of a file or folder of the repository.
 * @param {string} relative path from the root of the repository, with forward slashes
 * @returns `{unit, kind, spec}` (`storey`, `rank` and `room` too for a room); `{unit, problem}` for a library
 *   that the house does not know; undefined outside the house's folders (configuration at the root)
 */
export function placeOf(relative) {
  const spec = SPEC.test(relative);
  const [top, second, third] = relative.split('/');
  if (top === 'libs') {
    const unit = `libs/${second}/${third}`;
    const rank = STOREYS.indexOf(second);
    if (rank < 0) return { unit, problem: `'${second}' is no storey of the house (${STOREYS.join(', ')})` };
    const kind = third && roomKind(second, third);
    if (!kind) return { unit, problem: `'${third}' is no room of the storey '${second}'` };
    return { unit, kind, storey: second, rank, room: third, spec };
  }
  const kind = PLACES.find((name) => name === top || name === `${top}/${second}`);
  return kind && { unit: kind, kind, spec };
}

/** Splits `@seamwright/<storey>/<room>[/testing or a further entry]`; the answer is a place, or `{problem}` when it is no way in. */
function placeOfAlias(specifier) {
  const [storey, room, ...deeper] = specifier.slice(ALIAS.length).split('/');
  const place = placeOf(`libs/${storey}/${room}`);
  if (place.problem) return place;
  if (deeper.length === 0) return place;
  if (deeper.length === 1 && deeper[0] === 'testing') return { ...place, testing: true };
  if (deeper.length === 1 && furtherEntries(storey, room).includes(deeper[0])) return place;
  return { problem: `'${specifier}' reaches past the entry: import from '${ALIAS}${storey}/${room}'` };
}

const nameOf = (place) => (place.storey ? `${place.storey}/${place.room}` : place.kind);

/**
 * Why the file may not import the specifier; undefined when it may.
 * @param {string} relativeFile path of the importing file from the root, with forward slashes
 * @param {string} specifier as written in the import
 */
export function importRefusal(relativeFile, specifier) {
  const from = placeOf(relativeFile);
  if (!from || from.problem) return undefined;
  const refuse = (why) => `${nameOf(from)} may not import '${specifier}': ${why}.`;

  if (specifier.startsWith('.') || specifier.startsWith('/'))
    return relativeRefusal(from, relativeFile, specifier, refuse);
  if (specifier === `${ALIAS}database`) {
    return mayUseDatabase(from) ? undefined : refuse('only server rooms, the API, seeds and tools reach the database');
  }
  if (specifier === `${ALIAS}database/testing`) {
    return mayUseDatabase(from) && mayUseTesting(from) ? undefined : refuse('testing helpers are for specs');
  }
  if (specifier.startsWith(`${ALIAS}database/`)) return refuse(`the only way in is '${ALIAS}database'`);
  if (specifier.startsWith(ALIAS)) return aliasRefusal(from, specifier, refuse);

  const why = isBuiltin(specifier) ? builtinRefusal(from) : packageRefusal(from, packageName(specifier));
  return why && refuse(why);
}

function relativeRefusal(from, relativeFile, specifier, refuse) {
  const target = specifier.startsWith('/')
    ? specifier.slice(1)
    : path.posix.join(path.posix.dirname(relativeFile), specifier);
  const to = placeOf(target);
  if (to?.unit === from.unit) return undefined;
  if (to?.problem) return refuse(to.problem);
  if (to?.storey) return refuse(`another library is entered by '${ALIAS}${nameOf(to)}'`);
  if (to?.kind === 'database') return refuse(`the database is entered by '${ALIAS}database'`);
  if (to && !mayReachPlace(from, to)) return refuse(`${nameOf(to)} is not for it to use`);
  if (!to && from.storey) return refuse('a library knows nothing outside the libraries');
  return undefined;
}

function aliasRefusal(from, specifier, refuse) {
  const to = placeOfAlias(specifier);
  if (to.problem) return refuse(to.problem);
  if (to.testing && !mayUseTesting(from)) return refuse('testing helpers are for specs');
  if (to.unit === from.unit && !to.testing) return refuse('inside a room import by a relative path');
  if (mayReachRoom(from, to)) return undefined;
  if (to.kind === 'feature') return refuse('a feature is a leaf, only applications import it');
  if (from.rank < to.rank) return refuse(`the storey '${to.storey}' lies above '${from.storey}'`);
  return refuse(`a ${from.storey ? `${from.kind} room` : nameOf(from)} has no way to ${nameOf(to)}`);
}

function packageName(specifier) {
  const parts = specifier.split('/');
  return specifier.startsWith('@') ? parts.slice(0, 2).join('/') : parts[0];
}

/** The text of a module specifier that is a constant; undefined for anything worked out at run time. */
function constantText(node) {
  if (node?.type === 'Literal' && typeof node.value === 'string') return node.value;
  if (node?.type === 'TemplateLiteral' && node.expressions.length === 0) return node.quasis[0].value.cooked;
  return undefined;
}

/** The ESLint rule; its one option is the absolute path of the root of the repository. */
export const boundariesRule = {
  meta: {
    type: 'problem',
    docs: { description: 'Imports follow the storeys, rooms and entry points of the house' },
    schema: [{ type: 'string' }],
  },
  create(context) {
    const file = path.relative(context.options[0], context.filename).split(path.sep).join('/');
    const from = placeOf(file);
    if (!from) return {};

    const check = (node) => {
      const specifier = constantText(node);
      if (specifier === undefined) {
        if (from.kind !== 'tools')
          context.report({ node, message: 'Name the imported module by a constant, so that it can be checked.' });
        return;
      }
      const message = importRefusal(file, specifier);
      if (message) context.report({ node, message });
    };
    const checkSource = (node) => node.source && check(node.source);
    return {
      Program: (node) => from.problem && context.report({ node, message: `${from.unit}: ${from.problem}.` }),
      ImportDeclaration: checkSource,
      ExportNamedDeclaration: checkSource,
      ExportAllDeclaration: checkSource,
      ImportExpression: checkSource,
      TSImportType: checkSource,
      TSExternalModuleReference: (node) => check(node.expression),
      'CallExpression[callee.name="require"]': (node) => node.arguments[0] && check(node.arguments[0]),
      'CallExpression[callee.object.name=/^(require|jest)$/][callee.property.name=/^(resolve|mock|doMock|requireActual)$/]':
        (node) => node.arguments[0] && check(node.arguments[0]),
    };
  },
};

/**
 * The flat configuration that switches the boundary rule on for all code of the repository.
 * @param {string} rootPath absolute path of the root of the repository
 */
export function boundaryConfig(rootPath) {
  return [
    {
      name: 'seamwright/boundaries',
      files: ['{apps,libs,database,seeds,tools}/**/*.{ts,mts,cts,js,mjs,cjs}'],
      plugins: { boundaries: { rules: { imports: boundariesRule } } },
      rules: { 'boundaries/imports': ['error', rootPath] },
    },
  ];
}
