import { useRef, useState, type FocusEvent, type RefObject } from 'react';
import { useMedia } from '@/components/ui/use-media';

export interface KeypadHandle {
  /** The field that the keys type into. */
  field: RefObject<HTMLInputElement | null>;
  /** A field has been tapped on a screen for fingers. */
  offered: boolean;
  shown: boolean;
  inputMode: 'decimal' | 'none';
  /** For the form around the fields. */
  onFocus: (event: FocusEvent) => void;
  toggle: () => void;
}

/** Fingers, and room for the keys below the fields. */
const FOR_FINGERS = '(pointer: coarse) and (min-height: 36rem)';

/** One keypad for whichever field of a form has the focus: it comes with the first that is tapped, and stays until it is closed. */
export function useKeypad(): KeypadHandle {
  const field = useRef<HTMLInputElement>(null);
  const fingers = useMedia(FOR_FINGERS);
  const [tapped, setTapped] = useState(false);
  const [closed, setClosed] = useState(false);
  return {
    field,
    offered: fingers && tapped,
    shown: fingers && tapped && !closed,
    inputMode: fingers && !closed ? 'none' : 'decimal',
    onFocus: ({ target }) => {
      if (!(target instanceof HTMLInputElement)) return;
      field.current = target;
      setTapped(true);
    },
    toggle: () => {
      setClosed(!closed);
      field.current?.focus();
    },
  };
}
