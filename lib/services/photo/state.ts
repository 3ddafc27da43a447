import type { PhotoStanding } from '@/lib/schemas/photo';

/** The column is text; a state that isn't one of ours is an error of ours. */
export function asState(text: string): PhotoStanding['state'] {
  if (text === 'awaited' || text === 'stored' || text === 'refused') return text;
  throw new Error(`A photo's state is ${text}; expected awaited, stored or refused`);
}
