import type { Segment } from '@/lib/search/mark';

/** A text with what was looked for marked, by weight and line: amber is kept for evidence. */
export function Marked({ segments }: { segments: readonly Segment[] }) {
  return segments.map(({ text, hit }, index) =>
    hit ? <mark key={index} className="bg-transparent font-bold text-inherit underline decoration-2 underline-offset-4">{text}</mark> : <span key={index}>{text}</span>,
  );
}
