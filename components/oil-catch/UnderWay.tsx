import type { ComponentProps } from 'react';
import { timeText } from '@/components/case/words';
import { EndForm, RemindForm, TakeBackForm, WeighForm, type CatchAction } from './CatchForms';
import { OilCatch, type CatchView } from './OilCatch';

interface Props extends Omit<ComponentProps<typeof OilCatch>, 'oilCatch'> {
  underWay: CatchView;
  /** Whether the reader works on the case, which is open. */
  works: boolean;
  /** Whether the cautions were read today. */
  ready: boolean;
  newId: string;
  actions: { saveWeighing: CatchAction; changeReminder: CatchAction; takeBack: CatchAction; takeDown: CatchAction };
}

/** The bottle that hangs now: what it held until now, and the next weighing. */
export function UnderWay({ underWay, works, ready, newId, actions, ...of }: Props) {
  const { caseId, units, timeZone } = of;
  const last = underWay.weighings.filter(({ takenBack }) => takenBack === null).at(-1);
  const ids = { caseId, catchId: underWay.id };
  return (
    <>
      <OilCatch {...of} oilCatch={underWay} />
      {works && (
        <section aria-labelledby="weigh" className="grid gap-4">
          <h2 id="weigh">Weigh it</h2>
          {underWay.remindAt && <p>The next reminder goes out on {timeText(underWay.remindAt, timeZone)}.</p>}
          {ready ? (
            <WeighForm key={underWay.weighings.length} action={actions.saveWeighing} {...ids} newId={newId} units={units} metered={(last ?? underWay).engineS !== null} />
          ) : (
            <p className="text-ink-soft">The form opens when the cautions above are read.</p>
          )}
          <div>
            <RemindForm action={actions.changeReminder} {...ids} everyDays={underWay.remindEveryDays} />
            {last && <TakeBackForm action={actions.takeBack} {...ids} weighingId={last.id} />}
            <EndForm action={actions.takeDown} {...ids} />
          </div>
        </section>
      )}
    </>
  );
}
