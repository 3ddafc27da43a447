import type { Transaction } from '@/db/connect';
import { insertGateAnswer, insertPassage, lockPassage, selectOpenCase, selectUnitAtSite, type GatePassageRow } from '@/db/queries/gate';
import { readAnswer } from '@/lib/case/read-answer';
import type { CompiledCheck } from '@/lib/diagnose';
import { conflict, invalid, notFound } from '@/lib/errors';
import type { AnswerInput } from '@/lib/schemas/case';
import { answerGateInput, enterGateInput, finishGateInput } from '@/lib/schemas/gate';
import { complaintIds } from '../case/complaints';
import { tryOrRefuse } from '../session/tries';
import { defineVisit } from '../visit';
import { settlePassage } from './settle';
import { standingOf } from './standing';
import { passageOf, takenPassage, throughGate, type Opened } from './through';
import { rulebookInForce } from './view';

/** Begins a passage with a unit's number. A number that isn't one of the site's opens nothing: units are made by people with a sign-in. */
export const enterGate = defineVisit({
  input: enterGateInput,
  run: async ({ visitor, input: { token, id, fleetNumber, name, complaints } }) => {
    await tryOrRefuse(visitor, 'gate unit by network', visitor.network);
    return throughGate(visitor, token, async (tx, opened) => {
      const { gate, site, organisation, at } = opened;
      const of = { organisationId: organisation.id, siteId: site.id };
      const unit = await selectUnitAtSite(tx, { ...of, fleetNumber });
      if (!unit) throw invalid({ fleetNumber: `No unit of ${site.name} bears this number. Ask ${gate.askWhom}.` });
      const already = await lockPassage(tx, { ...of, passageId: id });
      if (already) {
        if (already.passage.gateId !== gate.id || already.passage.unitId !== unit.id) throw takenPassage();
        return { passageId: id };
      }
      const { editionId, compiled } = await rulebookInForce(tx, organisation.id);
      if (complaints.length === 0) throw invalid({ complaints: 'Choose at least one.' });
      if (complaints.some((one) => !complaintIds(compiled).includes(one))) throw invalid({ complaints: 'Choose from these.' });
      const open = await selectOpenCase(tx, { ...of, unitId: unit.id });
      const row = { ...of, id, gateId: gate.id, unitId: unit.id, editionId: open?.editionId ?? editionId, complaints: [...new Set(complaints)], byName: name, startedAt: at };
      // Another organisation's passage with this id isn't seen from here.
      const passage = await insertPassage(tx, row);
      if (!passage) throw takenPassage();
      await settleAtItsEnd(tx, opened, passage);
      return { passageId: id };
    });
  },
});

/** Answers the check at hand; the last answer ends the passage. Sent twice, it is one answer and one passage. */
export const answerGate = defineVisit({
  input: answerGateInput,
  run: ({ visitor, input: { token, id, passageId, checkId, hasReadCautions, ...typed } }) =>
    throughGate(visitor, token, async (tx, opened) => {
      const found = await passageOf(tx, opened, passageId);
      if (!found) throw notFound('passage');
      const { passage } = found;
      const { compiled, answers, spent, next } = await standingOf(tx, opened, passage);
      if (answers.some((answer) => answer.id === id || answer.checkId === checkId)) return { passageId };
      const check = compiled.checks.get(checkId);
      if (passage.endedAt || next?.checkId !== checkId || !check) throw conflict('Something else is asked by now. Load the page again.');
      const answer = answerOf(check, typed);
      const { cautions } = check.check;
      if (answer.kind !== 'cannot-tell' && cautions.length > 0 && !hasReadCautions) throw invalid({ hasReadCautions: 'Read the cautions first.' });
      // Refused here, beside the field, and not at the end.
      readAnswer(check, answer, opened.writing);
      const written = await insertGateAnswer(tx, { organisationId: passage.organisationId, id, passageId, checkId, place: spent.checks + 1, answer, cautions: answer.kind === 'cannot-tell' ? [] : cautions, minutes: next.minutes, at: opened.at });
      if (!written) throw conflict('This id belongs to another answer.');
      await settleAtItsEnd(tx, opened, passage);
      return { passageId };
    }),
});

/** Ends a passage to which nothing is left to ask, because the bay has answered it meanwhile. */
export const finishGate = defineVisit({
  input: finishGateInput,
  run: ({ visitor, input: { token, passageId } }) =>
    throughGate(visitor, token, async (tx, opened) => {
      const found = await passageOf(tx, opened, passageId);
      if (!found) throw notFound('passage');
      await settleAtItsEnd(tx, opened, found.passage);
      return { passageId };
    }),
});

type Given = Extract<AnswerInput, { kind: 'state' | 'measured' | 'cannot-tell' }>;

function answerOf({ check }: CompiledCheck, { state, value, cannotTell }: { state: string | null; value: string | null; cannotTell: boolean }): Given {
  if (cannotTell) return { kind: 'cannot-tell' };
  if (check.kind === 'measured') {
    if (!value) throw invalid({ value: 'Enter what you measured, or say that you can’t tell.' });
    return { kind: 'measured', value, sureness: 'sure' };
  }
  if (!state) throw invalid({ state: 'Choose an answer.' });
  return { kind: 'state', state, sureness: 'sure' };
}

async function settleAtItsEnd(tx: Transaction, opened: Opened, passage: GatePassageRow): Promise<void> {
  if (passage.endedAt) return;
  if (!(await standingOf(tx, opened, passage)).next) await settlePassage(tx, opened, passage);
}
