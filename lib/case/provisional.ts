import { dangersOf } from '@/lib/diagnose/cautions';
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { rank } from '@/lib/diagnose/rank';
import type { Waiting } from '@/lib/schemas/waiting';
import type { CaseKit } from '@/lib/schemas/case-kit';
import type { StateParts } from './build-state';
import { correctedTime } from './corrected-time';
import { arriving } from './current-findings';
import { findingsForRanking, rankOptions } from './findings-for-ranking';
import { readAnswer } from './read-answer';
import type { FindingRow } from './rows';
import { siteDay } from './site-day';
import { comparedWith } from './view/usual';
import { vehicleAfter } from './vehicle-after';

interface Asked {
  compiled: CompiledRulebook;
  kit: CaseKit;
  /** What was done on this device and is not in the kit, in the order of doing. */
  waiting: readonly Waiting[];
  now: Date;
}

/**
 * What a case's state is made of on a device: what it last had of the server, and what was done here since. The same
 * parts give the same state, and so the same ranking, as on the server.
 */
export function provisionalParts({ compiled, kit, waiting, now }: Asked): StateParts {
  const taken = waiting.filter(({ refusal }) => refusal === null);
  const kept = kit.rows.map((row): FindingRow => ({ ...row, correctedAt: new Date(row.correctedAt), receivedAt: new Date(row.receivedAt) }));
  const known = new Set(kept.map(({ id }) => id));
  const given = taken.filter((item): item is Extract<Waiting, { kind: 'finding' }> => item.kind === 'finding' && !known.has(item.id));

  let rows = kept;
  let before = kept;
  let vehicleState = kit.vehicleState;
  for (const item of given) {
    before = rows;
    rows = [...rows, rowOf(item, { compiled, kit, rows, now })];
    if (rows.at(-1)?.shares.length) vehicleState = vehicleAfter(vehicleState, compiled.checks.get(item.body.checkId)?.check.setUp ?? {});
  }

  const { recordFacts } = kit.run;
  const ranking = (of: readonly FindingRow[]) => {
    const findings = findingsForRanking(of);
    return rank(compiled, findings, rankOptions(findings, recordFacts));
  };
  const last = given.at(-1);
  const keptNotes = kit.notes.map((note) => ({ ...note, at: new Date(note.at) }));
  const knownNotes = new Set(keptNotes.map(({ id }) => id));
  return {
    compiled,
    head: { id: kit.caseId, version: kit.version, status: kit.status, vehicleState, labourRatePerHour: kit.labourRatePerHour },
    rows,
    notes: [
      ...keptNotes,
      ...taken.flatMap((item) =>
        item.kind === 'note' && !knownNotes.has(item.id) ? [{ id: item.id, findingId: item.findingId, text: item.body.text, person: kit.person.name, at: now }] : [],
      ),
    ],
    run: { id: last?.id ?? kit.run.id, ranking: ranking(rows), recordFacts, becauseOf: last?.id ?? kit.run.becauseOf, differs: false },
    previous: last ? ranking(before) : kit.previous && { causes: kit.previous },
    acknowledged: acknowledged({ compiled, kit, waiting: taken, now }),
    units: kit.person.units,
    at: null,
  };
}

interface Surroundings {
  compiled: CompiledRulebook;
  kit: CaseKit;
  rows: readonly FindingRow[];
  now: Date;
}

function rowOf({ id, body }: Extract<Waiting, { kind: 'finding' }>, { compiled, kit, rows, now }: Surroundings): FindingRow {
  const check = compiled.checks.get(body.checkId);
  if (!check) throw new Error(`the edition has no check ${body.checkId}`);
  const correctedAt = correctedTime(body, now);
  const dated = { id, checkId: body.checkId, stage: body.stage ?? { kind: 'diagnosis' as const }, correctedAt, receivedAt: correctedAt };
  const answer = readAnswer(check, body.answer, kit.person, kit.limits?.[body.checkId]);
  return {
    ...answer,
    ...dated,
    baseline: comparedWith(body.checkId, answer, kit.baselines),
    source: answer.sum ? 'sum' : 'asked',
    askedBecause: body.askedBecause ?? 'choice',
    person: kit.person.name,
    late: arriving(dated, rows).late,
  };
}

function acknowledged({ compiled, kit, waiting, now }: Asked): StateParts['acknowledged'] {
  const today = siteDay(now, kit.timeZone);
  const here = waiting.flatMap((item) => {
    if (item.kind !== 'acknowledgement' || siteDay(correctedTime(item.body, now), kit.timeZone) !== today) return [];
    const dangers = dangersOf(compiled.checks.get(item.body.checkId)?.check.setUp ?? {});
    return item.body.cautions.map(({ cautionId }) => ({ cautionId, dangers }));
  });
  return [...(kit.acknowledgedOn === today ? kit.acknowledged : []), ...here];
}
