/** What a page is made of, as far as its outline is concerned. */
export type Shape = 'list' | 'record' | 'form' | 'case' | 'history';

interface Page {
  /** Its folder below `app/(signed-in)`. */
  route: string;
  shape: Shape;
  /** What is fetched: "the cases". */
  what: string;
}

/** The outline of each signed-in page, shown while it is fetched. `tests/unit/ui/states.test.tsx` misses none. */
export const PAGES: readonly Page[] = [
  { route: 'cases', shape: 'list', what: 'the cases' },
  { route: 'cases/new', shape: 'form', what: 'the form' },
  { route: 'cases/[id]', shape: 'case', what: 'the case' },
  { route: 'cases/[id]/catch', shape: 'form', what: 'the oil caught' },
  { route: 'cases/[id]/repair', shape: 'record', what: 'the repair plan' },
  { route: 'cases/[id]/fitting', shape: 'form', what: 'the fitting' },
  { route: 'cases/[id]/break-in', shape: 'form', what: 'the break-in run' },
  { route: 'cases/[id]/release', shape: 'form', what: 'the release' },
  { route: 'cases/[id]/dossier', shape: 'record', what: 'the dossiers' },
  { route: 'cases/[id]/dossier/[dossierId]', shape: 'record', what: 'the dossier' },
  { route: 'cases/[id]/claim', shape: 'record', what: 'claims and cores' },
  { route: 'cases/[id]/watch', shape: 'record', what: 'the watch' },
  { route: 'cases/[id]/history', shape: 'history', what: 'the history of the case' },
  { route: 'units', shape: 'list', what: 'the units' },
  { route: 'units/new', shape: 'form', what: 'the form' },
  { route: 'units/[id]', shape: 'record', what: 'the unit' },
  { route: 'units/[id]/edit', shape: 'form', what: 'the form' },
  { route: 'units/[id]/baseline', shape: 'form', what: 'the form' },
  { route: 'units/[id]/readings/new', shape: 'form', what: 'the form' },
  { route: 'units/[id]/fits/new', shape: 'form', what: 'the form' },
  { route: 'units/[id]/fits/[fitId]', shape: 'record', what: 'the fit' },
  { route: 'models', shape: 'list', what: 'the compressor models' },
  { route: 'models/new', shape: 'form', what: 'the form' },
  { route: 'models/[id]', shape: 'record', what: 'the compressor model' },
  { route: 'models/[id]/edit', shape: 'form', what: 'the form' },
  { route: 'bench', shape: 'list', what: 'the sums' },
  { route: 'bench/[sum]', shape: 'form', what: 'the sum' },
  { route: 'bench/line-survey', shape: 'form', what: 'the survey' },
  { route: 'fleet/gate', shape: 'list', what: 'how gated fits went' },
  { route: 'search', shape: 'list', what: 'what is found' },
  { route: 'notices', shape: 'list', what: 'your notices' },
  { route: 'not-allowed', shape: 'form', what: 'the page' },
  { route: 'settings', shape: 'form', what: 'your settings' },
  { route: 'settings/profile', shape: 'form', what: 'your settings' },
  { route: 'settings/units', shape: 'form', what: 'your units of measure' },
  { route: 'settings/notices', shape: 'form', what: 'how you are told' },
  { route: 'settings/tokens', shape: 'list', what: 'your tokens' },
  { route: 'settings/limits', shape: 'list', what: 'the limits' },
  { route: 'settings/limits/new', shape: 'form', what: 'the form' },
  { route: 'settings/limits/[id]', shape: 'form', what: 'the limit' },
  { route: 'settings/people', shape: 'list', what: 'the people' },
  { route: 'settings/people/invite', shape: 'form', what: 'the form' },
  { route: 'settings/people/[id]', shape: 'form', what: 'the person' },
  { route: 'settings/sites', shape: 'list', what: 'the sites' },
  { route: 'settings/sites/new', shape: 'form', what: 'the form' },
  { route: 'settings/sites/[id]', shape: 'form', what: 'the site' },
  { route: 'settings/sites/[id]/gates/[gateId]', shape: 'record', what: 'the gate' },
  { route: 'settings/organisation', shape: 'form', what: 'the organisation' },
  { route: 'settings/jobs', shape: 'list', what: 'the jobs' },
  { route: 'settings/audit', shape: 'list', what: 'the audit' },
];

/** The page at an address; a form's outline where no page is known, which is the plainest. */
export function pageAt(pathname: string): Pick<Page, 'shape' | 'what'> {
  const parts = pathname.split('/').filter(Boolean);
  const fits = ({ route }: Page) => {
    const wanted = route.split('/');
    return wanted.length === parts.length && wanted.every((part, i) => part.startsWith('[') || part === parts[i]);
  };
  // A fixed name is nearer than a placeholder: "cases/new" is no case.
  const [page] = PAGES.filter(fits).sort((a, b) => placeholders(a) - placeholders(b));
  return page ?? { shape: 'form', what: 'the page' };
}

const placeholders = ({ route }: Page) => route.split('[').length;
