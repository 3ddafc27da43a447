import { z } from 'zod';
import { stroke } from './photo';

/** What may stand in a dossier, in its order. */
export const DOSSIER_SECTIONS = [
  { id: 'unit', title: 'Unit and compressor', about: 'The vehicle, and the compressor on it when the case was opened' },
  { id: 'fits', title: 'History of compressors', about: 'Each compressor that was on the unit, how it was fitted and why it came out' },
  { id: 'complaint', title: 'Complaint', about: 'What it came in with, in codes and in words' },
  { id: 'measurements', title: 'Measurements', about: 'Each figure with the limit it was judged by, where that comes from and the verdict' },
  { id: 'findings', title: 'What was found', about: 'All other answers, by the place on the path of oil and air' },
  { id: 'photos', title: 'Photos', about: 'With what they show and when they were taken' },
  { id: 'ranking', title: 'Ranking of causes', about: 'As it stood when the cause was called, with the reasons' },
  { id: 'call', title: 'The call', about: 'Which cause was named, how surely, and how far it is proved' },
  { id: 'repairs', title: 'What was done', about: 'Each repair step by step: done, not done or doesn’t apply, with values' },
  { id: 'install', title: 'How it was fitted', about: 'Every point of the install record, with values and who said it' },
  { id: 'break-in', title: 'Break-in run', about: 'How long under load, what was read against the band, and the hot check' },
  { id: 'release', title: 'Release', about: 'What was measured after the repair, and who released the unit by what right' },
  { id: 'proof', title: 'Proof', about: 'What was read in the weeks after, how it ended and what that proves' },
] as const;

export type DossierSectionId = (typeof DOSSIER_SECTIONS)[number]['id'];
export const DOSSIER_SECTION_IDS = DOSSIER_SECTIONS.map(({ id }) => id) as [DossierSectionId, ...DossierSectionId[]];

const fact = z.strictObject({ term: z.string(), value: z.string() });
const column = z.strictObject({
  title: z.string(),
  /** Of the width, in parts of all columns together. */
  share: z.number().positive(),
  figure: z.boolean(),
});
const row = z.strictObject({
  cells: z.array(z.string()),
  /** Under the first cell, smaller: who and when. */
  note: z.string().nullable(),
  /** What a reader must not miss: set in bold, since it is printed in black. */
  strong: z.boolean(),
});
const photo = z.strictObject({
  id: z.uuid(),
  caption: z.string(),
  /** The check that it was taken for, and when and by whom. */
  about: z.string(),
  /** In pixels. */
  width: z.int(),
  height: z.int(),
  strokes: z.array(stroke),
  /** Of the picture as it is kept: it is the same as long as this is. */
  objectKey: z.string(),
});

/** What a section is made of. Page and PDF know these and nothing of the sections, so that another section is one file. */
export const dossierBlock = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('text'), text: z.string(), quiet: z.boolean() }),
  z.strictObject({ kind: z.literal('heading'), text: z.string() }),
  z.strictObject({ kind: z.literal('facts'), facts: z.array(fact) }),
  z.strictObject({ kind: z.literal('table'), columns: z.array(column), rows: z.array(row) }),
  z.strictObject({ kind: z.literal('levels'), levels: z.array(z.strictObject({ name: z.string(), p: z.number(), printed: z.string(), reasons: z.array(z.string()) })) }),
  z.strictObject({ kind: z.literal('photos'), photos: z.array(photo) }),
]);
export type DossierBlock = z.infer<typeof dossierBlock>;
export type DossierPhoto = z.infer<typeof photo>;

export const dossierSection = z.strictObject({
  /** One of those above when it was made; one that is no longer made stays readable. */
  id: z.string(),
  title: z.string(),
  blocks: z.array(dossierBlock),
});
export type DossierSection = z.infer<typeof dossierSection>;

/** Everything that a dossier says. Its hash is that of this, in canonical JSON. */
export const dossierContent = z.strictObject({
  form: z.literal(1),
  reference: z.string(),
  organisation: z.string(),
  title: z.string(),
  /** Case, when it was made, by whom: the lines of the head. */
  head: z.array(fact),
  sections: z.array(dossierSection),
  /** What its maker left out, in words. */
  leftOut: z.array(z.string()),
  caution: z.string(),
});
export type DossierContent = z.infer<typeof dossierContent>;
