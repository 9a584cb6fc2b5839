import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { tidy } from './reading';

/** What a PDF says, all its pages, with one space between words. */
export async function pdfText(bytes: Uint8Array): Promise<string> {
  const loading = getDocument({ data: bytes, useSystemFonts: true, isEvalSupported: false });
  const document = await loading.promise;
  const pages: string[] = [];
  for (let number = 1; number <= document.numPages; number += 1) {
    const { items } = await (await document.getPage(number)).getTextContent();
    pages.push(items.map((item) => ('str' in item ? item.str : '')).join(' '));
  }
  await loading.destroy();
  return tidy(pages.join(' '));
}
