import Link from 'next/link';
import { classes } from '@/components/ui/classes';

/** The work on a case, in its order. */
const PAGES = [
  { path: '', label: 'Diagnosis' },
  { path: '/repair', label: 'Repair plan' },
  { path: '/fitting', label: 'Fitting' },
  { path: '/break-in', label: 'Break-in run' },
  { path: '/release', label: 'Release' },
  { path: '/watch', label: 'Watch' },
  { path: '/dossier', label: 'Dossier' },
] as const;

type Path = (typeof PAGES)[number]['path'];

/** From one page of a case's work to the next. */
export function CaseNav({ caseId, here }: { caseId: string; here: Path }) {
  return (
    <nav aria-label="Work on this case" className="mb-6 flex flex-wrap gap-x-6 border-b border-rule print:hidden">
      {PAGES.map(({ path, label }) => (
        <Link
          key={path}
          href={`/cases/${caseId}${path}`}
          aria-current={path === here ? 'page' : undefined}
          className={classes('inline-flex min-h-touch items-center underline-offset-4', path === here ? 'font-bold' : 'underline')}
        >
          {label}
        </Link>
      ))}
    </nav>
  );
}
