import type { CSSProperties } from 'react';
import { percent } from '@/lib/schemas/percent';
import { classes } from './classes';

interface Props {
  /** Whose level it is: the cause or the station. Becomes the accessible name; without one the words around say it. */
  label?: string;
  /** From 0 to 1. */
  value: number;
  /** The level before the last finding: a pointer at the scale, and said in words. */
  previous?: number;
  size?: 'small' | 'medium' | 'large';
  /** The number as printed beside it, where it was rounded together with others. */
  printed?: string;
  className?: string;
}

const glasses = { small: 'h-8 w-5', medium: 'h-14 w-8', large: 'h-24 w-11' } as const;
const figures = { small: 'text-base', medium: 'text-xl', large: 'text-3xl' } as const;

export { percent };

/**
 * A probability as an upright glass filled to its level, with the number printed beside it.
 * @example <SightGlass label="Drain choked by sealant" value={0.42} previous={0.17} />
 */
export function SightGlass({ label, value, previous, size = 'medium', printed = percent(value), className }: Props) {
  const level = Math.min(Math.max(value, 0), 1);
  const moved = previous !== undefined && Math.round(previous * 100) !== Math.round(value * 100);
  return (
    <span className={classes('inline-flex items-center gap-2.5', className)}>
      <span
        {...(label === undefined
          ? { 'aria-hidden': true }
          : {
              role: 'meter',
              'aria-label': label,
              'aria-valuemin': 0,
              'aria-valuemax': 100,
              'aria-valuenow': Math.round(level * 100),
              'aria-valuetext': moved ? `${printed}, was ${percent(previous)}` : printed,
            })}
        className={classes('sight-glass', glasses[size])}
      >
        <span className="sight-glass-tube">
          <span className="sight-glass-oil" style={{ '--level': level } as CSSProperties} />
        </span>
        <span className="sight-glass-scale">
          {moved && <span className="sight-glass-was" style={{ '--was': previous } as CSSProperties} />}
        </span>
      </span>
      <span aria-hidden="true" className={classes('figure font-bold whitespace-nowrap', figures[size])}>{printed}</span>
    </span>
  );
}
