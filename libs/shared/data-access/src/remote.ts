import type { Problem } from '@seamwright/shared/contracts';

/** What a screen knows of something that lives on the server. Old data stays visible while newer is fetched. */
export interface Remote<T> {
  readonly status: 'idle' | 'loading' | 'loaded' | 'failed';
  readonly data: T | null;
  readonly problem: Problem | null;
}

export const idle = <T>(): Remote<T> => ({ status: 'idle', data: null, problem: null });
export const loading = <T>(before: Remote<T>): Remote<T> => ({ ...before, status: 'loading', problem: null });
export const loaded = <T>(data: T): Remote<T> => ({ status: 'loaded', data, problem: null });
export const failed = <T>(before: Remote<T>, problem: Problem): Remote<T> => ({ ...before, status: 'failed', problem });
