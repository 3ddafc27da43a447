import { z } from 'zod';
import { rulebookId } from './case';
import { checkbox, email, line, optionalId, optionalLine, rowId } from './common';
import { READING_MEASURES } from './measures';
import { measureText, reason } from './record';

export const [ODOMETER] = READING_MEASURES;

export const watchInput = z.strictObject({ caseId: rowId });

export const BEGIN_ANSWERS = ['yes', 'no', 'not-applicable'] as const;

/** As forms, pages and documents say it. */
export const BEGIN_WORDS: Readonly<Record<(typeof BEGIN_ANSWERS)[number], string>> = { yes: 'Yes', no: 'No', 'not-applicable': 'Doesn’t apply' };

export const startWatchInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  /** One for each statement of the rulebook, in its order. */
  begin: z.array(z.strictObject({ answer: z.enum(BEGIN_ANSWERS, 'Answer this one.'), why: optionalLine(500) })).max(20),
  odometer: measureText,
});

const ofWatch = { caseId: rowId, watchId: rowId };

const optionalState = z.union([z.literal(''), rulebookId]).nullish().transform((state) => state || null);

const read = {
  /** The answer of a check with answers. */
  state: optionalState,
  /** What was measured, as typed: "48 s". */
  value: optionalLine(40),
  odometer: measureText,
  note: optionalLine(500),
};

export const addWatchReadingInput = z.strictObject({ id: rowId, ...ofWatch, checkId: rulebookId, ...read });
export const takeBackWatchReadingInput = z.strictObject({ ...ofWatch, readingId: rowId, whyTakenBack: reason });

export const endWatchInput = z.strictObject({
  ...ofWatch,
  outcome: z.enum(['held', 'comeback', 'lost'], 'Say what came of it.'),
  why: optionalLine(500),
  /** The id of the case that a comeback opens. */
  newCaseId: optionalId,
  /** An open case of the unit that is the comeback; left out: one is opened. */
  goesOnIn: optionalId,
});

export const createWatchLinkInput = z.strictObject({
  id: rowId,
  ...ofWatch,
  checkId: rulebookId,
  forWhom: line('who it is for', 80),
  /** Where it is mailed; without one it is there to be copied. */
  mailTo: z.union([z.literal(''), email]).nullish().transform((to) => to || null),
  days: z.coerce.number<string | number>('Say how many days.').int().min(1, 'One day at least.').max(60, '60 days at most.').default(14),
});
export const revokeWatchLinkInput = z.strictObject({ ...ofWatch, linkId: rowId });

const token = z.string('Open the link that you were given.').min(1, 'Open the link that you were given.').max(1000, 'This is not one of our links.');
export const viewWatchLinkInput = z.strictObject({ token });
export const readByLinkInput = z.strictObject({ token, id: rowId, name: line('your name', 80), hasReadCautions: checkbox, ...read });
