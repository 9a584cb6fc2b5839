/** The kinds of error the API tells apart. */
export type ErrorType = 'api_error' | 'card_error' | 'idempotency_error' | 'invalid_request_error';

/** What an error answer says beside its kind and message. */
export interface ErrorDetails {
  code?: string;
  decline_code?: string;
  param?: string;
  charge?: string;
  payment_intent?: object;
  setup_intent?: object;
  payment_method?: object;
}

/**
 * A refusal of the API. `executed` says that the work had begun: only then is the answer kept for the idempotency key;
 * a request that failed validation may be sent again with the same key and better parameters.
 */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly type: ErrorType,
    message: string,
    readonly details: ErrorDetails = {},
    readonly executed = false,
  ) {
    super(message);
    this.name = 'ApiError';
  }

  /** The answer's body. */
  body(): { error: object } {
    return { error: { type: this.type, message: this.message, ...this.details } };
  }
}

/** 400: a parameter is missing, unknown or malformed; nothing was done. */
export function invalidParameter(message: string, param: string, code?: string): ApiError {
  return new ApiError(400, 'invalid_request_error', message, { ...(code && { code }), param });
}

/** 400: well formed, but the object's state or amount does not allow it. */
export function refused(message: string, details: ErrorDetails): ApiError {
  return new ApiError(400, 'invalid_request_error', message, details, true);
}

/** 404 for an id in the path, 400 for an id among the parameters. */
export function noSuch(kind: string, id: string, param: string, inPath = false): ApiError {
  const details = { code: 'resource_missing', param };
  return new ApiError(inPath ? 404 : 400, 'invalid_request_error', `No such ${kind}: '${id}'`, details);
}

/** 402: the card was not accepted. */
export function cardError(message: string, details: ErrorDetails): ApiError {
  return new ApiError(402, 'card_error', message, details, true);
}
