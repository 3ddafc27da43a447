import { z } from 'zod';
import { filterId, filterOf, filterText, ordered } from './list';

/** A client-made uuid: the id of the row to be, and the key by which a repeated request is known. */
export const rowId = z.uuid('This id is not a uuid.');
const words = (most: number) => z.string().trim().max(most, `Keep it under ${most.toLocaleString('en')} characters.`);
export const instant = z.iso.datetime({ offset: true, message: 'Give the time as ISO 8601 with its offset.' });
/** A check, cause or state of the rulebook; whether it exists is the edition's to say. */
export const rulebookId = z.string().regex(/^[a-z0-9][a-z0-9-]{0,79}$/, 'This is not an id of the rulebook.');

/** Milliseconds to add to the device's clock to get ours. */
export const clockOffsetMs = z.number().min(-1e11).max(1e11).default(0);

export const caseId = rowId;

/** The state of the case that a write was decided on, for a script that wants it refused on any other. */
const caseVersion = z.string().max(60).optional();

export const openCaseInput = z.strictObject({
  id: rowId,
  /** A unit that exists, or what is needed to make one on the spot. */
  unit: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('known'), unitId: rowId }),
    z.strictObject({
      kind: z.literal('new'),
      id: rowId,
      fleetNumber: words(40).min(1, 'Give the unit its fleet number.'),
      siteId: rowId,
      vehicleKind: z.enum(['truck', 'bus'], 'Choose truck or bus.'),
    }),
  ]),
  complaints: z.array(rulebookId).min(1, 'Choose at least one complaint.').max(20),
  complaintWords: words(2000).optional(),
  /** As typed: "410,000 miles". */
  odometer: words(40).optional(),
  engineHours: words(40).optional(),
  odometerReplaced: z.boolean().default(false),
});

export const stageInput = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('diagnosis') }),
  z.strictObject({ kind: z.literal('after-remedy'), remedy: z.int().min(0).max(99) }),
  z.strictObject({ kind: z.literal('release') }),
  z.strictObject({ kind: z.literal('watch') }),
]);

/** The readings of a sum as typed, with or without a unit, by the id of its input; left out: the usual. */
export const sumInputs = z.record(
  z.string().regex(/^[a-z][A-Za-z0-9]{0,40}$/, 'This is not an input of a sum.'),
  z.strictObject({ value: words(60).optional(), error: words(60).optional() }),
);

const sureness = z.enum(['sure', 'think-so']);

export const answerInput = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('state'), state: rulebookId, sureness }),
  /** Value and error as typed, with or without a unit: "8,3 bar". */
  z.strictObject({ kind: z.literal('measured'), value: words(40).min(1, 'Enter what you measured.'), error: words(40).optional(), sureness }),
  /** Worked out on the bench: what went in, as typed. It is worked out anew where it is kept. */
  z.strictObject({
    kind: z.literal('sum'),
    /** Another way to what the check's own sum gives; without it the check's own. */
    sum: rulebookId.optional(),
    inputs: sumInputs,
    sureness,
  }),
  z.strictObject({ kind: z.literal('cannot-tell') }),
  z.strictObject({ kind: z.literal('skip') }),
  /** Takes the current answer back: the check is open again. */
  z.strictObject({ kind: z.literal('undo') }),
]);

export const recordFindingInput = z.strictObject({
  id: rowId,
  caseId,
  checkId: rulebookId,
  stage: stageInput.default({ kind: 'diagnosis' }),
  answer: answerInput,
  askedBecause: z.enum(['suggested', 'always', 'random', 'choice', 'panel']).default('choice'),
  deviceAt: instant,
  clockOffsetMs,
});
export type AnswerInput = z.input<typeof answerInput>;
export type RecordFindingInput = z.input<typeof recordFindingInput>;

export const noteFindingInput = z.strictObject({
  id: rowId,
  caseId,
  findingId: rowId,
  text: words(2000).min(1, 'Write something first.'),
});

export const DANGERS = ['engine-running', 'brakes-released', 'system-opened'] as const;

export const acknowledgeCautionsInput = z.strictObject({
  caseId,
  checkId: rulebookId,
  cautions: z.array(z.strictObject({ id: rowId, cautionId: rulebookId })).min(1).max(20),
  /** When they were read, if that was before now; and what to add to the device's clock to get ours. */
  deviceAt: instant.optional(),
  clockOffsetMs,
});

/** Work with cautions of its own, besides checks and remedies. */
export const acknowledgeWorkInput = z.strictObject({
  caseId,
  work: z.enum(['fitting', 'break-in']),
  cautions: z.array(z.strictObject({ id: rowId, cautionId: rulebookId })).min(1).max(20),
});

export const SURENESS_OF_CALL = ['sure', 'fairly-sure', 'guess'] as const;

export const callCauseInput = z.strictObject({
  id: rowId,
  caseId,
  mainCause: rulebookId,
  contributingCauses: z.array(rulebookId).max(10).default([]),
  sureness: z.enum(SURENESS_OF_CALL, 'Say how sure you are.'),
  whyNotLeading: words(2000).optional(),
  unlistedCause: words(500).optional(),
  /** The ranking that stood on the screen. */
  runId: rowId.optional(),
  version: caseVersion,
});

export const reopenCaseInput = z.strictObject({
  id: rowId,
  caseId,
  version: caseVersion,
  reason: words(2000).min(1, 'Say why you reopen it.'),
});

export const assignCaseInput = z.strictObject({ caseId, personId: rowId.nullable(), version: caseVersion });

export const readCaseInput = z.strictObject({ caseId, at: instant.optional() });

export const CASE_STATUSES = ['open', 'called', 'closed'] as const;

export const listCasesInput = z.object({
  q: filterText,
  /** "standing": open or called, so that the unit still stands somewhere. */
  status: z.enum(['standing', ...CASE_STATUSES, 'all']).catch('standing').default('standing'),
  site: filterId,
  /** Whose: the reader's own, nobody's, or somebody's by id. */
  whose: z.union([z.literal(['me', 'nobody']), z.uuid()]).optional().catch(undefined),
  complaint: rulebookId.optional().catch(undefined),
  held: filterOf(['yes']),
  ...ordered(['opened', 'number', 'unit', 'site', 'active']),
  direction: z.enum(['asc', 'desc']).catch('desc').default('desc'),
});
export type ListCasesInput = z.input<typeof listCasesInput>;
