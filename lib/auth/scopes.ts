import { may, type Permission } from './permissions';
import type { Role } from './roles';

/**
 * What a personal token can be let do: it acts with the roles of its person and within its scopes, so that the smaller
 * of the two holds. Each scope rests on the permission that its person needs for it.
 */
export const SCOPES = {
  'cases:read': { needs: 'case.see', does: 'See cases, their rankings, photos and the rulebook' },
  'cases:write': { needs: 'case.work', does: 'Open cases, answer checks, weigh oil, add photos, name causes' },
  'search:read': { needs: 'unit.see', does: 'Search units, cases, notes and the rulebook' },
  'bench:read': { needs: 'bench.use', does: 'Work out sums of the bench' },
  'units:read': { needs: 'unit.see', does: 'See units with their readings, fits and healthy baselines' },
  'units:write': { needs: 'unit.edit', does: 'Add and change units, readings, fits and healthy baselines' },
  'limits:read': { needs: 'limit.see', does: 'See the limits your organisation adopted' },
  'limits:write': { needs: 'limit.adopt', does: 'Adopt and withdraw limits' },
  'models:read': { needs: 'model.see', does: 'See compressor models' },
  'models:write': { needs: 'model.edit', does: 'Add and change compressor models' },
  'sites:read': { needs: 'own-settings', does: 'See sites' },
  'sites:write': { needs: 'site.manage', does: 'Add and change sites' },
  'fleet:read': { needs: 'fleet.see', does: 'See fleet statistics' },
  'people:read': { needs: 'case.see', does: 'See who can be given a case' },
  'jobs:read': { needs: 'job.see', does: 'See what Carryover does by itself: mail, pictures, nightly work' },
  'jobs:write': { needs: 'job.retry', does: 'Try jobs again that failed' },
  'profile:read': { needs: 'own-settings', does: 'See who you are, your units of measure and your notices' },
  'profile:write': { needs: 'own-settings', does: 'Change your units of measure, read your notices and set how you are told' },
} as const satisfies Record<string, { needs: Permission; does: string }>;

export type Scope = keyof typeof SCOPES;

export const SCOPE_IDS = Object.keys(SCOPES) as [Scope, ...Scope[]];

export const isScope = (text: string): text is Scope => text in SCOPES;

/** Those that somebody with these roles can make any use of. */
export const scopesFor = (roles: readonly Role[]): Scope[] => SCOPE_IDS.filter((scope) => may(roles, SCOPES[scope].needs));
