import { sql } from 'drizzle-orm';
import type { Transaction } from '@/db/connect';
import type { Rulebook } from '@/lib/diagnose/types';
import { publishFirstEdition, publishUpstream } from '../rulebook';
import { calendarTo } from './calendar';
import { EDITION_ID, beganOn, makeDemo } from './index';
import { ORGANISATION } from './organisation';
import { writePaper } from './paper';
import { writeOrganisation } from './people';
import { writeRows } from './write';

/**
 * Puts the demo organisation into an empty database: sites, people, the rulebook as its edition 1, and three years of
 * units, compressors and cases. Runs as the owner; what comes after it in the same transaction sees this organisation.
 *
 * @param today its start, UTC: the demo's history ends the day before
 */
export async function seedDemo(tx: Transaction, { today, rulebook }: { today: Date; rulebook: Rulebook }): Promise<void> {
  const { rows } = makeDemo(today, rulebook);
  const calendar = calendarTo(today);
  const createdAt = beganOn(calendar);
  await tx.execute(sql`select set_config('app.organisation_id', ${ORGANISATION.id}, true)`);
  await writeOrganisation(tx, { createdAt, calendar, nextCaseNumber: rows.cases.length + 1 });
  const upstreamNumber = await publishUpstream(tx, rulebook);
  await publishFirstEdition(tx, { organisationId: ORGANISATION.id, id: EDITION_ID, rulebook, upstreamNumber, at: createdAt });
  await writeRows(tx, rows);
  await writePaper(tx, calendar);
}
