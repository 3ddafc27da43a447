import { sql, type SQL } from 'drizzle-orm';
import type { AnyPgColumn } from 'drizzle-orm/pg-core';

/**
 * Orders text as people count: K-2 before K-10, however it is capitalised. Digits are padded to the width of the longest
 * number that a fleet number can hold.
 */
export const naturally = (column: AnyPgColumn): SQL => sql`(
  select array_agg(case when part[1] ~ '^[0-9]' then lpad(part[1], 40, '0') else part[1] end order by place)
  from regexp_matches(lower(${column}), '[0-9]+|[^0-9]+', 'g') with ordinality as parts(part, place)
)`;
