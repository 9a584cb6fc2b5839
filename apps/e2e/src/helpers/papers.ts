import { readFile } from 'node:fs/promises';
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { tidy } from './reading';

/** What a PDF says, by its bytes or where it lies: all its pages, with one space between words. */
export async function pdfText(paper: Uint8Array | string): Promise<string> {
  const data = typeof paper === 'string' ? new Uint8Array(await readFile(paper)) : paper;
  const loading = getDocument({ data, useSystemFonts: true, isEvalSupported: false });
  const document = await loading.promise;
  const pages: string[] = [];
  for (let number = 1; number <= document.numPages; number += 1) {
    const { items } = await (await document.getPage(number)).getTextContent();
    pages.push(items.map((item) => ('str' in item ? item.str : '')).join(' '));
  }
  await loading.destroy();
  return tidy(pages.join(' '));
}
