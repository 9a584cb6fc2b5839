// Habits of the house that a syntax pattern can see: one way into a transaction, a clock that is handed in, no floats.

/** A rule without options that refuses what its selectors match. */
function refuse(description, message, selectors) {
  return {
    meta: { type: 'problem', docs: { description }, schema: [] },
    create: (context) => ({ [selectors.join(', ')]: (node) => context.report({ node, message }) }),
  };
}

const OPENING = '/^\\s*(begin|start\\s+transaction)\\b/i';

const oneTransaction = refuse(
  'Only inTransaction opens a transaction',
  'Open transactions and connections by inTransaction of shared/server, so that the caller is always set.',
  [
    'CallExpression[callee.property.name=/^(transaction|startTransaction)$/]',
    'NewExpression[callee.name=/^(Pool|Client)$/]',
    'NewExpression[callee.property.name=/^(Pool|Client)$/]',
    `CallExpression[callee.property.name=/^(query|raw|execute|executeQuery)$/] > Literal.arguments[value=${OPENING}]`,
    `CallExpression[callee.property.name=/^(query|raw|execute|executeQuery)$/] > TemplateLiteral.arguments[quasis.0.value.raw=${OPENING}]`,
    `TaggedTemplateExpression[tag.name="sql"][quasi.quasis.0.value.raw=${OPENING}]`,
    `Property[key.name="text"] > Literal.value[value=${OPENING}]`,
    `Property[key.name="text"] > TemplateLiteral.value[quasis.0.value.raw=${OPENING}]`,
  ],
);

const clockIsHandedIn = refuse(
  'The clock is a parameter',
  'Take the present moment as a parameter (use cases and jobs are handed "now") instead of reading the system clock.',
  [
    'MemberExpression[object.name="Date"][property.name="now"]',
    'NewExpression[callee.name="Date"][arguments.length=0]',
    'CallExpression[callee.name="Date"]',
    'CallExpression[callee.object.name="DateTime"][callee.property.name="now"]',
    'CallExpression[callee.object.name="DateTime"][callee.property.name=/^(local|utc)$/][arguments.length=0]',
  ],
);

const wholeNumbers = refuse(
  'Money, weights and rates are whole numbers',
  'No floating point here: keep minor units, grams and millionths as whole numbers, and read and write them with the parsers and formatters of shared/util.',
  [
    'CallExpression[callee.name="parseFloat"]',
    'MemberExpression[object.name="Number"][property.name="parseFloat"]',
    'MemberExpression[property.name="toFixed"]',
  ],
);

const plugin = {
  rules: {
    'one-transaction': oneTransaction,
    'clock-is-handed-in': clockIsHandedIn,
    'whole-numbers': wholeNumbers,
  },
};

/** The flat configuration that switches each habit on where it holds. */
export function habitsConfig() {
  return [
    {
      name: 'seamwright/one-transaction',
      files: ['{apps,libs,seeds}/**/*.{ts,mts,mjs}'],
      // The live hub only listens: its connection reads no rows.
      ignores: ['libs/shared/server/src/{database,live}/**', 'libs/shared/server/testing/**'],
      plugins: { habits: plugin },
      rules: { 'habits/one-transaction': 'error' },
    },
    {
      name: 'seamwright/clock-is-handed-in',
      files: ['libs/shared/util/**/*.ts', 'libs/*/{domain,server}/**/*.ts'],
      ignores: ['libs/shared/server/src/clock*', 'libs/shared/server/src/clock*/**'],
      plugins: { habits: plugin },
      rules: { 'habits/clock-is-handed-in': 'error' },
    },
    {
      name: 'seamwright/whole-numbers',
      files: ['libs/**/*.ts'],
      ignores: ['libs/*/ui/**'],
      plugins: { habits: plugin },
      rules: { 'habits/whole-numbers': 'error' },
    },
  ];
}
