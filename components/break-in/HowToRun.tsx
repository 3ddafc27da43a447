import Link from 'next/link';
import type { BreakInFigures } from '@/lib/break-in';
import type { PressureUnit } from './Curve';

/** By which figures it runs, where they are from, and the bleed that holds it there. */
export function HowToRun({ figures, bleed, unit, modelName }: { figures: BreakInFigures; bleed: Record<string, string>; unit: PressureUnit; modelName: string | null }) {
  const { engineRpm, pressure, duration, from, source } = figures;
  const at = (pa: number) => Math.round(pa / unit.pascals);
  return (
    <div className="grid max-w-prose gap-2">
      <p>
        {modelName && `${modelName}. `}Engine at <span className="figure whitespace-nowrap">{engineRpm.toLocaleString('en')} rpm</span>; bleed the wet tank so that it holds about{' '}
        <span className="figure whitespace-nowrap">{at(pressure.aim)} {unit.symbol}</span>, between {at(pressure.low)} and {at(pressure.high)}, and never unloads, for {Math.round(duration.least / 60)} to {Math.round(duration.most / 60)} minutes.
      </p>
      <p className="text-[0.9375rem] text-ink-soft">{from === 'model' ? `From the record of this compressor model: ${source}.` : `From the rulebook: ${source ?? 'no source given.'}`}</p>
      <p><Link className="inline-flex min-h-touch items-center underline underline-offset-4" href={`/bench/break-in-bleed?${new URLSearchParams(bleed)}`}>How far to open the bleed, on the bench</Link></p>
    </div>
  );
}
