interface Import {
  readonly path: string;
  readonly kind: string;
  readonly external?: boolean;
}

export interface Metafile {
  readonly inputs: Readonly<Record<string, { readonly imports: readonly Import[] }>>;
  readonly outputs: Readonly<
    Record<
      string,
      {
        readonly imports: readonly Import[];
        readonly inputs: Readonly<Record<string, { readonly bytesInOutput: number }>>;
      }
    >
  >;
}

export interface Findings {
  readonly bytes: number;
  readonly heaviest: readonly { readonly input: string; readonly bytes: number }[];
  readonly strangers: readonly { readonly input: string; readonly why: string; readonly chain: readonly string[] }[];
}

export function initialOutputs(metafile: Metafile): string[];
export function examine(metafile: Metafile, transferOf: (output: string) => number): Findings;
export function complaint(application: string, findings: Findings, limit: number): string | undefined;
