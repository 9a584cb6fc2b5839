import {
  HttpClient,
  HttpErrorResponse,
  HttpEventType,
  HttpHeaders,
  HttpParams,
  HttpRequest,
  type HttpResponse,
} from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import {
  catchError,
  defer,
  distinctUntilChanged,
  filter,
  finalize,
  from,
  map,
  merge,
  scan,
  Subject,
  switchMap,
  tap,
  throwError,
  type Observable,
} from 'rxjs';
import type { Answer, AnyEndpoint, CallAddress, CallInput } from '@seamwright/shared/contracts';
import { newId } from '@seamwright/shared/util';
import { ACCESS_TOKEN_SOURCE } from './access-token';
import { ApiProblem, asProblem } from './api-problem';

export interface FileDownload {
  readonly fileName: string;
  readonly blob: Blob;
}

/** How far an upload is; with its answer at the end. */
export interface UploadStep<E extends AnyEndpoint> {
  readonly percent: number;
  readonly answer: Answer<E> | null;
}

interface Sent {
  params?: Record<string, unknown>;
  query?: Record<string, unknown>;
  body?: unknown;
  ifMatch?: number;
  idempotencyKey?: string;
  file?: Blob;
}

/** Calls declared endpoints. Every error is an ApiProblem. */
@Injectable({ providedIn: 'root' })
export class ApiClient {
  readonly #http = inject(HttpClient);
  readonly #tokens = inject(ACCESS_TOKEN_SOURCE, { optional: true });

  /**
   * Calls an endpoint that answers JSON or nothing. What an application's start calls is given by its address, with the
   * endpoint as the type: `call<typeof signIn>(signInAddress, …)`.
   */
  call<E extends AnyEndpoint>(endpoint: E | CallAddress, input: CallInput<E>): Observable<Answer<E>> {
    return this.#send(endpoint, input as Sent, 'json').pipe(map((response) => response.body as Answer<E>));
  }

  /** Fetches a file: no token stands in an address, so downloads come as blobs. */
  download<E extends AnyEndpoint>(endpoint: E, input: CallInput<E>): Observable<FileDownload> {
    return this.#send(endpoint, input as Sent, 'blob').pipe(
      map((response) => ({ fileName: fileNameOf(response), blob: response.body as Blob })),
    );
  }

  /** Sends a file, telling the percentage that is on its way before the answer. */
  upload<E extends AnyEndpoint>(endpoint: E, input: CallInput<E>): Observable<UploadStep<E>> {
    return defer(() => {
      const progress = new Subject<number>();
      const answer = this.#send(endpoint, input as Sent, 'json', progress).pipe(
        map((response): UploadStep<E> => ({ percent: 100, answer: response.body as Answer<E> })),
        finalize(() => progress.complete()),
      );
      const steps = progress.pipe(
        // Sent anew under a renewed token it starts from nothing, which would only look like a fault.
        scan((most, percent) => Math.max(most, percent)),
        distinctUntilChanged(),
        map((percent): UploadStep<E> => ({ percent, answer: null })),
      );
      return merge(steps, answer);
    });
  }

  #send(
    endpoint: CallAddress,
    input: Sent,
    kind: 'json' | 'blob',
    progress?: Subject<number>,
  ): Observable<HttpResponse<unknown>> {
    // One key for the deed: a renewed token repeats it with the same one.
    const key = endpoint.idempotent ? (input.idempotencyKey ?? newId()) : null;
    const once = (token: string | null) => this.#request(endpoint, input, kind, key, token, progress);
    return once(this.#tokens?.current() ?? null).pipe(
      catchError((error: unknown) => {
        const refused = error instanceof HttpErrorResponse && error.status === 401 && endpoint.access.who === 'roles';
        if (!refused || !this.#tokens) return throwError(() => error);
        return this.#tokens.renew().pipe(switchMap((token) => (token ? once(token) : throwError(() => error))));
      }),
      catchError((error: unknown) =>
        kind === 'blob' ? from(readBlobError(error)).pipe(switchMap(refuse)) : refuse(error),
      ),
    );
  }

  #request(
    endpoint: CallAddress,
    input: Sent,
    kind: 'json' | 'blob',
    key: string | null,
    token: string | null,
    progress?: Subject<number>,
  ): Observable<HttpResponse<unknown>> {
    let headers = new HttpHeaders();
    if (token) headers = headers.set('authorization', `Bearer ${token}`);
    if (key) headers = headers.set('idempotency-key', key);
    if (input.ifMatch !== undefined) headers = headers.set('if-match', `"${input.ifMatch}"`);
    const request = new HttpRequest<unknown>(
      endpoint.method,
      addressOf(endpoint, input.params),
      bodyOf(endpoint, input),
      {
        headers,
        params: queryOf(input.query),
        responseType: kind,
        reportProgress: progress !== undefined,
      },
    );
    return this.#http.request<unknown>(request).pipe(
      tap((event) => {
        if (event.type === HttpEventType.UploadProgress && event.total)
          progress?.next(Math.floor((event.loaded * 100) / event.total));
      }),
      filter((event): event is HttpResponse<unknown> => event.type === HttpEventType.Response),
    );
  }
}

const refuse = (error: unknown) => throwError(() => new ApiProblem(asProblem(error)));

function addressOf(endpoint: CallAddress, params: Record<string, unknown> = {}): string {
  return `/api/v1${endpoint.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(params[name])))}`;
}

function queryOf(query: Record<string, unknown> = {}): HttpParams {
  let params = new HttpParams();
  for (const [name, value] of Object.entries(query)) {
    if (value === undefined || value === null) continue;
    for (const each of Array.isArray(value) ? value : [value]) params = params.append(name, String(each));
  }
  return params;
}

function bodyOf(endpoint: CallAddress, input: Sent): unknown {
  if (!endpoint.upload) return input.body;
  const form = new FormData();
  for (const [name, value] of Object.entries((input.body ?? {}) as Record<string, unknown>))
    form.append(name, String(value));
  if (input.file) form.append('file', input.file);
  return form;
}

function fileNameOf(response: HttpResponse<unknown>): string {
  const match = /filename\*=UTF-8''([^;]+)/.exec(response.headers.get('content-disposition') ?? '');
  return match?.[1] ? decodeURIComponent(match[1]) : 'download';
}

/** A refused download carries its problem document as a blob. */
async function readBlobError(error: unknown): Promise<unknown> {
  if (!(error instanceof HttpErrorResponse) || !(error.error instanceof Blob)) return error;
  const { headers, status, statusText, url } = error;
  // What can't be read is as good as nothing.
  const text = await error.error.text().catch(() => '');
  return new HttpErrorResponse({ error: text, headers, status, statusText, url: url ?? undefined });
}
