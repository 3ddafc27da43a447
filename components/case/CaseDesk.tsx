'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { Notice } from '@/components/ui/Notice';
import { percent } from '@/components/ui/SightGlass';
import { STATIONS, type StationId } from '@/lib/diagnose/stations';
import type { CaseState, CaseView, RulebookView } from '@/lib/schemas/case-view';
import { Answered } from './Answered';
import { atHand, ofSuggestion, type Picked } from './at-hand';
import { Causes } from './Causes';
import { CheckAtHand } from './CheckAtHand';
import { PanelAtHand } from './PanelAtHand';
import { ReleaseHold } from './ReleaseHold';
import { StationChecks } from './StationChecks';
import { Stations } from './Stations';
import { SyncStrip } from './SyncStrip';
import { useCase, type CaseHandle } from './use-case';
import { WhatNext } from './WhatNext';
import { changeText } from './words';

const stationName = (id: StationId) => STATIONS.find((station) => station.id === id)?.name ?? id;

/** Where a case is diagnosed: the check at hand, the ranked causes, the oil path, and what was answered. */
export function CaseDesk({ view }: { view: CaseView }) {
  const { rulebook } = view;
  const handle = useCase(view);
  const { state, reasons } = handle;
  const [picked, setPicked] = useState<Picked>(null);
  const [station, setStation] = useState<StationId | null>(null);
  const readOnly = state.at !== null || state.status !== 'open';
  const pick = (next: Picked) => {
    setStation(null);
    setPicked(next);
    requestAnimationFrame(() => document.getElementById('check-at-hand')?.focus());
  };

  return (
    <>
    <ReleaseHold checks={state.releaseHolds.map((id) => rulebook.checks[id]?.name ?? id)} others={view.otherHolds} />
    <div className="mb-6 empty:hidden"><SyncStrip sync={handle.sync} rulebook={rulebook} /></div>
    <div className="grid gap-8 lg:grid-cols-[13rem_minmax(0,1fr)_minmax(0,26rem)] lg:grid-rows-[auto_1fr]">
      <div className="min-w-0 lg:col-start-2 lg:row-start-1">
        {station ? (
          <StationChecks station={station} name={stationName(station)} state={state} rulebook={rulebook} onPick={pick} />
        ) : (
          !readOnly && <AtHandView {...{ handle, rulebook, picked, onPick: setPicked }} />
        )}
      </div>
      <div className="grid min-w-0 content-start gap-8 lg:col-start-3 lg:row-span-2 lg:row-start-1">
        <Causes state={state} reasons={reasons} rulebook={rulebook} />
        {!readOnly && <WhatNext state={state} settle={reasons.settle} rulebook={rulebook} readOnly={readOnly} onPick={pick} />}
      </div>
      <div className="min-w-0 lg:col-start-2 lg:row-start-2">
        <Answered handle={handle} rulebook={rulebook} timeZone={view.head.timeZone} readOnly={readOnly} onPick={pick} />
      </div>
      <div className="lg:col-start-1 lg:row-span-2 lg:row-start-1"><Stations state={state} rulebook={rulebook} picked={station} onPick={setStation} /></div>
      <LiveRegion>{spoken(state, rulebook)}</LiveRegion>
    </div>
    </>
  );
}

interface AtHandProps {
  handle: CaseHandle;
  rulebook: RulebookView;
  picked: Picked;
  onPick: (picked: Picked) => void;
}

function AtHandView({ handle, rulebook, picked, onPick }: AtHandProps) {
  const { state } = handle;
  const asked = atHand(state, rulebook, picked);
  if (!asked) return <Enough {...{ state, rulebook, onPick }} />;
  if (asked.kind === 'panel') {
    const panel = rulebook.panels.find(({ id }) => id === asked.panelId);
    // Kept at hand while its items are answered, though the suggestion moves on.
    const keep = () => picked?.kind === 'panel' || onPick({ kind: 'panel', panelId: asked.panelId });
    return panel ? (
      <div onClickCapture={keep}>
        <PanelAtHand panel={panel} rulebook={rulebook} handle={handle} stationName={stationName(panel.station)} onDone={() => onPick(null)} />
      </div>
    ) : null;
  }
  const check = rulebook.checks[asked.checkId];
  if (!check) return null;
  return (
    <CheckAtHand
      check={check}
      rulebook={rulebook}
      handle={handle}
      suggestion={picked ? null : (state.next.suggestions[0] ?? null)}
      then={asked.then ? (rulebook.checks[asked.then] ?? null) : null}
      stationName={stationName(check.station)}
      onAnswered={() => onPick(null)}
    />
  );
}

/** No check is worth its time: say so, and leave the way open to go on. */
function Enough({ state, rulebook, onPick }: { state: CaseState; rulebook: RulebookView; onPick: (picked: Picked) => void }) {
  const [best] = state.next.suggestions;
  const next = best ? ofSuggestion(best, rulebook) : null;
  return (
    <section aria-labelledby="check-at-hand">
      <h2 id="check-at-hand" tabIndex={-1} className="text-[1.75rem]">Enough is known; repair</h2>
      <Notice
        title="No open check is worth its time"
        actions={next && <Button variant="quiet" onClick={() => onPick(next.kind === 'check' ? { kind: 'check', checkId: next.checkId } : next)}>Check further all the same</Button>}
      >
        {state.next.stopReason} Call the cause below, or look further if something doesn’t fit what you see.
      </Notice>
    </section>
  );
}

/** What a screen reader hears when the ranking has moved. */
function spoken({ causes, because, releaseHolds }: CaseState, rulebook: RulebookView): string {
  const [leader] = causes;
  if (!leader) return '';
  const name = rulebook.causes[leader.causeId]?.name ?? leader.causeId;
  const change = changeText(leader.change);
  const held = releaseHolds.length > 0 ? 'Do not release this unit. ' : '';
  return `${held}${because ? `Saved: ${because}. ` : ''}${name} leads with ${percent(leader.p)}${change ? `, ${change}` : ''}.`;
}
