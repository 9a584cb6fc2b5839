import Ajv, { type ValidateFunction } from 'ajv';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';

type Json = { [key: string]: unknown };
interface Operation {
  responses: Record<string, { content: { 'application/json': { schema: Json } } }>;
}
interface Description {
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, Json> };
}

const description = JSON.parse(
  readFileSync(join(__dirname, '..', 'openapi', 'openapi-subset.json'), 'utf8'),
) as Description;

function isObject(value: unknown): value is Json {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** OpenAPI 3.0's `nullable` in words of JSON Schema. */
function understandNullable(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(understandNullable);
  if (!isObject(value)) return value;
  const plain = Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, understandNullable(inner)]));
  if (value['nullable'] !== true) return plain;
  delete plain['nullable'];
  return { anyOf: [plain, { type: 'null' }] };
}

const ajv = new Ajv({ strict: false, allErrors: true, validateFormats: false });
ajv.addSchema({ $id: 'published', components: understandNullable(description.components) as object });
const compiled = new Map<string, ValidateFunction>();

function schemaOf(key: string, schema: () => object): ValidateFunction {
  const known = compiled.get(key);
  if (known) return known;
  const made = ajv.compile(schema());
  compiled.set(key, made);
  return made;
}

function withReferences(schema: Json): object {
  const text = JSON.stringify(understandNullable(schema)).replaceAll('"#/components/', '"published#/components/');
  return JSON.parse(text) as object;
}

function problems(validate: ValidateFunction, value: unknown): string[] {
  if (validate(value)) return [];
  return (validate.errors ?? []).map(({ instancePath, message }) => `${instancePath} ${message ?? ''}`);
}

/** Where an object differs from the published schema of this name; fields the schema does not know are allowed. */
export function problemsOfObject(name: string, value: unknown): string[] {
  return problems(
    schemaOf(name, () => ({ $ref: `published#/components/schemas/${name}` })),
    value,
  );
}

const patterns = Object.keys(description.paths).map((path) => ({
  path,
  pattern: new RegExp(`^${path.replaceAll(/\{[^}]+\}/g, '[^/]+')}$`),
}));

/** Every published operation, as `GET /v1/charges/{charge}`. */
export const publishedOperations = Object.entries(description.paths).flatMap(([path, operations]) =>
  Object.keys(operations).map((method) => `${method.toUpperCase()} ${path}`),
);

/** Whether the published subset describes this address. */
export function describes(method: string, path: string): boolean {
  return operation(method, path) !== undefined;
}

function operation(method: string, path: string): { key: string; operation: Operation } | undefined {
  for (const { path: template, pattern } of patterns) {
    const found = pattern.test(path) ? description.paths[template]?.[method.toLowerCase()] : undefined;
    if (found) return { key: `${method} ${template}`, operation: found };
  }
  return undefined;
}

/** Where an answer differs from what is published for its address and status. */
export function problemsOfAnswer(method: string, path: string, status: number, body: unknown): string[] {
  const found = operation(method, path);
  if (!found) return [`${method} ${path} is not published`];
  const kind = status === 200 ? '200' : 'default';
  const schema = found.operation.responses[kind]?.content['application/json'].schema;
  if (!schema) return [`${found.key} has no published answer ${kind}`];
  return problems(
    schemaOf(`${found.key} ${kind}`, () => withReferences(schema)),
    body,
  );
}
