import { z } from 'zod';
import { rulebookId } from './case';
import { checkbox, line, optionalLine, rowId, several } from './common';

const ofSite = { siteId: rowId };

export const listGatesInput = z.strictObject(ofSite);
export const viewGateInput = z.strictObject({ ...ofSite, gateId: rowId });

export const makeGateInput = z.strictObject({
  id: rowId,
  ...ofSite,
  name: line('where it hangs', 80),
  askWhom: line('whom to ask', 120),
  days: z.coerce.number<string | number>('Say how many days.').int().min(1, 'One day at least.').max(730, '730 days at most.').default(365),
});
export const revokeGateInput = z.strictObject({ ...ofSite, gateId: rowId });

const token = z.string('Open the link that you were given.').min(1, 'Open the link that you were given.').max(1000, 'This is not one of our links.');
/** One that isn't an id is the first screen again. */
export const openGateInput = z.strictObject({ token, passageId: rowId.optional().catch(undefined) });

export const enterGateInput = z.strictObject({
  token,
  id: rowId,
  fleetNumber: line('the unit’s number', 40),
  name: line('your name', 80),
  complaints: several(rulebookId),
});

export const answerGateInput = z.strictObject({
  token,
  id: rowId,
  passageId: rowId,
  checkId: rulebookId,
  hasReadCautions: checkbox,
  /** The answer of a check with answers. */
  state: z.union([z.literal(''), rulebookId]).nullish().transform((state) => state || null),
  /** What was measured, as typed: "48 s". */
  value: optionalLine(40),
  /** Instead of an answer. */
  cannotTell: checkbox,
});

export const finishGateInput = z.strictObject({ token, passageId: rowId });

export const gateOutcomeInput = z.strictObject({});

/** A fit this many days after a passage, at most, is what the passage was about. Common practice, no source. */
export const DAYS_FROM_PASSAGE_TO_FIT = 30;
