'use client';

import { Button } from '@/components/ui/Button';
import type { Step } from '@/lib/case/steps';
import { timeText } from '../words';

interface Props {
  steps: readonly Step[];
  index: number;
  timeZone: string;
  onChange: (index: number) => void;
}

/** A case's moments on a line: slide, step, or use the arrow keys. What a step is stands under it, and is said. */
export function MomentSlider({ steps, index, timeZone, onChange }: Props) {
  const step = steps[index];
  const spoken = step ? `${timeText(step.at, timeZone)}: ${step.what}` : '';
  return (
    <div className="grid grid-cols-1 gap-2 print:hidden">
      <label htmlFor="moment" className="label">Moment <span className="figure">{index + 1}</span> of <span className="figure">{steps.length}</span></label>
      <div className="flex items-center gap-3">
        <Button variant="quiet" disabled={index === 0} onClick={() => onChange(index - 1)}>Earlier</Button>
        <input
          id="moment"
          type="range"
          className="h-12 min-w-0 flex-1"
          min={0}
          max={steps.length - 1}
          step={1}
          value={index}
          aria-valuetext={spoken}
          onChange={(event) => onChange(Number(event.target.value))}
        />
        <Button variant="quiet" disabled={index === steps.length - 1} onClick={() => onChange(index + 1)}>Later</Button>
      </div>
    </div>
  );
}
