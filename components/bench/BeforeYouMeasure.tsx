import { Notice } from '@/components/ui/Notice';

/** What can hurt while a reading is taken; nothing where nothing can. */
export function BeforeYouMeasure({ cautions }: { cautions: readonly string[] }) {
  if (cautions.length === 0) return null;
  return (
    <Notice kind="caution" title="Before you measure">
      <ul className="ml-5 grid list-disc gap-1">{cautions.map((caution) => <li key={caution}>{caution}</li>)}</ul>
      <p className="mt-2 text-[0.9375rem]">The vehicle maker’s information, local rules and a qualified person’s judgement come first.</p>
    </Notice>
  );
}
