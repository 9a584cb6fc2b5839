import { readFileSync } from 'node:fs';
import { inflateSync } from 'node:zlib';

const WOFF_SIGNATURE = 0x774f4646;
const WOFF_HEADER = 44;
const WOFF_ENTRY = 20;
const SFNT_HEADER = 12;
const SFNT_ENTRY = 16;

const padded = (length: number): number => (length + 3) & ~3;

/**
 * Unpacks a WOFF 1.0 file into the font that it holds (W3C Recommendation "WOFF File Format 1.0", sections 3 to 5). The
 * PDF library reads packed fonts too, but inflates whole tables anew for every glyph.
 */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.readUInt32BE(0) !== WOFF_SIGNATURE) throw new Error('Not a WOFF file');
  const count = woff.readUInt16BE(12);
  const tables = Array.from({ length: count }, (_, at) => {
    const entry = WOFF_HEADER + at * WOFF_ENTRY;
    const offset = woff.readUInt32BE(entry + 4);
    const packedLength = woff.readUInt32BE(entry + 8);
    const length = woff.readUInt32BE(entry + 12);
    const packed = woff.subarray(offset, offset + packedLength);
    return {
      tag: woff.readUInt32BE(entry),
      checksum: woff.readUInt32BE(entry + 16),
      bytes: packedLength === length ? packed : inflateSync(packed),
    };
  });
  const size = tables.reduce((sum, { bytes }) => sum + padded(bytes.length), SFNT_HEADER + count * SFNT_ENTRY);
  const font = Buffer.alloc(size);
  const power = Math.floor(Math.log2(count));
  font.writeUInt32BE(woff.readUInt32BE(4), 0);
  font.writeUInt16BE(count, 4);
  font.writeUInt16BE(16 * 2 ** power, 6);
  font.writeUInt16BE(power, 8);
  font.writeUInt16BE(16 * count - 16 * 2 ** power, 10);
  let offset = SFNT_HEADER + count * SFNT_ENTRY;
  tables.forEach(({ tag, checksum, bytes }, at) => {
    const entry = SFNT_HEADER + at * SFNT_ENTRY;
    font.writeUInt32BE(tag, entry);
    font.writeUInt32BE(checksum, entry + 4);
    font.writeUInt32BE(offset, entry + 8);
    font.writeUInt32BE(bytes.length, entry + 12);
    bytes.copy(font, offset);
    offset += padded(bytes.length);
  });
  return font;
}

const shipped = (path: string): Buffer => unpackWoff(readFileSync(path));

let fonts: Readonly<Record<'Sans' | 'Sans-Bold', Buffer>> | undefined;

/** The shipped fonts of papers, by the names that papers use; read once. */
export const paperFonts = () =>
  (fonts ??= {
    Sans: shipped(require.resolve('@fontsource/source-sans-3/files/source-sans-3-latin-400-normal.woff')),
    'Sans-Bold': shipped(require.resolve('@fontsource/source-sans-3/files/source-sans-3-latin-600-normal.woff')),
  });
