import type { FileDownload } from './api-client';

/** Hands a fetched file to the browser's downloads. */
export function saveFile({ fileName, blob }: FileDownload): void {
  const address = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}
