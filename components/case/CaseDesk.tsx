'use client';

import { useLayoutEffect, useRef, useState, type ReactNode } from 'react';
import { OilPath } from '@/components/oil-path/OilPath';
import { PhotoStrip } from '@/components/photos/PhotoStrip';
import { Button } from '@/components/ui/Button';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { Notice } from '@/components/ui/Notice';
import { percent } from '@/components/ui/SightGlass';
import { STATIONS, type StationId } from '@/lib/diagnose/stations';
import type { CaseState, CaseView, RulebookView } from '@/lib/schemas/case-view';
import { Answered } from './Answered';
import { AnsweredStrip } from './AnsweredStrip';
import { atHand, ofSuggestion, type AtHand, type Picked } from './at-hand';
import { Causes } from './Causes';
import { CheckAtHand } from './CheckAtHand';
import { keepHand, type Hand } from './hand';
import { HandSwitch } from './HandSwitch';
import { openChecks } from './open-checks';
import { PanelAtHand } from './PanelAtHand';
import { ReleaseHold } from './ReleaseHold';
import { StationChecks } from './StationChecks';
import { SlowNote, SyncStrip } from './SyncStrip';
import { useCase, type CaseHandle } from './use-case';
import { nameOf, useHeld } from './use-held';
import { usePassedHolds } from './use-passed-holds';
import { useSteadyHeight } from './use-steady-height';
import { WhatNext } from './WhatNext';
import { changeText } from './words';

const stationName = (id: StationId) => STATIONS.find((station) => station.id === id)?.name ?? id;

interface Props {
  view: CaseView;
  /** Of the oil path, drawn by the server. */
  drawing: ReactNode;
  /** As the cookie says, so that the page comes with answers on the right side. */
  hand: Hand;
  /** The mark that the organisation writes. */
  decimalMark: '.' | ',';
}

/** Where a case is diagnosed: the oil path at its head, the check at hand, the ranked causes, and what was answered. */
export function CaseDesk({ view, drawing, hand: kept, decimalMark }: Props) {
  const { rulebook } = view;
  const handle = useCase(view);
  const { state, reasons } = handle;
  const [picked, setPicked] = useState<Picked>(null);
  const [station, setStation] = useState<StationId | null>(null);
  const [hand, setHand] = useState(kept);
  const passedHere = usePassedHolds(state);
  const checkName = (id: string) => rulebook.checks[id]?.name ?? id;
  const readOnly = state.at !== null || state.status !== 'open';
  const pick = (next: Picked) => {
    setStation(null);
    setPicked(next);
    requestAnimationFrame(() => goTo('check-at-hand'));
  };
  const pickStation = (next: StationId | null) => {
    setStation(next);
    if (next) requestAnimationFrame(() => goTo('station-checks'));
  };

  return (
    <div data-hand={hand} className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,27rem)]">
      <div className="grid min-w-0 gap-4 lg:col-span-2">
        <ReleaseHold unitId={view.head.unit.id} checks={state.releaseHolds.map(checkName)} passedHere={passedHere.map(checkName)} others={view.otherHolds} />
        <OilPath drawing={drawing} suspicion={state.suspicion} open={openChecks(state, rulebook)} picked={station} onPick={pickStation} />
        <SyncStrip sync={handle.sync} rulebook={rulebook} />
      </div>
      <div className="grid min-w-0 content-start gap-5 border-t-2 border-ink pt-4 print:hidden lg:col-start-1">
        {!readOnly && <AnsweredStrip {...{ state, rulebook, onPick: pick }} />}
        {station ? (
          <StationChecks station={station} name={stationName(station)} state={state} rulebook={rulebook} onPick={pick} onClose={readOnly ? undefined : () => pick(null)} />
        ) : readOnly ? (
          <p className="text-ink-soft">Nothing is asked here. Pick a station to see its checks.</p>
        ) : (
          <AtHandView {...{ handle, rulebook, usual: view.usual, limits: view.limits, catching: view.catching, picked, decimalMark, onPick: setPicked }} />
        )}
        {!readOnly && <SlowNote sync={handle.sync} />}
        {!readOnly && <HandSwitch hand={hand} onChange={(next) => { setHand(next); keepHand(next); }} />}
      </div>
      <div className="grid min-w-0 content-start gap-8 lg:col-start-2 lg:row-span-2 lg:row-start-2">
        <Causes state={state} reasons={reasons} rulebook={rulebook} provisional={handle.sync.provisional} />
        {!readOnly && <WhatNext state={state} settle={reasons.settle} rulebook={rulebook} readOnly={readOnly} onPick={pick} />}
      </div>
      <div className="min-w-0 lg:col-start-1">
        <Answered handle={handle} rulebook={rulebook} timeZone={view.head.timeZone} readOnly={readOnly} onPick={pick} />
        <div className="mt-8 not-has-[img]:print:hidden"><PhotoStrip /></div>
      </div>
      <LiveRegion>{spoken(state, rulebook)}</LiveRegion>
    </div>
  );
}

/** Gives a heading the focus, and brings it to where the eye is only when it stands too low or out of sight. */
function goTo(id: string): void {
  const heading = document.getElementById(id);
  if (!heading) return;
  heading.focus({ preventScroll: true });
  const { top } = heading.getBoundingClientRect();
  if (top < 0 || top > innerHeight / 2) heading.scrollIntoView({ block: 'start' });
}

interface AtHandProps {
  handle: CaseHandle;
  rulebook: RulebookView;
  usual: CaseView['usual'];
  picked: Picked;
  decimalMark: '.' | ',';
  limits: CaseView['limits'];
  catching: CaseView['catching'];
  onPick: (picked: Picked) => void;
}

function AtHandView(props: AtHandProps) {
  const { handle, rulebook, picked } = props;
  const { state } = handle;
  const [passed, setPassed] = useState<ReadonlySet<string>>(new Set());
  const { isPending: pending, submittedAt } = handle.answer;
  const asked = useHeld(atHand(state, rulebook, picked, passed), {
    turn: [picked?.kind === 'panel' ? picked.panelId : picked?.checkId, passed.size, submittedAt].join('/'),
    pending,
    isOpen: (held) => held.kind === 'panel' || !state.findings.some(({ checkId, current }) => current && checkId === held.checkId),
  });
  const name = nameOf(asked);
  const shown = useRef(name);
  const block = useRef<HTMLDivElement>(null);
  useLayoutEffect(() => {
    // The page itself has the focus at first; after an answer it goes to the next question.
    if (shown.current !== name) goTo('check-at-hand');
    shown.current = name;
  }, [name]);
  useSteadyHeight(block, `${name}/${submittedAt}/${handle.acknowledge.submittedAt}`);
  return (
    <div ref={block} className="at-hand">
      <Question {...props} asked={asked} onPass={(panelId) => setPassed(new Set([...passed, panelId]))} />
    </div>
  );
}

function Question({ handle, rulebook, usual, limits, catching, picked, decimalMark, onPick, asked, onPass }: AtHandProps & { asked: AtHand | null; onPass: (panelId: string) => void }) {
  if (!asked) return <Enough {...{ state: handle.state, rulebook, onPick }} />;
  if (asked.kind === 'panel') {
    const panel = rulebook.panels.find(({ id }) => id === asked.panelId);
    // Kept at hand while its items are answered, though the suggestion moves on.
    const keep = () => picked?.kind === 'panel' || onPick({ kind: 'panel', panelId: asked.panelId });
    const pass = () => {
      onPass(asked.panelId);
      onPick(null);
    };
    return panel ? (
      <div onClickCapture={keep}>
        <PanelAtHand key={panel.id} panel={panel} rulebook={rulebook} handle={handle} stationName={stationName(panel.station)} onDone={pass} />
      </div>
    ) : null;
  }
  const check = rulebook.checks[asked.checkId];
  if (!check) return null;
  return (
    <CheckAtHand
      key={check.id}
      check={check}
      rulebook={rulebook}
      usual={usual[check.id]}
      handle={handle}
      suggestion={asked.suggestion}
      stationName={stationName(check.station)}
      decimalMark={decimalMark}
      limit={limits[check.id]}
      catching={catching}
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
      <h2 id="check-at-hand" tabIndex={-1} className="scroll-mt-12 text-[1.75rem]">Enough is known; repair</h2>
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
