import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { StageAnswerForm, type StageAnswerAction } from '@/components/case/StageAnswerForm';
import { WorkCautions } from '@/components/case/WorkCautions';
import type { ActionState } from '@/lib/auth/form';
import { cautionsToRead, type Danger } from '@/lib/diagnose/cautions';
import type { Stage } from '@/lib/diagnose/types';
import type { CaseView, CheckView } from '@/lib/schemas/case-view';

type Acknowledged = ActionState<{ cautionId: string; dangers: Danger[] }[]>;

interface Props {
  view: CaseView;
  check: CheckView;
  stage: Stage;
  newId: string;
  actions: { readCautions: (previous: Acknowledged, form: FormData) => Promise<Acknowledged>; answer: StageAnswerAction };
}

/** A check outside the diagnosis: its cautions while they are unread, then its form. */
export function CheckAtStage({ view: { head, rulebook, state }, check, stage, newId, actions }: Props) {
  const toRead = cautionsToRead(check, (caution) => rulebook.cautions[caution]?.worseWhen ?? [], state.acknowledged);
  return (
    <div className="grid gap-4">
      {check.cautions.length > 0 && (
        <WorkCautions
          cautions={check.cautions.map((caution) => ({ id: caution, text: rulebook.cautions[caution]?.text ?? caution }))}
          toRead={toRead}
          behind="The check"
          read={<ReadCautionsForm action={actions.readCautions} of={{ caseId: head.id, checkId: check.id }} about={check.name} cautionIds={toRead} />}
        />
      )}
      {toRead.length === 0 && <StageAnswerForm action={actions.answer} caseId={head.id} check={check} stage={stage} newId={newId} />}
    </div>
  );
}
