'use client';

import { useEffect, type ReactNode } from 'react';
import { Button } from '@/components/ui/Button';
import { classes } from '@/components/ui/classes';
import { Keypad } from '@/components/ui/Keypad';
import type { KeypadHandle } from './use-keypad';

interface Props {
  keypad: KeypadHandle;
  /** The mark that the organisation writes. */
  decimalMark: '.' | ',';
  /** One line that stays in sight; a wide screen shows it elsewhere. */
  children: ReactNode;
}

/** What stays at the foot of the readings: the answer in one line, and on a screen for fingers the large keys. */
export function Foot({ keypad, decimalMark, children }: Props) {
  const { field, offered, shown, toggle } = keypad;
  useEffect(() => {
    // The field that was tapped may lie where the keys have come.
    if (shown) field.current?.scrollIntoView({ block: 'nearest' });
  }, [shown, field]);
  return (
    <div
      className={classes('sticky bottom-0 z-10 -mx-4 border-t-2 border-ink bg-paper px-4 sm:-mx-6 sm:px-6 print:hidden', !offered && 'lg:hidden')}
      data-keypad={shown ? 'shown' : undefined}
      data-foot-keypad={shown ? '' : undefined}
    >
      {children}
      {offered && (
        <div className="grid gap-1.5 pb-2">
          {shown && <Keypad field={field} decimalMark={decimalMark} />}
          <Button variant="quiet" className="border-transparent!" aria-pressed={shown} onClick={toggle}>Keypad</Button>
        </div>
      )}
    </div>
  );
}
