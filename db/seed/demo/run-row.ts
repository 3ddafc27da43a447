import { rank, type Finding, type Ranking, type RecordFacts } from '@/lib/diagnose';
import { newId } from '@/lib/ids';
import { ORGANISATION } from './organisation';
import type { Random } from './random';
import type { World } from './world';

interface Asked {
  caseId: string;
  findings: Finding[];
  recordFacts: RecordFacts;
  becauseOf: string | null;
  at: Date;
}

/**
 * Ranks and keeps the run, as lib/services/case/run-of-record does, but by the compiled half: the engine would take ten
 * times as long. That it fires the same rules is tested on a sample of the demo's runs.
 */
export function makeRun({ compiled, editionId, rows }: World, random: Random, { caseId, findings, recordFacts, becauseOf, at }: Asked): { id: string; ranking: Ranking } {
  const ranking = rank(compiled, findings, { facts: recordFacts });
  const { settings, evidenceGroups } = compiled.rulebook;
  const id = newId(at.getTime(), random.bytes(16));
  rows.run.push({
    organisationId: ORGANISATION.id,
    id,
    caseId,
    editionId,
    rankerVersion: ranking.rankerVersion,
    inputs: {
      findings,
      recordFacts,
      beta: settings.beta,
      rho: Object.fromEntries(evidenceGroups.map((group) => [group.id, group.rho ?? settings.defaultRho])),
      limits: {},
    },
    result: { causes: ranking.causes.map(({ causeId, p, scoreNats }) => ({ causeId, p, scoreNats })), fired: ranking.fired, fit: ranking.fit },
    becauseOf,
    agreed: true,
    difference: null,
    durationMs: Math.round(random.between(200, 900)) / 100,
    at,
    createdAt: at,
  });
  return { id, ranking };
}
