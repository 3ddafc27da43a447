import { DOSSIER_SECTIONS, type DossierBlock, type DossierContent, type DossierSectionId } from '@/lib/schemas/dossier-content';
import type { UnitPreferences } from '@/lib/units';
import { momentText } from './moment';
import { makeNamer } from './namer';
import { breakInSection, type BreakInPart } from './sections/break-in';
import { callSection, type CallPart } from './sections/call';
import { complaintSection, type ComplaintPart } from './sections/complaint';
import { findingsSection, measurementsSection, type FindingsPart } from './sections/findings';
import { fitsSection, type FitPart } from './sections/fits';
import { installSection, type InstallPart } from './sections/install';
import { photosSection, type PhotoPart } from './sections/photos';
import { proofSection, type ProofPart } from './sections/proof';
import { rankingSection, type RankingPart } from './sections/ranking';
import { releaseSection, type ReleasePart } from './sections/release';
import { repairsSection, type RepairPart } from './sections/repairs';
import { unitSection, type UnitPart } from './sections/unit';
import type { Writer } from './writer';

/** What a dossier is made from: one part for each section. */
export interface DossierParts {
  about: { reference: string; organisation: string; caseNumber: number; madeAt: Date; madeBy: string; timeZone: string };
  units: UnitPreferences;
  unit: UnitPart;
  fits: readonly FitPart[];
  complaint: ComplaintPart;
  findings: FindingsPart;
  photos: readonly PhotoPart[];
  ranking: RankingPart;
  call: CallPart | null;
  repairs: readonly RepairPart[];
  installs: readonly InstallPart[];
  breakIns: readonly BreakInPart[];
  releases: readonly ReleasePart[];
  watches: readonly ProofPart[];
}

/** What its maker wants kept out of it. */
export interface LeftOut {
  sections: readonly DossierSectionId[];
  photoIds: readonly string[];
  names: boolean;
  fleet: boolean;
}

/** Each section by its own function; another one is a file of `sections/`, a part above and a line here. */
const WRITE: Record<DossierSectionId, (parts: DossierParts, writer: Writer, out: LeftOut) => DossierBlock[]> = {
  unit: ({ unit }, writer, { fleet }) => unitSection(unit, writer, { withoutFleet: fleet }),
  fits: ({ fits }, writer) => fitsSection(fits, writer),
  complaint: ({ complaint }, writer) => complaintSection(complaint, writer),
  measurements: ({ findings }, writer) => measurementsSection(findings, writer),
  findings: ({ findings }, writer) => findingsSection(findings, writer),
  photos: ({ photos }, writer, { photoIds }) => photosSection(photos.filter(({ id }) => !photoIds.includes(id)), writer),
  ranking: ({ ranking }, writer) => rankingSection(ranking, writer),
  call: ({ call }, writer) => callSection(call, writer),
  repairs: ({ repairs }, writer) => repairsSection(repairs, writer),
  install: ({ installs }, writer) => installSection(installs, writer),
  'break-in': ({ breakIns }, writer) => breakInSection(breakIns, writer),
  release: ({ releases }, writer) => releaseSection(releases, writer),
  proof: ({ watches }, writer) => proofSection(watches, writer),
};

const CAUTION =
  'The ranking of causes is advice, worked out from what was found; it is no proof of a cause. The vehicle maker’s and the compressor maker’s service information, local rules and a qualified person’s judgement come first.';

/**
 * What a dossier says, as plain data: the same parts always give the same content, so that its hash tells whether it was
 * changed. What was left out is said, so that nobody takes it for the whole.
 */
export function dossierContent(parts: DossierParts, out: LeftOut): DossierContent {
  const { reference, organisation, caseNumber, madeAt, madeBy, timeZone } = parts.about;
  const writer: Writer = { units: parts.units, timeZone, name: makeNamer({ withheld: out.names }) };
  const kept = DOSSIER_SECTIONS.filter(({ id }) => !out.sections.includes(id));
  // Written in their order, so that people who stay without a name are counted as they appear.
  const head = [
    { term: 'Case', value: String(caseNumber) },
    { term: 'Made', value: `${momentText(madeAt, timeZone)}, ${writer.name(madeBy)}` },
  ];
  return {
    form: 1,
    reference,
    organisation: out.fleet ? 'Organisation withheld' : organisation,
    title: out.fleet ? `Dossier of case ${caseNumber}` : `Dossier of case ${caseNumber}: unit ${parts.unit.unit.fleetNumber}`,
    head,
    sections: kept.map(({ id, title }) => ({ id, title, blocks: WRITE[id](parts, writer, out) })),
    leftOut: leftOutWords(parts, out),
    caution: CAUTION,
  };
}

function leftOutWords({ photos }: DossierParts, { sections, photoIds, names, fleet }: LeftOut): string[] {
  const without = photos.filter(({ id }) => photoIds.includes(id)).length;
  return [
    ...DOSSIER_SECTIONS.filter(({ id }) => sections.includes(id)).map(({ title }) => title),
    ...(without > 0 && !sections.includes('photos') ? [`${without} of ${photos.length} photos`] : []),
    ...(names ? ['Names of people'] : []),
    ...(fleet ? ['Fleet and unit'] : []),
  ];
}
