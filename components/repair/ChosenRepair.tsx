import type { ReactNode } from 'react';
import { timeText } from '@/components/case/words';
import { PhotoStrip } from '@/components/photos/PhotoStrip';
import type { Option } from '@/components/ui/SelectField';
import { dayText } from '@/lib/schemas/day-text';
import { STEP_MARK_WORDS, type RepairView } from '@/lib/schemas/repair';
import { RepairCautions } from './RepairCautions';
import { EndForms, PlanForm, StepForm, type RepairAction } from './RepairForms';

interface Props {
  repair: RepairView;
  caseId: string;
  timeZone: string;
  people: readonly Option[];
  /** Ids for what will be said of the steps, one each. */
  newIds: readonly string[];
  /** What is seen when it is open. */
  seen: ReactNode;
  /** By which the reader says that the cautions were read; null: he or she doesn't work on cases. */
  read: ReactNode;
  actions: { planIt: RepairAction; saySo: RepairAction; endIt: RepairAction };
}

/** A repair that was chosen: for when and whom, and its steps behind its cautions. */
export function ChosenRepair({ repair, caseId, timeZone, people, newIds, seen, read, actions }: Props) {
  const { id, name, plannedOn, assignedTo, assignedToName, whyBefore, chosenBy, chosenAt, steps, toRead } = repair;
  const of = { caseId, repairId: id, about: name };
  const settled = steps.filter(({ mark }) => mark !== null && mark.mark !== 'not-done').length;
  const ready = read !== null && toRead.length === 0;
  return (
    <section aria-labelledby={`repair-${id}`} className="grid gap-4 border-t-2 border-ink pt-4">
      <div>
        <h3 id={`repair-${id}`} className="text-xl">{name}</h3>
        <p>
          {settled} of {steps.length} steps settled. {plannedOn && `Planned for ${dayText(plannedOn)}. `}{assignedToName && `With ${assignedToName}. `}
          <span className="text-ink-soft">Chosen by {chosenBy}, {timeText(chosenAt, timeZone)}{whyBefore && `: “${whyBefore}”`}.</span>
        </p>
      </div>
      <RepairCautions {...{ repair, read }} />
      {read !== null && <div><PlanForm {...of} action={actions.planIt} people={people} plannedOn={plannedOn} assignedTo={assignedTo} /></div>}
      <ol className="grid gap-5">
        {toRead.length === 0 && steps.map(({ text, mark }, i) => (
          <li key={text} className="grid gap-2 border-b border-rule pb-4">
            <p><b>{i + 1}.</b> {text}</p>
            {mark && (
              <p className="border-l-4 border-ink pl-3">
                <strong>{STEP_MARK_WORDS[mark.mark]}</strong>{mark.value && <>: <span className="figure">{mark.value}</span></>}{mark.note && `, “${mark.note}”`} <span className="text-[0.9375rem] text-ink-soft">{mark.by}, {timeText(mark.at, timeZone)}</span>
              </p>
            )}
            {ready && <PhotoStrip place={{ id: `step/${id}/${i}`, name: `step ${i + 1} of ${name}` }} />}
            {ready && <StepForm key={mark?.at ?? 'unsaid'} action={actions.saySo} caseId={caseId} repairId={id} step={i} newId={newIds[i] ?? ''} isMarked={mark !== null} />}
          </li>
        ))}
      </ol>
      {ready && seen}
      {ready && <EndForms {...of} action={actions.endIt} />}
    </section>
  );
}

/** What was finished or dropped, in a line each. */
export function EndedRepairs({ repairs, timeZone }: { repairs: readonly RepairView[]; timeZone: string }) {
  if (repairs.length === 0) return null;
  return (
    <section aria-labelledby="ended" className="grid gap-2">
      <h2 id="ended">Finished</h2>
      <ul className="border-t border-ink">
        {repairs.map(({ id, name, outcome, endedAt, endedBy, whyDropped }) => (
          <li key={id} className="border-b border-rule py-2">
            <strong>{name}</strong>: {outcome === 'done' ? 'done' : 'dropped'}{whyDropped && `, “${whyDropped}”`} <span className="text-[0.9375rem] text-ink-soft">{endedBy}, {endedAt && timeText(endedAt, timeZone)}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}
