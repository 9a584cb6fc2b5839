import type { FormFields } from './form-body';

/** One request to the API after its form was read; `expand` and the idempotency key were taken out before. */
export interface ApiCall {
  /** Ids from the path. */
  ids: Record<string, string>;
  input: FormFields;
  /** Where the caller reached the stand-in, for addresses it must hand out. */
  baseUrl: string;
}

/** One endpoint of the API. A handler works in memory and at once, so each call is done wholly or not at all. */
export interface ApiRoute {
  method: 'get' | 'post' | 'delete';
  path: string;
  handle(call: ApiCall): object;
}
