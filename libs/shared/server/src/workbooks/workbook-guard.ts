import { promisify } from 'node:util';
import { inflateRaw } from 'node:zlib';
import { RefusalError } from '@seamwright/shared/util';

const inflate = promisify(inflateRaw);

const LOCAL_HEADER = 0x04034b50;
const CENTRAL_HEADER = 0x02014b50;
const END_OF_DIRECTORY = 0x06054b50;
const END_LENGTH = 22;
const LONGEST_COMMENT = 65_535;
const STORED = 0;
const DEFLATED = 8;

const MOST_ENTRIES = 500;
const MOST_SHEET_BYTES = 8 * 1_048_576;
const MOST_BYTES = 32 * 1_048_576;

const unreadable = () => new RefusalError({ code: 'workbook-unreadable', params: {} });
const swollen = () => new RefusalError({ code: 'workbook-swollen', params: {} });

interface Entry {
  readonly name: string;
  readonly method: number;
  readonly packedBytes: number;
  readonly offset: number;
}

/**
 * Refuses what is not a workbook (`workbook-unreadable`), and one that unpacks to more than can be read
 * (`workbook-swollen`): each part is really unpacked, with a ceiling, since the sizes that a file declares may be untrue.
 * Layout of a ZIP file after PKWARE's APPNOTE, sections 4.3.7, 4.3.12 and 4.3.16.
 */
export async function guardWorkbook(bytes: Buffer): Promise<void> {
  const entries = readEntries(bytes);
  if (!entries.some(({ name }) => name === 'xl/workbook.xml')) throw unreadable();
  let [all, sheets] = [0, 0];
  for (const entry of entries) {
    const size = await unpackedBytes(bytes, entry, MOST_BYTES - all);
    all += size;
    if (entry.name.startsWith('xl/worksheets/')) sheets += size;
    if (sheets > MOST_SHEET_BYTES || all > MOST_BYTES) throw swollen();
  }
}

function readEntries(bytes: Buffer): Entry[] {
  const end = findEnd(bytes);
  const count = bytes.readUInt16LE(end + 10);
  if (count > MOST_ENTRIES) throw swollen();
  const entries: Entry[] = [];
  let at = bytes.readUInt32LE(end + 16);
  for (let read = 0; read < count; read++) {
    if (at + 46 > bytes.length || bytes.readUInt32LE(at) !== CENTRAL_HEADER) throw unreadable();
    const [nameLength, extraLength, commentLength] = [28, 30, 32].map((field) => bytes.readUInt16LE(at + field));
    const nameEnd = at + 46 + (nameLength ?? 0);
    entries.push({
      name: bytes.toString('utf8', at + 46, nameEnd),
      method: bytes.readUInt16LE(at + 10),
      packedBytes: bytes.readUInt32LE(at + 20),
      offset: bytes.readUInt32LE(at + 42),
    });
    at = nameEnd + (extraLength ?? 0) + (commentLength ?? 0);
  }
  return entries;
}

function findEnd(bytes: Buffer): number {
  const first = Math.max(0, bytes.length - END_LENGTH - LONGEST_COMMENT);
  for (let at = bytes.length - END_LENGTH; at >= first; at--)
    if (bytes.readUInt32LE(at) === END_OF_DIRECTORY) return at;
  throw unreadable();
}

async function unpackedBytes(bytes: Buffer, { method, packedBytes, offset }: Entry, most: number): Promise<number> {
  if (offset + 30 > bytes.length || bytes.readUInt32LE(offset) !== LOCAL_HEADER) throw unreadable();
  const start = offset + 30 + bytes.readUInt16LE(offset + 26) + bytes.readUInt16LE(offset + 28);
  if (start + packedBytes > bytes.length) throw unreadable();
  if (method === STORED) return packedBytes;
  if (method !== DEFLATED) throw unreadable();
  try {
    return (await inflate(bytes.subarray(start, start + packedBytes), { maxOutputLength: most + 1 })).length;
  } catch (error) {
    throw (error as { code?: string }).code === 'ERR_BUFFER_TOO_LARGE' ? swollen() : unreadable();
  }
}
