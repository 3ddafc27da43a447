import { selectPublishedEdition } from '@/db/queries/edition';
import { PERMITTED } from '@/lib/auth/permissions';
import type { Rulebook } from '@/lib/diagnose/types';
import { notFound } from '@/lib/errors';
import { readEntryInput, type EntryKind } from '@/lib/schemas/search';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';
import { stationName } from './rulebook';

/** A remedy, check or cause of the edition in force, as somebody reads it who found it. */
export interface RulebookEntry {
  kind: EntryKind;
  name: string;
  station: string | null;
  /** What it is, in sentences. */
  text: string[];
  /** Names under a heading: what a remedy removes, what removes a cause, how a check can be answered. */
  lists: { heading: string; items: string[] }[];
  /** Of looking and of doing, or of the check. */
  minutes: { what: string; minutes: number }[];
  cautions: string[];
}

/**
 * Steps are not among it where somebody could be hurt by them, nor elsewhere: they stand on a case, behind the cautions
 * that are read there each day.
 */
export const readRulebookEntry = defineRead({
  name: 'read.rulebook-entry',
  doing: 'see the rulebook',
  roles: PERMITTED['case.see'],
  input: readEntryInput,
  run: async ({ tx, ctx, input: { kind, id } }): Promise<RulebookEntry> => {
    const organisationId = ctx.organisation.id;
    const edition = await selectPublishedEdition(tx, organisationId);
    const entry = edition && entryOf((await compiledEdition(tx, { organisationId, editionId: edition.id })).rulebook, kind, id);
    if (!entry) throw notFound(kind);
    return entry;
  },
});

function entryOf(rulebook: Rulebook, kind: EntryKind, id: string): RulebookEntry | undefined {
  const cautionsOf = (ids: readonly string[]) => rulebook.cautions.filter((caution) => ids.includes(caution.id)).map(({ text }) => text);
  if (kind === 'check') {
    const check = rulebook.checks.find((one) => one.id === id);
    return check && {
      kind,
      name: check.name,
      station: stationName(check.station),
      text: [check.prompt, check.why],
      lists: [{ heading: 'Answers', items: check.states.map(({ label }) => label) }, { heading: 'Tools', items: check.tools }],
      minutes: [{ what: 'The check', minutes: check.minutes }],
      cautions: cautionsOf(check.cautions),
    };
  }
  if (kind === 'cause') {
    const cause = rulebook.causes.find((one) => one.id === id);
    return cause && {
      kind,
      name: cause.name,
      station: stationName(cause.station),
      text: [cause.sentence],
      lists: [{ heading: 'Remedies', items: rulebook.remedies.filter(({ causes }) => causes.includes(id)).map(({ name }) => name) }],
      minutes: [],
      cautions: [],
    };
  }
  const remedy = rulebook.remedies.find((one) => one.id === id);
  return remedy && {
    kind,
    name: remedy.name,
    station: stationName(remedy.station),
    text: [remedy.seenInBay ? 'Whether it helped shows in the bay.' : 'Whether it helped shows only in the weeks after.'],
    lists: [
      { heading: 'Removes', items: rulebook.causes.filter((cause) => remedy.causes.includes(cause.id)).map(({ name }) => name) },
      { heading: 'Parts', items: remedy.parts.map(({ name }) => name) },
    ],
    minutes: [{ what: 'To open, inspect and decide', minutes: remedy.look.minutes }, { what: 'To put right', minutes: remedy.fix.minutes }],
    cautions: cautionsOf(remedy.cautions),
  };
}
