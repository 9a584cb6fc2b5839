import { invalidParameter } from './errors';
import type { FormValue } from './form-body';
import type { CollectionName, State } from './state';

const MAX_DEPTH = 4;

/** Fields that hold an id and can hold the object itself. */
const expandable = new Set([
  'balance_transaction',
  'charge',
  'customer',
  'default_payment_method',
  'failure_balance_transaction',
  'latest_charge',
  'payment_intent',
  'payment_method',
  'source',
]);
/** Groups that a path may lead through. */
const passable = new Set(['data', 'invoice_settings']);

const collectionByPrefix: Record<string, CollectionName> = {
  ch: 'charges',
  cus: 'customers',
  pi: 'paymentIntents',
  pm: 'paymentMethods',
  po: 'payouts',
  re: 'refunds',
  txn: 'balanceTransactions',
};

/**
 * Reads the `expand[]` parameter.
 * @throws ApiError 400 when a path names a field that can't be expanded
 */
export function readExpand(value: FormValue | undefined): string[][] {
  if (value === undefined) return [];
  const paths = (Array.isArray(value) ? value : [value]).map((path) => {
    if (typeof path !== 'string') throw invalidParameter('Invalid expand: must be a list of paths', 'expand');
    return path.split('.');
  });
  for (const path of paths) {
    const wrong = path.find((segment) => !expandable.has(segment) && !passable.has(segment));
    if (wrong !== undefined || !expandable.has(path.at(-1) ?? '')) {
      throw invalidParameter(`This property cannot be expanded (${path.join('.')}).`, 'expand');
    }
    if (path.length > MAX_DEPTH) {
      throw invalidParameter(`You cannot expand more than ${MAX_DEPTH} levels of a property.`, 'expand');
    }
  }
  return paths;
}

function objectById(state: State, id: string): object | undefined {
  const name = collectionByPrefix[id.slice(0, id.indexOf('_'))];
  return name && state[name].get(id);
}

function expandPath(state: State, value: unknown, path: string[]): void {
  if (Array.isArray(value)) {
    for (const item of value) expandPath(state, item, path);
    return;
  }
  const [field, ...rest] = path;
  if (field === undefined || typeof value !== 'object' || value === null) return;
  const fields = value as Record<string, unknown>;
  const held = fields[field];
  if (typeof held === 'string') fields[field] = structuredClone(objectById(state, held) ?? held);
  expandPath(state, fields[field], rest);
}

/** A copy of an answer in which the ids named by the paths are replaced by their objects. */
export function expanded(state: State, answer: object, paths: string[][]): object {
  const copy = structuredClone(answer);
  for (const path of paths) expandPath(state, copy, path);
  return copy;
}
