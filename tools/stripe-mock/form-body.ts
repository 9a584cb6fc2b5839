import { ApiError } from './errors';

/** A form value after its brackets were understood. */
export type FormValue = string | FormValue[] | FormFields;
export interface FormFields {
  [name: string]: FormValue;
}

const MAX_FIELDS = 1000;
const MAX_DEPTH = 8;
const namePattern = /^([^[\]]+)((?:\[[^[\]]*\])*)$/;

function malformed(message: string): ApiError {
  return new ApiError(400, 'invalid_request_error', message);
}

/** `metadata[order_id]` → `['metadata', 'order_id']`; `expand[]` → `['expand', '']`. */
function segments(name: string): string[] {
  const match = namePattern.exec(name);
  if (!match) throw malformed(`Invalid parameter name: ${name}`);
  const inner = [...(match[2] ?? '').matchAll(/\[([^[\]]*)\]/g)].map((part) => part[1] ?? '');
  const path = [match[1] ?? '', ...inner];
  if (path.length > MAX_DEPTH) throw malformed(`Parameter nested too deeply: ${name}`);
  if (path.includes('__proto__')) throw malformed(`Invalid parameter name: ${name}`);
  return path;
}

/** A branch of the tree while it is built; lists are keyed by position until the end. */
class Branch {
  readonly children = new Map<string, Branch | string>();
  #next = 0;

  key(segment: string): string {
    return segment === '' ? String(this.#next++) : segment;
  }

  finished(): FormValue {
    const entries = [...this.children].map(([name, child]): [string, FormValue] => [
      name,
      child instanceof Branch ? child.finished() : child,
    ]);
    const isList = entries.length > 0 && entries.every(([name]) => /^\d+$/.test(name));
    if (!isList) return Object.fromEntries(entries);
    return entries.sort(([left], [right]) => Number(left) - Number(right)).map(([, value]) => value);
  }
}

/**
 * Reads a form-encoded body or query string with brackets: `a[b]=1` nests, `a[]=1` and `a[0]=1` make lists, a repeated
 * plain name keeps the last value.
 * @throws ApiError 400 when the text is not well formed
 */
export function parseForm(text: string): FormFields {
  const root = new Branch();
  const pairs = text === '' ? [] : text.split('&');
  if (pairs.length > MAX_FIELDS) throw malformed(`More than ${MAX_FIELDS} parameters`);
  for (const pair of pairs) {
    const cut = pair.indexOf('=');
    const name = decode(cut < 0 ? pair : pair.slice(0, cut));
    const value = cut < 0 ? '' : decode(pair.slice(cut + 1));
    place(root, segments(name), value, name);
  }
  return Object.fromEntries([...root.children].map(([name, child]) => [name, childValue(child)]));
}

function childValue(child: Branch | string): FormValue {
  return child instanceof Branch ? child.finished() : child;
}

function place(root: Branch, path: string[], value: string, name: string): void {
  let branch = root;
  path.forEach((segment, depth) => {
    const key = branch.key(segment);
    const present = branch.children.get(key);
    if (depth === path.length - 1) {
      if (present instanceof Branch) throw malformed(`Parameter is both a value and a group: ${name}`);
      branch.children.set(key, value);
      return;
    }
    if (typeof present === 'string') throw malformed(`Parameter is both a value and a group: ${name}`);
    const below = present ?? new Branch();
    branch.children.set(key, below);
    branch = below;
  });
}

function decode(text: string): string {
  try {
    return decodeURIComponent(text.replaceAll('+', ' '));
  } catch {
    throw malformed('The request is not well-formed form encoding.');
  }
}
