import type { Transaction } from '@/db/connect';
import { selectPublishedEdition } from '@/db/queries/edition';
import { selectGateAnswers, type GatePassageRow } from '@/db/queries/gate';
import { answerText } from '@/lib/case/view/answer-text';
import { checkForVisitor } from '@/lib/case/view/check-for-visitor';
import type { CompiledRulebook } from '@/lib/diagnose';
import { conflict } from '@/lib/errors';
import { causesOfTheCompressor } from '@/lib/gate/verdict';
import { MOST_CHECKS } from '@/lib/gate/next';
import { openGateInput } from '@/lib/schemas/gate';
import { complaintIds } from '../case/complaints';
import { compiledEdition } from '../edition/compiled';
import { defineVisit } from '../visit';
import { readAnswers, standingOf } from './standing';
import { passageOf, throughGate, type Opened } from './through';

/** The rulebook that a passage begins with. @throws AppError "conflict" when it can't say what another compressor removes */
export async function rulebookInForce(tx: Transaction, organisationId: string) {
  const edition = await selectPublishedEdition(tx, organisationId);
  const compiled = edition && (await compiledEdition(tx, { organisationId, editionId: edition.id }));
  if (!edition || !compiled || causesOfTheCompressor(compiled.rulebook).size === 0) throw conflict('This gate can’t say anything yet: the workshop’s rulebook doesn’t say what another compressor removes.');
  return { editionId: edition.id, compiled };
}

/** What the page of a gate shows: of the fleet nothing but the number that was just entered, and what was answered here. */
export const viewGatePage = defineVisit({
  input: openGateInput,
  run: ({ visitor, input: { token, passageId } }) =>
    throughGate(visitor, token, async (tx, opened) => {
      const { organisation, site, gate } = opened;
      const found = passageId ? await passageOf(tx, opened, passageId) : undefined;
      const place = { organisationName: organisation.name, siteName: site.name, gateName: gate.name, askWhom: gate.askWhom };
      if (!found) return { ...place, step: 'enter' as const, complaints: await complaintsOf(tx, organisation.id) };
      const { passage, fleetNumber } = found;
      const of = { ...place, passageId: passage.id, fleetNumber };
      if (passage.endedAt) {
        const then = await compiledEdition(tx, { organisationId: organisation.id, editionId: passage.editionId });
        const answers = await selectGateAnswers(tx, { organisationId: organisation.id, passageId: passage.id });
        return { ...of, step: 'verdict' as const, ...verdictView(then, opened, passage, readAnswers(then, answers, opened.writing)) };
      }
      const { compiled, spent, next } = await standingOf(tx, opened, passage);
      const check = next && compiled.checks.get(next.checkId)?.check;
      if (!check) return { ...of, step: 'end' as const, answered: spent.checks };
      return {
        ...of,
        step: 'check' as const,
        place: spent.checks + 1,
        most: MOST_CHECKS,
        minutes: next.minutes,
        check: { id: check.id, ...checkForVisitor(compiled, check, opened.writing.units) },
      };
    }),
});

export type GatePage = Awaited<ReturnType<typeof viewGatePage>>;

async function complaintsOf(tx: Transaction, organisationId: string) {
  const { compiled } = await rulebookInForce(tx, organisationId);
  return complaintIds(compiled).map((id) => ({ id, label: compiled.checks.get(id)?.check.name ?? id }));
}

/**
 * What is said of a verdict. A cause is named with the answers given here that speak for it; one that stands there for what
 * the workshop knew before is not named to whoever holds the link.
 */
function verdictView({ rulebook, checks }: CompiledRulebook, { writing }: Opened, passage: GatePassageRow, answers: ReturnType<typeof readAnswers>) {
  const reasons = passage.reasons ?? [];
  const byCheck = new Map(answers.map((answer) => [answer.checkId, answer]));
  const said = (checkId: string) => {
    const [check, answer] = [checks.get(checkId)?.check, byCheck.get(checkId)];
    return { check: check?.name ?? checkId, answer: answer ? answerText(check, { ...answer, errorSi: null }, writing.units) : (check?.states.find(({ id }) => id === 'yes')?.label ?? '') };
  };
  const told = reasons.filter(({ because }) => because.length > 0);
  return {
    verdict: passage.verdict === 'fit' ? ('fit' as const) : ('not-yet' as const),
    reasons: told.map(({ causeId, because }) => {
      const cause = rulebook.causes.find(({ id }) => id === causeId);
      return { cause: cause?.name ?? causeId, sentence: cause?.sentence ?? '', because: because.map(({ checkId, word }) => ({ ...said(checkId), word })) };
    }),
    /** Something that isn't told weighs too. */
    isMoreKnown: told.length < reasons.length,
    answers: answers.map(({ checkId }) => said(checkId)),
    /** Answers given here that forbid the unit's release. */
    forbids: answers.filter(({ checkId, shares }) => checks.get(checkId)?.check.states.some(({ id, holdsRelease }) => holdsRelease && id === shares[0]?.state)).map(({ checkId }) => checks.get(checkId)?.check.name ?? checkId),
  };
}
