import type { Stage, StateShare } from '@/lib/diagnose/types';

/** What deciding which answer is current takes. */
export interface Dated {
  id: string;
  checkId: string;
  stage: Stage;
  correctedAt: Date;
  receivedAt: Date;
}

interface Answered extends Dated {
  kind: string;
  source: string;
  shares: readonly StateShare[];
}

/** A check at a stage: what can have one current answer. */
export const slotOf = ({ checkId, stage }: Pick<Dated, 'checkId' | 'stage'>) =>
  `${checkId}@${stage.kind}${stage.kind === 'after-remedy' ? stage.remedy : ''}`;

/** Later by device time, corrected for its clock; then received later; then the larger id, so that all see the same. */
export function isNewer(a: Dated, b: Dated): boolean {
  const later = a.correctedAt.getTime() - b.correctedAt.getTime() || a.receivedAt.getTime() - b.receivedAt.getTime();
  return later === 0 ? a.id > b.id : later > 0;
}

/** How an answer that comes stands to those that are there: what it would replace, and whether it comes too late for it. */
export function arriving<Row extends Dated>(dated: Dated, rows: readonly Row[]): { standing: Row | undefined; late: boolean } {
  const standing = currentFindings(rows).find((other) => slotOf(other) === slotOf(dated));
  return { standing, late: standing !== undefined && !isNewer(dated, standing) };
}

/** The current answer of each check and stage: the latest. */
export function currentFindings<Row extends Dated>(rows: readonly Row[]): Row[] {
  const latest = new Map<string, Row>();
  for (const row of rows) {
    const held = latest.get(slotOf(row));
    if (!held || isNewer(row, held)) latest.set(slotOf(row), row);
  }
  return [...latest.values()];
}

/**
 * The answers that stand: the current ones, less those taken back. What the record said stands again where a person's
 * answer says nothing ("can't tell", skipped, taken back).
 */
export function standingFindings<Row extends Answered>(rows: readonly Row[]): Row[] {
  const recorded = new Map(currentFindings(rows.filter((row) => row.source === 'record')).map((row) => [slotOf(row), row]));
  return currentFindings(rows).flatMap((row) => {
    if (row.shares.length > 0) return [row];
    const record = recorded.get(slotOf(row));
    if (record) return [record];
    return row.kind === 'undo' ? [] : [row];
  });
}
