import { CheckCautions, type ReadCautionsAction } from '@/components/case/CheckCautions';
import { StageAnswerForm, type StageAnswerAction } from '@/components/case/StageAnswerForm';
import { cautionsHere } from '@/lib/case/cautions-here';
import type { Stage } from '@/lib/diagnose/types';
import type { CaseView, CheckView } from '@/lib/schemas/case-view';

interface Props {
  view: CaseView;
  check: CheckView;
  /** Checks that stand open above it on the page. */
  above?: readonly CheckView[];
  stage: Stage;
  newId: string;
  actions: { readCautions: ReadCautionsAction; answer: StageAnswerAction };
}

/** A check outside the diagnosis: its cautions while they are unread, then how it is done and its form. */
export function CheckAtStage({ view, check, above, stage, newId, actions }: Props) {
  const { head, rulebook } = view;
  const cautions = cautionsHere(view, check, above);
  return (
    <div className="grid gap-4">
      <CheckCautions caseId={head.id} {...{ check, rulebook, cautions }} action={actions.readCautions} />
      {cautions.toRead.length === 0 && (
        <>
          <ol className="ml-5 grid max-w-prose list-decimal gap-1">{check.steps.map((step) => <li key={step}>{step}</li>)}</ol>
          <StageAnswerForm action={actions.answer} caseId={head.id} check={check} stage={stage} newId={newId} />
        </>
      )}
    </div>
  );
}
