export const usage: string;
export function readStartOptions(
  words: string[],
  env: Record<string, string | undefined>,
): { reset: boolean; seed: boolean; help: boolean; port: number };
