import { readFileSync } from 'node:fs';
import { create, type Font } from 'fontkit';
import { paperFonts } from './paper-fonts';

const woff = readFileSync('node_modules/@fontsource/source-sans-3/files/source-sans-3-latin-400-normal.woff');
const widths = (font: Font, text: string): number[] => font.layout(text).positions.map(({ xAdvance }) => xAdvance);

describe('the fonts of papers', () => {
  it('are the packed font, unpacked: an independent reader finds the same glyphs in both', () => {
    const unpacked = create(paperFonts().Sans) as Font;
    const packed = create(woff) as Font;
    expect(unpacked.postscriptName).toBe(packed.postscriptName);
    expect(unpacked.numGlyphs).toBe(packed.numGlyphs);
    expect(widths(unpacked, 'Lamb £12.40 é')).toEqual(widths(packed, 'Lamb £12.40 é'));
  });
});
