import type { Role } from '@/lib/auth/roles';
import type { Places } from './places';

/** What the database is like when a picture is made; only a server of our own is ever emptied or broken. */
export type Stage = 'seeded' | 'emptied' | 'broken';

export interface Shot {
  /** The folder of its page below `app`; null for an address that no page has. */
  page: string | null;
  /** What it shows of that page, in words; also its file's name. */
  name: string;
  /** Nobody: not signed in. */
  as: Role | 'nobody';
  /** Where it is; undefined when this database has no such thing. */
  path: (places: Places) => string | undefined;
  stage?: Stage;
}

const NOWHERE = '01890a5d-ac96-774b-bcce-b302099a8057';
const IN = '(signed-in)';

const shot = (page: string | null, name: string, as: Shot['as'], path: string | Shot['path'], stage?: Stage): Shot => ({
  page,
  name,
  as,
  path: typeof path === 'string' ? () => path : path,
  stage,
});

/** Every page in every state it has. `tests/unit/screenshots/pages.test.ts` compares it with the folders of `app`. */
export const SHOTS: readonly Shot[] = [
  shot('(public)', 'home', 'nobody', '/'),
  shot('(public)/api/docs', 'api-docs', 'nobody', '/api/docs'),
  shot('(public)/api/docs/[group]', 'api-docs-cases', 'nobody', '/api/docs/cases'),
  shot('(public)/verify', 'verify', 'nobody', '/verify'),
  shot('(auth)/sign-in', 'sign-in', 'nobody', '/sign-in'),
  shot('(auth)/reset-password', 'reset-password', 'nobody', '/reset-password'),
  shot('(auth)/reset-password/[token]', 'reset-password-link', 'nobody', ({ reset }) => reset),
  shot('(auth)/reset-password/[token]', 'reset-password-dead-link', 'nobody', '/reset-password/not-a-link-that-was-sent-by-anybody-here'),
  shot('(auth)/invite/[token]', 'invite-link', 'nobody', ({ invitation }) => invitation),
  shot('(auth)/invite/[token]', 'invite-dead-link', 'nobody', '/invite/not-a-link-that-was-sent-by-anybody-here'),
  shot('(auth)/watch/[token]', 'watch-dead-link', 'nobody', '/watch/not-a-link-that-was-given-to-anybody-here'),
  shot('(auth)/gate/[token]', 'gate-dead-link', 'nobody', '/gate/not-a-link-that-was-given-to-anybody-here'),
  shot(null, 'not-found-outside', 'nobody', '/nothing-here'),
  shot(null, 'not-found-inside', 'technician', '/nothing-here'),

  shot(`${IN}/cases`, 'cases', 'technician', '/cases'),
  shot(`${IN}/cases`, 'cases-all', 'manager', '/cases?status=all'),
  shot(`${IN}/cases`, 'cases-no-match', 'manager', '/cases?q=zzzz'),
  shot(`${IN}/cases`, 'cases-empty', 'technician', '/cases', 'emptied'),
  shot(`${IN}/cases`, 'cases-error', 'technician', '/cases', 'broken'),
  shot(`${IN}/cases/new`, 'case-new', 'technician', '/cases/new'),
  shot(`${IN}/cases/new`, 'case-new-on-unit', 'technician', ({ unit }) => unit && `/cases/new?unit=${unit}`),
  shot(`${IN}/cases/[id]`, 'case', 'technician', ({ openCase }) => openCase && `/cases/${openCase}`),
  shot(`${IN}/cases/[id]`, 'case-called', 'technician', ({ calledCase }) => calledCase && `/cases/${calledCase}`),
  shot(`${IN}/cases/[id]`, 'case-past', 'technician', ({ pastMoment }) => pastMoment),
  shot(`${IN}/cases/[id]/catch`, 'case-catch', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/catch`),
  shot(`${IN}/cases/[id]/catch`, 'case-catch-called', 'technician', ({ calledCase }) => calledCase && `/cases/${calledCase}/catch`),
  shot(`${IN}/cases/[id]/repair`, 'case-repair', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/repair`),
  shot(`${IN}/cases/[id]/repair`, 'case-repair-called', 'manager', ({ calledCase }) => calledCase && `/cases/${calledCase}/repair`),
  shot(`${IN}/cases/[id]/fitting`, 'case-fitting', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/fitting`),
  shot(`${IN}/cases/[id]/break-in`, 'case-break-in', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/break-in`),
  shot(`${IN}/cases/[id]/release`, 'case-release', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/release`),
  shot(`${IN}/cases/[id]/dossier`, 'case-dossier', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/dossier`),
  shot(`${IN}/cases/[id]/dossier`, 'case-dossier-made', 'manager', ({ dossier }) => dossier && dossier.replace(/\/[^/]+$/, '')),
  shot(`${IN}/cases/[id]/dossier/[dossierId]`, 'case-dossier-read', 'manager', ({ dossier }) => dossier),
  shot(`${IN}/cases/[id]/claim`, 'case-claim', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/claim`),
  shot(`${IN}/cases/[id]/claim`, 'case-claim-kept', 'manager', ({ dossier }) => dossier && dossier.replace(/\/dossier\/[^/]+$/, '/claim')),
  shot(`${IN}/cases/[id]/watch`, 'case-watch', 'technician', ({ calledCase }) => calledCase && `/cases/${calledCase}/watch`),
  shot(`${IN}/cases/[id]/history`, 'case-history', 'technician', ({ openCase }) => openCase && `/cases/${openCase}/history`),
  shot(`${IN}/cases/[id]/history`, 'case-history-compared', 'technician', ({ pastMoment }) => pastMoment && `${pastMoment.replace('?', '/history?')}&with=2000-01-01`),
  shot(`${IN}/cases/[id]`, 'case-not-found', 'technician', `/cases/${NOWHERE}`),

  shot(`${IN}/units`, 'units', 'technician', '/units'),
  shot(`${IN}/units`, 'units-no-match', 'technician', '/units?q=zzzz'),
  shot(`${IN}/units`, 'units-empty', 'technician', '/units', 'emptied'),
  shot(`${IN}/units/new`, 'unit-new', 'technician', '/units/new'),
  shot(`${IN}/units/new`, 'unit-new-not-allowed', 'trainer', '/units/new'),
  shot(`${IN}/units/[id]`, 'unit', 'technician', ({ unit }) => unit && `/units/${unit}`),
  shot(`${IN}/units/[id]`, 'unit-not-found', 'technician', `/units/${NOWHERE}`),
  shot(`${IN}/units/[id]/edit`, 'unit-edit', 'technician', ({ unit }) => unit && `/units/${unit}/edit`),
  shot(`${IN}/units/[id]/baseline`, 'unit-baseline', 'technician', ({ unit }) => unit && `/units/${unit}/baseline`),
  shot(`${IN}/units/[id]/baseline`, 'unit-baseline-not-found', 'technician', `/units/${NOWHERE}/baseline`),
  shot(`${IN}/units/[id]/readings/new`, 'unit-reading', 'technician', ({ unit }) => unit && `/units/${unit}/readings/new`),
  shot(`${IN}/units/[id]/fits/new`, 'fit-new', 'technician', ({ unit }) => unit && `/units/${unit}/fits/new`),
  shot(`${IN}/units/[id]/fits/[fitId]`, 'fit', 'technician', ({ fit }) => fit),

  shot(`${IN}/models`, 'models', 'engineer', '/models'),
  shot(`${IN}/models`, 'models-empty', 'engineer', '/models', 'emptied'),
  shot(`${IN}/models`, 'models-error', 'engineer', '/models', 'broken'),
  shot(`${IN}/models/new`, 'model-new', 'engineer', '/models/new'),
  shot(`${IN}/models/[id]`, 'model', 'engineer', ({ model }) => model && `/models/${model}`),
  shot(`${IN}/models/[id]`, 'model-not-found', 'engineer', `/models/${NOWHERE}`),
  shot(`${IN}/models/[id]/edit`, 'model-edit', 'engineer', ({ model }) => model && `/models/${model}/edit`),

  shot(`${IN}/bench`, 'bench', 'technician', '/bench'),
  shot(`${IN}/bench/[sum]`, 'bench-measured-build-up', 'technician', '/bench/measured-build-up'),
  shot(`${IN}/bench/[sum]`, 'bench-head-pressure', 'technician', '/bench/head-pressure?narrowedBore=6+mm'),
  shot(`${IN}/bench/[sum]`, 'bench-never', 'technician', '/bench/build-up?delivery=5+cfm&leak=6+cfm'),
  shot(`${IN}/bench/[sum]`, 'bench-refused', 'technician', '/bench/leak-down?volume=three&time=2+psi'),
  shot(`${IN}/bench/line-survey`, 'bench-line-survey-empty', 'technician', '/bench/line-survey'),
  shot(`${IN}/bench/line-survey`, 'bench-line-survey', 'technician', `/bench/line-survey?${new URLSearchParams({ distance1: '0 ft', temperature1: '390 °F', distance2: '2 ft', temperature2: '375 °F', distance3: '4 ft', temperature3: '270 °F', distance4: '8 ft', temperature4: '240 °F' })}`),
  shot(`${IN}/bench/[sum]`, 'bench-sum-not-found', 'technician', '/bench/no-such-sum'),

  shot(`${IN}/notices`, 'notices', 'manager', '/notices'),
  shot(`${IN}/notices`, 'notices-empty', 'technician', '/notices', 'emptied'),
  shot(`${IN}/search`, 'search-empty', 'technician', '/search'),
  shot(`${IN}/search`, 'search', 'technician', '/search?q=oil'),
  shot(`${IN}/search`, 'search-no-match', 'technician', '/search?q=zzzz'),
  shot(`${IN}/search`, 'search-entry', 'technician', '/search?q=drain&read=remedy.free-the-drain'),

  shot(`${IN}/not-allowed`, 'not-allowed', 'trainer', '/not-allowed'),

  shot(`${IN}/settings/profile`, 'settings-profile', 'technician', '/settings/profile'),
  shot(`${IN}/settings/units`, 'settings-units', 'technician', '/settings/units'),
  shot(`${IN}/settings/notices`, 'settings-notices', 'technician', '/settings/notices'),
  shot(`${IN}/settings/tokens`, 'settings-tokens', 'technician', '/settings/tokens'),
  shot(`${IN}/settings/limits`, 'settings-limits', 'engineer', '/settings/limits'),
  shot(`${IN}/settings/limits/new`, 'settings-limit-new', 'engineer', '/settings/limits/new?check=cut-in-pressure&from=us-cut-in-truck'),
  shot(`${IN}/settings/limits/[id]`, 'settings-limit', 'engineer', ({ limit }) => limit && `/settings/limits/${limit}`),
  shot(`${IN}/settings/limits/[id]`, 'settings-limit-not-found', 'engineer', `/settings/limits/${NOWHERE}`),
  shot(`${IN}/settings/people`, 'settings-people', 'administrator', '/settings/people'),
  shot(`${IN}/settings/people/[id]`, 'settings-person', 'administrator', ({ person }) => person && `/settings/people/${person}`),
  shot(`${IN}/settings/people/[id]`, 'settings-person-not-found', 'administrator', `/settings/people/${NOWHERE}`),
  shot(`${IN}/settings/people/invite`, 'settings-invite', 'administrator', '/settings/people/invite'),
  shot(`${IN}/fleet/gate`, 'fleet-gate', 'manager', '/fleet/gate'),
  shot(`${IN}/settings/sites`, 'settings-sites', 'administrator', '/settings/sites'),
  shot(`${IN}/settings/sites/[id]`, 'settings-site', 'administrator', ({ site }) => site && `/settings/sites/${site}`),
  shot(`${IN}/settings/sites/[id]`, 'settings-site-not-found', 'administrator', `/settings/sites/${NOWHERE}`),
  shot(`${IN}/settings/sites/[id]/gates/[gateId]`, 'settings-gate-not-found', 'administrator', ({ site }) => site && `/settings/sites/${site}/gates/${NOWHERE}`),
  shot(`${IN}/settings/sites/new`, 'settings-site-new', 'administrator', '/settings/sites/new'),
  shot(`${IN}/settings/organisation`, 'settings-organisation', 'administrator', '/settings/organisation'),
  shot(`${IN}/settings/organisation`, 'settings-organisation-not-allowed', 'technician', '/settings/organisation'),
  shot(`${IN}/settings/jobs`, 'settings-jobs', 'administrator', '/settings/jobs'),
  shot(`${IN}/settings/jobs`, 'settings-jobs-no-match', 'administrator', '/settings/jobs?state=failed&kind=sweep'),
  shot(`${IN}/settings/audit`, 'settings-audit', 'administrator', '/settings/audit'),
];

/** Pages that only lead somewhere else, so that there is nothing to picture. */
export const ONLY_REDIRECTS: readonly string[] = [`${IN}/settings`];
