import { sql, type RawBuilder } from 'kysely';
import type { Validity } from '@seamwright/pricing/domain';

/** Days as PostgreSQL keeps them: the last one is not in the range. */
export const daysOf = ({ validFrom, validUntil }: Validity): RawBuilder<string> =>
  sql<string>`daterange(${validFrom}::date, ${validUntil}::date)`;
