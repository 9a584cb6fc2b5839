import type { Problem } from '@seamwright/shared/contracts';

type FieldError = Problem['errors'][number];

/**
 * Reads a problem document as the contract's schema does, null when it is none. By hand, since a refusal must be told
 * before anything else is loaded, and also when nothing more can be.
 */
export function readProblem(document: unknown): Problem | null {
  if (!isRecord(document)) return null;
  const { type, title, status, detail, instance, code, errors = [] } = document;
  if (!isText(type) || !isText(title) || !isText(detail) || !isText(instance) || !isText(code)) return null;
  if (!Number.isSafeInteger(status) || !Array.isArray(errors)) return null;
  const read = errors.map(readFieldError);
  if (!read.every((error) => error !== null)) return null;
  return { type, title, status: status as number, detail, instance, code, errors: read };
}

function readFieldError(error: unknown): FieldError | null {
  if (!isRecord(error)) return null;
  const { pointer, message } = error;
  return isText(pointer) && isText(message) ? { pointer, message } : null;
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
const isText = (value: unknown): value is string => typeof value === 'string';
