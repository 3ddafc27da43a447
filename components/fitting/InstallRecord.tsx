import { PhotoStrip } from '@/components/photos/PhotoStrip';
import { timeText } from '@/components/case/words';
import { Disclosure } from '@/components/ui/Disclosure';
import { Tag } from '@/components/ui/Tag';
import { INSTALL_GROUPS, type InstallPoint } from '@/lib/fitting';
import { dayText } from '@/lib/schemas/day-text';
import type { FittingView, InstallPointView } from '@/lib/schemas/fitting';
import { FinishForm, PointForm, type FittingAction } from './FittingForms';

interface Props {
  fitting: FittingView;
  caseId: string;
  timeZone: string;
  /** Whether the points can be answered: the reader works on the case, and its cautions were read today. */
  ready: boolean;
  newIds: readonly string[];
  actions: { sayOfPoint: FittingAction; finish: FittingAction };
}

/** The install record of a compressor: every point that decides whether it lives, in the order of the work. */
export function InstallRecord({ fitting, caseId, timeZone, ready, newIds, actions }: Props) {
  const { id, modelName, installedOn, points, startedBy, startedAt, finishedAt, finishedBy } = fitting;
  const said = points.filter((point) => point.said !== null).length;
  const open = finishedAt === null && ready;
  const groups = (Object.keys(INSTALL_GROUPS) as InstallPoint['group'][]).filter((group) => points.some((point) => point.group === group));
  return (
    <section aria-labelledby={`fitting-${id}`} className="grid gap-6">
      <div>
        <h2 id={`fitting-${id}`}>{modelName}, fitted {dayText(installedOn)}</h2>
        <p>
          {said} of {points.length} points answered. <span className="text-ink-soft">Begun by {startedBy}, {timeText(startedAt, timeZone)}{finishedAt && `; finished by ${finishedBy}, ${timeText(finishedAt, timeZone)}`}.</span>
        </p>
      </div>
      {groups.map((group) => (
        <section key={group} aria-labelledby={`${id}-${group}`} className="grid gap-4">
          <h3 id={`${id}-${group}`} className="border-t-2 border-ink pt-3 text-xl">{INSTALL_GROUPS[group]}</h3>
          {points.map((point, i) => point.group === group && (
            <Point key={point.id} point={point} timeZone={timeZone}>
              {open && (
                <>
                  {point.photo && <PhotoStrip place={{ id: `install/${point.id}`, name: point.name }} />}
                  <Asked point={point}><PointForm key={point.said?.at ?? 'unsaid'} action={actions.sayOfPoint} caseId={caseId} fittingId={id} point={point} newId={newIds[i] ?? ''} /></Asked>
                </>
              )}
            </Point>
          ))}
        </section>
      ))}
      {open && <FinishForm action={actions.finish} caseId={caseId} fittingId={id} />}
    </section>
  );
}

function Point({ point, timeZone, children }: { point: InstallPointView; timeZone: string; children: React.ReactNode }) {
  const { name, why, said } = point;
  return (
    <div className="grid gap-3 border-b border-rule pb-4">
      <div>
        <h4 className="font-bold">{name}</h4>
        <p className="text-ink-soft">{why}</p>
      </div>
      {said && (
        <p className="border-l-4 border-ink pl-3">
          <strong>{said.label}</strong>{said.value && <>: <span className="figure">{said.value}</span></>}{said.note && `, “${said.note}”`} {said.against && <Tag>shortens its life</Tag>}{' '}
          <span className="text-[0.9375rem] text-ink-soft">{said.by}, {timeText(said.at, timeZone)}</span>
        </p>
      )}
      {children}
    </div>
  );
}

/** What was answered already is folded, so that what is still to do is in sight. */
const Asked = ({ point, children }: { point: InstallPointView; children: React.ReactNode }) =>
  point.said ? <Disclosure summary={<>Answer it anew<span className="sr-only">: {point.name}</span></>}>{children}</Disclosure> : children;
