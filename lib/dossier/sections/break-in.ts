import { curveOf, leaksOf, secondsUnderLoad, type BreakInFigures, type HotCheck, type Run } from '@/lib/break-in';
import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { facts, heading, table, text } from '../blocks';
import { measured } from '../measured';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface BreakInPart {
  run: Run;
  startedBy: string;
  outcome: string | null;
  whyStopped: string | null;
  figures: BreakInFigures;
  hotCheck: HotCheck | null;
}

const minutes = (seconds: number) => `${Math.floor(seconds / 60)} min ${Math.floor(seconds % 60)} s`;

/** Each break-in run: by which figures, how long under load, what was read, what was seen while it was hot. */
export function breakInSection(runs: readonly BreakInPart[], { units, timeZone, name }: Writer): DossierBlock[] {
  if (runs.length === 0) return text('No break-in run was made in this case.');
  const pressure = (pa: number) => measured(pa, 'pressure', units) ?? '';
  return runs.flatMap(({ run, startedBy, outcome, whyStopped, figures, hotCheck }) => [
    ...heading(`Run of ${momentText(new Date(run.startedAt), timeZone)}, ${name(startedBy)}`),
    ...facts(
      ['To hold', `${pressure(figures.pressure.aim)}, between ${pressure(figures.pressure.low)} and ${pressure(figures.pressure.high)}, at ${figures.engineRpm} rpm`],
      ['For', `${Math.round(figures.duration.least / 60)} to ${Math.round(figures.duration.most / 60)} minutes`],
      ['From', figures.source],
      ['Under load', run.endedAt === null ? 'still running' : minutes(secondsUnderLoad(run, run.endedAt))],
      ['Outcome', outcome === 'done' ? 'Run in' : outcome === 'stopped' ? `Stopped: “${whyStopped ?? ''}”` : null],
      ['Hot check', hotCheck ? (leaksOf(hotCheck) ?? 'Dry') : 'Not looked'],
    ),
    ...table(
      [
        { title: 'Under load', share: 30, figure: true },
        { title: 'Pressure', share: 30, figure: true },
        { title: 'Within the band', share: 40 },
      ],
      curveOf(run, figures.pressure).map(({ second, pressurePa, inBand }) => ({ cells: [minutes(second), pressure(pressurePa), inBand ? 'yes' : 'no'], strong: !inBand })),
    ),
  ]);
}
