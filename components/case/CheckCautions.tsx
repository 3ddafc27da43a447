import { ReadCautionsForm } from '@/components/case/ReadCautionsForm';
import { WorkCautions } from '@/components/case/WorkCautions';
import type { ActionState } from '@/lib/auth/form';
import type { CautionsHere } from '@/lib/case/cautions-here';
import type { Danger } from '@/lib/diagnose/cautions';
import type { CheckView, RulebookView } from '@/lib/schemas/case-view';

type Acknowledged = ActionState<{ cautionId: string; dangers: Danger[] }[]>;
export type ReadCautionsAction = (previous: Acknowledged, form: FormData) => Promise<Acknowledged>;

interface Props {
  caseId: string;
  check: CheckView;
  rulebook: RulebookView;
  cautions: CautionsHere;
  action: ReadCautionsAction;
}

/** The cautions of a check on a page of checks, where no check above shows them already. */
export function CheckCautions({ caseId, check, rulebook, cautions: { toRead, askedHere, remindedHere }, action }: Props) {
  const texts = (ids: readonly string[]) => ids.map((id) => ({ id, text: rulebook.cautions[id]?.text ?? id }));
  if (askedHere.length > 0) {
    return (
      <WorkCautions
        cautions={texts(askedHere)}
        toRead={askedHere}
        behind="The check"
        read={<ReadCautionsForm action={action} of={{ caseId, checkId: check.id }} about={check.name} cautionIds={askedHere} />}
      />
    );
  }
  if (toRead.length > 0) return <p className="text-ink-soft">It opens when the cautions above are read.</p>;
  return remindedHere.length > 0 ? <WorkCautions cautions={texts(remindedHere)} toRead={[]} behind="The check" read={null} /> : null;
}
