import { may, type Permission } from './permissions';
import type { Role } from './roles';

export interface Place {
  href: string;
  label: string;
}

const PLACES: readonly (Place & { needs: Permission })[] = [
  { href: '/cases', label: 'Cases', needs: 'case.see' },
  { href: '/units', label: 'Units', needs: 'unit.see' },
  { href: '/bench', label: 'Bench', needs: 'bench.use' },
  { href: '/models', label: 'Compressor models', needs: 'model.see' },
  { href: '/settings', label: 'Settings', needs: 'own-settings' },
];

const SETTINGS: readonly (Place & { needs: Permission })[] = [
  { href: '/settings/profile', label: 'You', needs: 'own-settings' },
  { href: '/settings/units', label: 'Units of measure', needs: 'own-settings' },
  { href: '/settings/notices', label: 'Notices', needs: 'own-settings' },
  { href: '/settings/tokens', label: 'Tokens', needs: 'own-settings' },
  { href: '/settings/limits', label: 'Limits', needs: 'limit.see' },
  { href: '/settings/people', label: 'People', needs: 'people.manage' },
  { href: '/settings/sites', label: 'Sites', needs: 'site.manage' },
  { href: '/settings/organisation', label: 'Organisation', needs: 'organisation.manage' },
  { href: '/settings/jobs', label: 'Jobs', needs: 'job.see' },
  { href: '/settings/audit', label: 'Audit', needs: 'audit.see' },
];

const open = (places: typeof PLACES, roles: readonly Role[]): Place[] =>
  places.filter(({ needs }) => may(roles, needs)).map(({ href, label }) => ({ href, label }));

/** The places that somebody with these roles can use, in the order of the work. */
export const navigationFor = (roles: readonly Role[]): Place[] => open(PLACES, roles);

/** The same for the settings. */
export const settingsFor = (roles: readonly Role[]): Place[] => open(SETTINGS, roles);

/** Where to go after signing in. */
export const homeFor = (roles: readonly Role[]): string => navigationFor(roles)[0]?.href ?? '/settings';
