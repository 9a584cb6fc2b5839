import fc from 'fast-check';
import * as z from 'zod';
import { cursors, junk, WICKED_TEXTS } from './junk';

interface Schema {
  readonly type?: string | readonly string[];
  readonly enum?: readonly unknown[];
  readonly const?: unknown;
  readonly anyOf?: readonly Schema[];
  readonly oneOf?: readonly Schema[];
  readonly properties?: Readonly<Record<string, Schema>>;
  readonly required?: readonly string[];
  readonly additionalProperties?: Schema | boolean;
  readonly items?: Schema;
  readonly minItems?: number;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly exclusiveMinimum?: number;
  readonly minLength?: number;
  readonly maxLength?: number;
  readonly format?: string;
  readonly pattern?: string;
}

/** Ids that are somebody's: of another kind than the field wants, mostly. */
export type KnownIds = readonly string[];

const DAYS = ['0001-01-01', '1899-12-31', '2026-02-28', '2026-12-09', '2027-06-01', '9999-12-31', '2026-02-30'];
const INSTANTS = ['0001-01-01T00:00:00Z', '9999-12-31T23:59:59Z', '2026-12-01T12:00:00Z', '2026-02-30T00:00:00Z'];
const EMAILS = ['a@b.example', 'UPPER+tag@Example.TEST', `${'x'.repeat(64)}@${'y'.repeat(60)}.example`];

/** Texts of the wanted length, of every script and of none. */
function texts({ minLength = 0, maxLength = 120 }: Schema): fc.Arbitrary<string> {
  const most = Math.min(maxLength, 300);
  return fc.oneof(
    fc.string({ unit: 'grapheme', minLength, maxLength: most }),
    fc.string({ unit: 'binary', minLength, maxLength: most }),
    fc.constantFrom(...WICKED_TEXTS),
    fc.constant('x'.repeat(maxLength)),
    fc.constant(`${'x'.repeat(Math.max(0, maxLength - 1))}\u0000`),
  );
}

function formatted(schema: Schema, ids: KnownIds): fc.Arbitrary<unknown> {
  if (schema.format === 'uuid') return fc.oneof(fc.constantFrom(...ids), fc.uuid({ version: 7 }));
  if (schema.format === 'date') return fc.constantFrom(...DAYS);
  if (schema.format === 'date-time') return fc.constantFrom(...INSTANTS);
  if (schema.format === 'email') return fc.constantFrom(...EMAILS);
  if (schema.pattern) return fc.stringMatching(new RegExp(schema.pattern), { maxLength: 60 });
  return texts(schema);
}

function numbers({ minimum, maximum, exclusiveMinimum }: Schema): fc.Arbitrary<number> {
  const min = minimum ?? (exclusiveMinimum === undefined ? Number.MIN_SAFE_INTEGER : exclusiveMinimum + 1);
  const max = maximum ?? Number.MAX_SAFE_INTEGER;
  return fc.oneof(fc.constantFrom(min, max), fc.integer({ min, max }));
}

function objects(schema: Schema, ids: KnownIds): fc.Arbitrary<unknown> {
  const { properties = {}, required = [], additionalProperties } = schema;
  const fields = Object.fromEntries(
    Object.entries(properties).map(([name, field]) => [name, name === 'cursor' ? cursors : shaped(field, ids)]),
  );
  const stated = fc.record(fields, { requiredKeys: [...required].filter((name) => name in fields) });
  if (typeof additionalProperties !== 'object') return stated;
  return fc.dictionary(fc.constantFrom(...WICKED_TEXTS, 'trim', 'ageing'), shaped(additionalProperties, ids), {
    maxKeys: 3,
  });
}

function shaped(schema: Schema, ids: KnownIds): fc.Arbitrary<unknown> {
  const choices = schema.anyOf ?? schema.oneOf;
  if (choices) return fc.oneof(...choices.map((choice) => shaped(choice, ids)));
  if (schema.const !== undefined) return fc.constant(schema.const);
  if (schema.enum) return fc.constantFrom(...schema.enum);
  switch (schema.type) {
    case 'object':
      return objects(schema, ids);
    case 'array':
      return fc.array(shaped(schema.items ?? {}, ids), { minLength: schema.minItems ?? 0, maxLength: 4 });
    case 'string':
      return formatted(schema, ids);
    case 'integer':
    case 'number':
      return numbers(schema);
    case 'boolean':
      return fc.boolean();
    case 'null':
      return fc.constant(null);
    default:
      return junk;
  }
}

/** Values of the right shape, as far as JSON Schema tells it, with what is extreme inside it. */
export function fromSchema(type: z.ZodType, ids: KnownIds): fc.Arbitrary<unknown> {
  const schema = z.toJSONSchema(type, { io: 'input', unrepresentable: 'any' }) as Schema;
  return shaped(schema, ids);
}
