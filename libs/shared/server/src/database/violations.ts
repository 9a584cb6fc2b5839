import type { Refusal } from '@seamwright/shared/util';

/** What PostgreSQL says when a rule that it keeps is broken. */
interface PostgresError {
  readonly code: string;
  readonly constraint?: string;
}

const isPostgresError = (error: unknown): error is PostgresError =>
  error instanceof Error && typeof (error as unknown as PostgresError).code === 'string' && 'severity' in error;

const CODES: Readonly<Record<string, string>> = {
  '23505': 'already-there', // unique_violation
  '23P01': 'already-there', // exclusion_violation
  '23503': 'in-use', // foreign_key_violation
  '23001': 'not-changeable', // restrict_violation: append-only
  '23514': 'invalid', // check_violation
  '22003': 'too-big', // numeric_value_out_of_range
  '22021': 'invalid', // character_not_in_repertoire: a NUL in a text
  '22P05': 'invalid', // untranslatable_character: a NUL in JSON
};

/** Turns a broken database rule into a refusal, with the constraint's name among its parameters; null for any other error. */
export function refusalOfViolation(error: unknown): Refusal | null {
  if (!isPostgresError(error)) return null;
  const code = CODES[error.code];
  return code ? { code, params: { constraint: error.constraint ?? '' } } : null;
}

/** True when `error` is the violation of the named constraint. */
export const violates = (error: unknown, constraint: string): boolean =>
  isPostgresError(error) && error.constraint === constraint;
