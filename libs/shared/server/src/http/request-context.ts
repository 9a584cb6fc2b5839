import type { Caller } from '../database/caller';
import type { Database } from '../database/database';
import type { Log } from '../log';

export interface UploadedFile {
  readonly fileName: string;
  readonly bytes: Buffer;
}

export interface CookieOptions {
  readonly path: string;
  readonly maxAgeSeconds: number;
}

/** What a handler knows of the request beside its checked input. */
export interface RequestContext {
  readonly caller: Caller;
  readonly now: Date;
  readonly requestId: string;
  readonly log: Log;
  readonly database: Database;
  /** The row version from If-Match; set on guarded endpoints. */
  readonly ifMatch: number;
  /** The file that came with the request; set on upload endpoints. */
  readonly upload: UploadedFile | null;
  /** A keyed-hash-ready name of where the request came from (its address). */
  readonly source: string;
  readonly userAgent: string;
  readonly origin: string | null;
  cookie(name: string): string | null;
  /** Sets an httpOnly, same-site cookie; an empty value removes it. */
  setCookie(name: string, value: string, options: CookieOptions): void;
}
