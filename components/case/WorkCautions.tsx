import type { ReactNode } from 'react';
import { Notice } from '@/components/ui/Notice';

interface Props {
  cautions: readonly { id: string; text: string }[];
  /** Those that are still to be read today. */
  toRead: readonly string[];
  /** By which the reader says that they were read; null: he or she doesn't work on cases. */
  read: ReactNode;
  /** What stands behind them. */
  behind: string;
}

/** The cautions of a piece of work, before anything of it. Those that are still to be read ask for it. */
export function WorkCautions({ cautions, toRead, read, behind }: Props) {
  const shown = toRead.length > 0 ? cautions.filter(({ id }) => toRead.includes(id)) : cautions;
  return (
    <Notice kind="caution" title={toRead.length > 0 ? 'Read this first' : 'Read today'}>
      <ul className="ml-5 grid list-disc gap-1">{shown.map(({ id, text }) => <li key={id}>{text}</li>)}</ul>
      <p className="mt-2 text-[0.9375rem]">The vehicle maker’s information, local rules and a qualified person’s judgement come first. A torque or another value is the maker’s: none is given here.</p>
      {toRead.length > 0 && <div className="mt-3">{read ?? <p>{behind} is shown to those who work on cases.</p>}</div>}
    </Notice>
  );
}
