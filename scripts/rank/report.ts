import {
  createWhatIf,
  explain,
  findingsFromRecord,
  nextChecks,
  openChecks,
  overRecord,
  stateAfter,
  AS_PARKED,
  type CompiledRulebook,
  type ExplainedCause,
  type Ranking,
  type Suggestion,
} from '@/lib/diagnose';
import { runOfRecord } from '@/lib/diagnose/record-run';
import type { Input } from './read-findings';

/** What `npm run rank -- --json` prints. */
export interface Report {
  rulebook: string;
  rankerVersion: string;
  /** Whether json-rules-engine and the compiled predicates fired the same rules. */
  agreed: boolean;
  fit: Ranking['fit'];
  /** Highest first, each with its reasons; weights in decibans. */
  causes: ({ name: string } & ExplainedCause)[];
  suspicion: Ranking['suspicion'];
  fired: string[];
  /** Checks that the record answered. */
  fromRecord: string[];
  enoughIsKnown: boolean;
  /** Best first. */
  nextChecks: ({ prompts: string[] } & Pick<Suggestion, 'checkIds' | 'word' | 'bits' | 'minutes' | 'setUpMinutes' | 'why'>)[];
  repairs: { remedyId: string; name: string; p: number }[];
}

/** Ranks, explains, and says what to do next: by the engine, as a run of record. */
export async function reportOn(compiled: CompiledRulebook, { findings, facts }: Input): Promise<Report> {
  const fromRecord = findingsFromRecord(compiled, facts);
  const all = overRecord(findings, fromRecord);
  const run = await runOfRecord(compiled, all, { facts });
  const { causes } = explain(compiled, all, { facts });
  const next = nextChecks(openChecks(createWhatIf(compiled, all, { facts }), all), { vehicle: whereItStands(compiled, findings) });
  const { rulebook } = compiled;
  const nameOf = (list: readonly { id: string; name: string }[], id: string) => list.find((each) => each.id === id)?.name ?? id;
  return {
    rulebook: rulebook.title,
    rankerVersion: run.ranking.rankerVersion,
    agreed: run.agreed,
    fit: run.ranking.fit,
    causes: causes.map((cause) => ({ name: nameOf(rulebook.causes, cause.causeId), ...cause })),
    suspicion: run.ranking.suspicion,
    fired: run.engineFired,
    fromRecord: fromRecord.filter((finding) => all.includes(finding)).map(({ checkId }) => checkId),
    enoughIsKnown: next.enoughIsKnown,
    nextChecks: next.suggestions.map(({ checkIds, word, bits, minutes, setUpMinutes, why }) => ({
      checkIds,
      prompts: checkIds.map((id) => compiled.checks.get(id)?.check.prompt ?? id),
      word,
      bits,
      minutes,
      setUpMinutes,
      why,
    })),
    repairs: next.repair.steps.map(({ remedyId, p }) => ({ remedyId, name: nameOf(rulebook.remedies, remedyId), p })),
  };
}

/** A file of findings has no order, so the vehicle is taken to stand as the checks leave it in the order written. */
function whereItStands(compiled: CompiledRulebook, findings: Input['findings']) {
  const made = findings.filter(({ shares }) => shares.length > 0).flatMap(({ checkId }) => compiled.checks.get(checkId)?.check ?? []);
  return made.reduce((state, { setUp }) => stateAfter(state, setUp), AS_PARKED);
}
