import { keepFigures } from '@/components/ui/figures';

/** "Do not release" in a list, with the checks that say so. Nothing when nothing holds. */
export function HoldMark({ checks }: { checks: readonly string[] }) {
  if (checks.length === 0) return null;
  return (
    <span className="mt-0.5 mb-1 block text-[0.9375rem] leading-snug text-danger max-lg:mb-3">
      <strong className="label rounded border border-danger px-1.5 py-px text-[0.8125rem] whitespace-nowrap">Do not release</strong>{' '}
      <span className="lg:block">{keepFigures(checks.join(', '))}</span>
    </span>
  );
}
