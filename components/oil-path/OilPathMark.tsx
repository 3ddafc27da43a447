import { classes } from '@/components/ui/classes';

/** The mark: the air line runs straight, the oil line climbs into it and is carried over. */
export function OilPathMark({ className }: { className?: string }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 32 32" className={classes('size-8', className)} fill="none" strokeWidth="4">
      <path stroke="currentColor" d="M2 9H30" />
      <path stroke="var(--oil)" d="M9 30V23A7 7 0 0 1 16 16H30" />
      <path stroke="currentColor" strokeWidth="2" d="M2 30V2H30V30Z" />
    </svg>
  );
}
