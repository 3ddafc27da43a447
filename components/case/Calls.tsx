import { Tag } from '@/components/ui/Tag';
import { PROOF_WORDS, SURENESS_WORDS } from '@/lib/schemas/call-words';
import type { CallView, RulebookView } from '@/lib/schemas/case-view';
import { timeText } from './words';

/** Every call of a case, the standing one marked. */
export function Calls({ calls, rulebook, timeZone }: { calls: CallView[]; rulebook: RulebookView; timeZone: string }) {
  const nameOf = (id: string) => rulebook.causes[id]?.name ?? id;
  return (
    <ul className="border-t border-ink">
      {calls.map((call) => (
        <li key={call.id} className="grid gap-1 border-b border-rule py-3">
          <p className="flex flex-wrap items-center gap-3">
            <strong className={call.standing ? undefined : 'line-through'}>{nameOf(call.mainCause)}</strong>
            <Tag tone={call.standing ? 'strong' : 'plain'}>{call.standing ? 'stands' : 'taken back'}</Tag>
          </p>
          {call.unlistedCause && <p>{call.unlistedCause}</p>}
          {call.contributingCauses.length > 0 && <p>With: {call.contributingCauses.map(nameOf).join(', ')}</p>}
          {call.whyNotLeading && <p>Why not the leading cause: {call.whyNotLeading}</p>}
          <p className="text-[0.9375rem] text-ink-soft">
            {SURENESS_WORDS[call.sureness] ?? call.sureness}; {PROOF_WORDS[call.proof] ?? call.proof}. {call.person}, {timeText(call.at, timeZone)}
          </p>
        </li>
      ))}
    </ul>
  );
}
