import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { cautionsToRead } from '@/lib/diagnose/cautions';
import type { CaseState, CheckView, RulebookView } from '@/lib/schemas/case-view';

/** The cautions of a check that this person has still to acknowledge, in the danger that the check brings. */
export function unread(check: CheckView, rulebook: RulebookView, state: CaseState): string[] {
  return cautionsToRead(check, (id) => rulebook.cautions[id]?.worseWhen ?? [], state.acknowledged);
}

interface Props {
  check: CheckView;
  rulebook: RulebookView;
  toRead: string[];
  pending: boolean;
  onRead: () => void;
}

/** The cautions of a check, before its steps. Those read today stand short; the others ask to be acknowledged. */
export function Cautions({ check, rulebook, toRead, pending, onRead }: Props) {
  if (check.cautions.length === 0) return null;
  const texts = (toRead.length > 0 ? toRead : check.cautions).map((id) => ({ id, text: rulebook.cautions[id]?.text ?? id }));
  return (
    <Notice
      kind="caution"
      title={toRead.length > 0 ? 'Read this first' : 'Read today'}
      actions={toRead.length > 0 ? <Button onClick={onRead} aria-disabled={pending || undefined}>I have read this and will keep to it</Button> : undefined}
    >
      <ul className="ml-5 grid list-disc gap-1">
        {texts.map(({ id, text }) => <li key={id}>{text}</li>)}
      </ul>
      <p className="mt-2 text-[0.9375rem]">The vehicle maker’s information, local rules and a qualified person’s judgement come first.</p>
    </Notice>
  );
}
