'use client';

import { Button } from '@/components/ui/Button';
import type { StationId } from '@/lib/diagnose/stations';
import type { CaseState, RulebookView } from '@/lib/schemas/case-view';
import type { Picked } from './at-hand';
import { minutesText } from './words';

interface Props {
  station: StationId;
  name: string;
  state: CaseState;
  rulebook: RulebookView;
  onPick: (picked: Picked) => void;
  /** Back to the check that tells most; absent where nothing is asked. */
  onClose?: () => void;
}

/** Every check of a station, for those who know what they want: panels first, then single ones. */
export function StationChecks({ station, name, state, rulebook, onPick, onClose }: Props) {
  const answers = new Map(state.findings.filter(({ current }) => current).map((finding) => [finding.checkId, finding.answer]));
  const spoiled = new Set(state.next.spoiled.map(({ checkId }) => checkId));
  const panels = rulebook.panels.filter((panel) => panel.station === station);
  const inPanels = new Set(panels.flatMap(({ checks }) => checks));
  const single = Object.values(rulebook.checks).filter((check) => check.station === station && !inPanels.has(check.id));
  return (
    <section aria-labelledby="station-checks" className="grid gap-2">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 id="station-checks" tabIndex={-1} className="scroll-mt-4">{name}</h2>
        {onClose && <Button variant="quiet" onClick={onClose}>Back to the check that tells most</Button>}
      </div>
      <ul className="border-t border-ink">
        {panels.map((panel) => (
          <Row key={panel.id} title={panel.title} detail={`${panel.checks.filter((id) => answers.has(id)).length} of ${panel.checks.length} answered`} onPick={() => onPick({ kind: 'panel', panelId: panel.id })} />
        ))}
        {single.map((check) => (
          <Row
            key={check.id}
            title={check.name}
            detail={answers.get(check.id) ?? (spoiled.has(check.id) ? 'spoiled by a check that was made' : minutesText(check.minutes))}
            onPick={() => onPick({ kind: 'check', checkId: check.id })}
          />
        ))}
      </ul>
    </section>
  );
}

function Row({ title, detail, onPick }: { title: string; detail: string; onPick: () => void }) {
  return (
    <li className="border-b border-rule">
      <Button variant="quiet" className="w-full justify-between! border-transparent! px-2! text-left!" onClick={onPick}>
        <span>{title}</span>
        <span className="max-w-[55%] shrink-0 text-right font-normal text-ink-soft">{detail}</span>
      </Button>
    </li>
  );
}
