/**
 * Why something was refused: a stable kebab-case code with the values its text needs. The words are put in by the
 * message catalogue. `pointer` is a JSON pointer to the field that is at fault, where one is.
 */
export interface Refusal {
  readonly code: string;
  readonly params: Readonly<Record<string, string | number>>;
  readonly pointer?: string;
}

export interface Accepted<T> {
  readonly ok: true;
  readonly value: T;
}

export interface Refused<E = Refusal> {
  readonly ok: false;
  readonly refusal: E;
}

/** The answer of a rule: a value, or the reason why there is none. */
export type Result<T, E = Refusal> = Accepted<T> | Refused<E>;

export function ok<T>(value: T): Accepted<T> {
  return { ok: true, value };
}

export function refuse(code: string, params: Refusal['params'] = {}, pointer?: string): Refused {
  return { ok: false, refusal: pointer === undefined ? { code, params } : { code, params, pointer } };
}

/** Carries a refusal out of a place that can only throw; the border turns it back into an answer. */
export class RefusalError extends Error {
  constructor(readonly refusal: Refusal) {
    super(`Refused: ${refusal.code}`);
    this.name = 'RefusalError';
  }
}

/** The value of an accepted result. Throws RefusalError when it was refused. */
export function unwrap<T>(result: Result<T>): T {
  if (result.ok) {
    return result.value;
  }
  throw new RefusalError(result.refusal);
}
