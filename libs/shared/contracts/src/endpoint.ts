import * as z from 'zod';
import type { Role } from './roles';

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/**
 * Who may call. `roles` names them; `customer` says whether what is asked for belongs to one customer
 * (then a caller who does not serve that customer gets 404).
 */
export type Access =
  | { readonly who: 'anyone' }
  | { readonly who: 'roles'; readonly roles: readonly Role[]; readonly customer: 'own' | 'none' };

type Shape = z.ZodRawShape;
type NoShape = Record<never, never>;

/** One endpoint, declared once: router, checks, permission, client call and OpenAPI all follow from it. */
export interface Endpoint<
  P extends Shape = Shape,
  Q extends Shape = Shape,
  B extends z.ZodType | undefined = z.ZodType | undefined,
  R extends z.ZodType | undefined = z.ZodType | undefined,
> {
  /** `resource.deed`, unique. */
  readonly id: string;
  readonly summary: string;
  readonly method: Method;
  /** Below /api/v1, parameters as `:name`. */
  readonly path: string;
  readonly access: Access;
  readonly params: z.ZodObject<P>;
  readonly query: z.ZodObject<Q>;
  readonly body: B;
  readonly response: R;
  readonly status: 200 | 201 | 202 | 204;
  /** Creates or charges: the caller sends an Idempotency-Key, and a repeat presents what the first made. */
  readonly idempotent: boolean;
  /** Edits: the caller sends If-Match with the row version that was read. */
  readonly guarded: boolean;
  /** The request is one file in the field `file`. */
  readonly upload: { readonly maxBytes: number } | null;
  /** The answer is a file of this media type. */
  readonly file: string | null;
}

/**
 * What sending a call needs of its endpoint: where it goes, and how. No shape is among it, so that the calls of a first
 * load can be declared apart from their shapes, without zod.
 */
export type CallAddress = Pick<Endpoint, 'method' | 'path' | 'access'> &
  Partial<Pick<Endpoint, 'idempotent' | 'upload'>>;

interface Declaration<
  P extends Shape,
  Q extends Shape,
  B extends z.ZodType | undefined,
  R extends z.ZodType | undefined,
> {
  id: string;
  summary: string;
  method: Method;
  path: string;
  access: Access;
  params?: P;
  query?: Q;
  body?: B;
  response?: R;
  status?: 200 | 201 | 202 | 204;
  idempotent?: boolean;
  guarded?: boolean;
  upload?: { maxBytes: number };
  file?: string;
}

/** Declares an endpoint. Shapes are strict: an unknown field is refused by name. */
export function defineEndpoint<
  P extends Shape = NoShape,
  Q extends Shape = NoShape,
  B extends z.ZodType | undefined = undefined,
  R extends z.ZodType | undefined = undefined,
>(declaration: Declaration<P, Q, B, R>): Endpoint<P, Q, B, R> {
  return Object.freeze({
    id: declaration.id,
    summary: declaration.summary,
    method: declaration.method,
    path: declaration.path,
    access: declaration.access,
    params: z.strictObject(declaration.params ?? ({} as P)) as unknown as z.ZodObject<P>,
    query: z.strictObject(declaration.query ?? ({} as Q)) as unknown as z.ZodObject<Q>,
    body: declaration.body as B,
    response: declaration.response as R,
    status: declaration.status ?? (declaration.response || declaration.file ? 200 : 204),
    idempotent: declaration.idempotent ?? false,
    guarded: declaration.guarded ?? false,
    upload: declaration.upload ?? null,
    file: declaration.file ?? null,
  });
}

export const anyone: Access = { who: 'anyone' };
/** Staff work that belongs to no one customer. */
export const staffOnly = (...roles: readonly Role[]): Access => ({ who: 'roles', roles, customer: 'none' });
/** What belongs to one customer: buyers reach their own, staff those that they serve. */
export const ownCustomer = (...roles: readonly Role[]): Access => ({ who: 'roles', roles, customer: 'own' });

type Part<T extends z.ZodType | undefined> = T extends z.ZodType ? z.output<T> : undefined;
type Sent<T extends z.ZodType | undefined> = T extends z.ZodType ? z.input<T> : undefined;
type Wanted<Name extends string, T> = [T] extends [undefined]
  ? { [K in Name]?: undefined }
  : Record<never, never> extends T
    ? { [K in Name]?: T }
    : { [K in Name]: T };

// eslint-friendly alias for "any endpoint" in positions where only inference matters.
export type AnyEndpoint = Endpoint<Shape, Shape, z.ZodType | undefined, z.ZodType | undefined>;

type ParamsOf<E> = E extends { params: infer P extends z.ZodType } ? P : never;
type QueryOf<E> = E extends { query: infer Q extends z.ZodType } ? Q : never;
type BodyOf<E> = E extends { body: infer B extends z.ZodType | undefined } ? B : undefined;
type ResponseOf<E> = E extends { response: infer R extends z.ZodType | undefined } ? R : undefined;

/** What the server's handler is given: checked and typed. */
export interface CheckedInput<E> {
  readonly params: z.output<ParamsOf<E>>;
  readonly query: z.output<QueryOf<E>>;
  readonly body: Part<BodyOf<E>>;
}

/** What a client sends. */
export type CallInput<E> = Wanted<'params', z.input<ParamsOf<E>>> &
  Wanted<'query', z.input<QueryOf<E>>> &
  Wanted<'body', Sent<BodyOf<E>>> & {
    /** The row version that was read, for guarded endpoints. */
    readonly ifMatch?: number;
    /** Sent again unchanged when the same deed is tried again. */
    readonly idempotencyKey?: string;
    readonly file?: Blob;
  };

export type Answer<E> = ResponseOf<E> extends z.ZodType ? z.output<ResponseOf<E>> : undefined;
