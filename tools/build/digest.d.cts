export function digestOf(root: string, files: string[], settings?: string): string;
export function filesUnder(root: string, folder: string, wanted?: (path: string) => boolean): string[];
