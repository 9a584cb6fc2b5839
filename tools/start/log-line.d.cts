export function forTerminal(line: string, stream: 'out' | 'err'): string | undefined;
