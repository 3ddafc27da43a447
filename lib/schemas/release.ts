import { z } from 'zod';
import { optionalLine, rowId } from './common';

export const releaseInput = z.strictObject({ caseId: rowId });
export const releaseUnitInput = z.strictObject({ id: rowId, caseId: rowId, note: optionalLine(500) });

export interface ReleaseCheckView {
  checkId: string;
  name: string;
  /** What found oil downstream, where that is why it is asked; null: it is always asked. */
  because: string | null;
  verdict: 'in-order' | 'out' | 'missing';
  /** stale: measured before the last work on the vehicle. */
  measured: { findingId: string; answer: string; by: string; at: string; stale: boolean; judgement: string | null } | null;
}

export interface ReleaseView {
  caseId: string;
  unitId: string;
  checks: ReleaseCheckView[];
  /** Why it can't be released yet, in a sentence; null: it can. */
  whyNot: string | null;
  /** What stands against the unit, of any case, that has not passed. */
  holds: string[];
  /** The reader has the right to release. */
  mayRelease: boolean;
  releases: { id: string; releasedAt: string; releasedBy: string; basis: string | null; note: string | null; on: { name: string; answer: string }[] }[];
}
