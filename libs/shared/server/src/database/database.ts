import { Pool, types, type PoolConfig } from 'pg';

export interface Database {
  readonly pool: Pool;
  close(): Promise<void>;
}

const INT8 = 20;
const DATE = 1082;

/** bigint is read as a safe integer: past 2^53 it is an error, never a silent rounding. */
function readWholeNumber(text: string): number {
  const value = Number(text);
  if (!Number.isSafeInteger(value)) throw new RangeError(`${text} is past what a whole number can hold here`);
  return value;
}

/** Opens a pool that reads bigint as safe integers and dates as YYYY-MM-DD text. */
export function openDatabase(url: string, options: PoolConfig = {}): Database {
  const getTypeParser: typeof types.getTypeParser = ((oid: number, format?: 'text' | 'binary') => {
    if (oid === INT8) return readWholeNumber;
    if (oid === DATE) return (text: string) => text;
    return types.getTypeParser(oid, format as 'text');
  }) as typeof types.getTypeParser;
  const pool = new Pool({ connectionString: url, max: 10, types: { getTypeParser }, ...options });
  // A connection that breaks while idle is replaced by the next query; without a listener it would end the process.
  pool.on('error', () => undefined);
  return { pool, close: () => pool.end() };
}
