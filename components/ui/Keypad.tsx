import type { PointerEvent, RefObject } from 'react';
import { Button } from '@/components/ui/Button';

interface Props {
  /** The field that the keys type into. */
  field: RefObject<HTMLInputElement | null>;
  /** The mark that the organisation writes. */
  decimalMark: '.' | ',';
}

/** The field keeps the focus, and the caret, while keys are tapped. */
const keepFocus = (event: PointerEvent) => event.preventDefault();

/** As typing would: whoever holds the field's text hears of it. */
function write(input: HTMLInputElement, text: string, start: number, end: number): void {
  input.setRangeText(text, start, end, 'end');
  input.dispatchEvent(new Event('input', { bubbles: true }));
}

/** Large keys for a gloved finger. What a keyboard can type stays typable in the field. */
export function Keypad({ field, decimalMark }: Props) {
  const put = (text: string) => {
    const input = field.current;
    if (!input) return;
    const { length } = input.value;
    write(input, text, input.selectionStart ?? length, input.selectionEnd ?? length);
  };
  const back = () => {
    const input = field.current;
    if (!input) return;
    const end = input.selectionEnd ?? input.value.length;
    const start = input.selectionStart ?? end;
    write(input, '', start === end ? Math.max(start - 1, 0) : start, end);
  };
  return (
    <div role="group" aria-label="Keypad" className="keypad">
      {['7', '8', '9', '4', '5', '6', '1', '2', '3', decimalMark, '0'].map((key) => (
        <Button key={key} variant="quiet" aria-label={key === decimalMark ? 'Decimal mark' : undefined} onPointerDown={keepFocus} onClick={() => put(key)}>{key}</Button>
      ))}
      <Button variant="quiet" aria-label="Delete the last character" onPointerDown={keepFocus} onClick={back}>
        <svg aria-hidden="true" viewBox="0 0 24 16" className="h-4 w-6" fill="none" stroke="currentColor" strokeWidth="2"><path d="M8 1H23V15H8L1 8ZM11.5 5 17.5 11M17.5 5 11.5 11" /></svg>
      </Button>
    </div>
  );
}
