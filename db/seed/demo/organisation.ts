import type { Role } from '@/lib/auth/roles';
import { US_UNITS } from '@/lib/units';
import { seededId } from '../seeded-id';
import signIns from '../sign-ins.json' with { type: 'json' };
import { DAYS_OF_RECORD } from './calendar';

/** Everything here is invented: no person, place or fleet of these names is meant. */
export const ORGANISATION = {
  id: seededId('organisation'),
  name: 'Quillmere Freight',
  country: 'US',
  currency: 'USD',
  labourRatePerHour: 140,
};

/** How everybody of the demo writes measures. */
export const WRITING = { organisation: { country: ORGANISATION.country }, person: { units: US_UNITS } };

export type SiteKey = 'quillmere' | 'brackenford' | 'saltmarsh';

export interface Site {
  key: SiteKey;
  id: string;
  name: string;
  timeZone: string;
  /** First letter of its fleet numbers. */
  letter: string;
  /** Share of fits at which the old discharge line is put back. Planted: one site keeps it. */
  keepsOldLine: number;
  /** Degrees Celsius by day, January and July. */
  climate: { january: number; july: number };
  vocations: Record<Vocation, number>;
}

export type Vocation = 'long-haul' | 'regional' | 'stop-start' | 'air-for-unloading';

export const SITES: Record<SiteKey, Site> = {
  quillmere: {
    key: 'quillmere',
    id: seededId('site: Quillmere yard'),
    name: 'Quillmere yard',
    timeZone: 'America/Chicago',
    letter: 'Q',
    keepsOldLine: 0.22,
    climate: { january: -3, july: 29 },
    vocations: { 'long-haul': 45, regional: 32, 'stop-start': 13, 'air-for-unloading': 10 },
  },
  brackenford: {
    key: 'brackenford',
    id: seededId('site: Brackenford depot'),
    name: 'Brackenford depot',
    timeZone: 'America/Denver',
    letter: 'B',
    keepsOldLine: 0.22,
    climate: { january: -5, july: 30 },
    vocations: { 'long-haul': 28, regional: 34, 'stop-start': 12, 'air-for-unloading': 26 },
  },
  saltmarsh: {
    key: 'saltmarsh',
    id: seededId('site: Saltmarsh End'),
    name: 'Saltmarsh End',
    timeZone: 'America/New_York',
    letter: 'S',
    keepsOldLine: 0.8,
    climate: { january: 2, july: 28 },
    vocations: { 'long-haul': 22, regional: 30, 'stop-start': 40, 'air-for-unloading': 8 },
  },
};

export interface DemoPerson {
  id: string;
  name: string;
  email: string;
  /** Only the five who sign in have one. */
  password?: string;
  roles: Role[];
  site: SiteKey | null;
  /** The right to release vehicles, with what it rests on. */
  releaseBasis: string | null;
  /** Day of the record on which he or she left. */
  leftOn?: number;
}

const INSPECTOR = 'Named brake inspector of the fleet, renewed each January.';

/** Those who sign in: one for each role, and nothing but that role. */
const SIGN_INS: DemoPerson[] = signIns.map(({ role, name, email, password }) => ({
  id: seededId(`person: ${role}`),
  name,
  email,
  password,
  roles: [role as Role],
  site: 'quillmere',
  releaseBasis: role === 'engineer' || role === 'manager' ? INSPECTOR : null,
}));

const colleague = (
  name: string,
  roles: Role[],
  site: SiteKey | null,
  rest: Pick<Partial<DemoPerson>, 'releaseBasis' | 'leftOn'> = {},
): DemoPerson => ({
  id: seededId(`person: ${name}`),
  name,
  email: `${name.toLowerCase().replace(' ', '.')}@quillmere.test`,
  roles,
  site,
  releaseBasis: null,
  ...rest,
});

export const PEOPLE: DemoPerson[] = [
  ...SIGN_INS,
  colleague('Corwin Haldreth', ['technician'], 'quillmere', { releaseBasis: INSPECTOR }),
  colleague('Brannoch Tullis', ['technician'], 'brackenford', { releaseBasis: INSPECTOR }),
  colleague('Sefa Ondurai', ['technician', 'engineer'], 'brackenford', { releaseBasis: 'Brake inspector since his first year here; certificate in the site file.' }),
  colleague('Petra Vossmere', ['technician'], 'saltmarsh'),
  colleague('Ruel Castaban', ['technician', 'trainer'], 'saltmarsh', { releaseBasis: INSPECTOR }),
  colleague('Odile Farranter', ['engineer', 'trainer'], 'saltmarsh'),
  colleague('Jory Wickersby', ['manager', 'administrator'], null),
  colleague('Nell Hatherlow', ['technician'], 'saltmarsh', { leftOn: Math.round(DAYS_OF_RECORD * 0.62) }),
];

const withRole = (role: Role) => {
  const found = PEOPLE.find(({ roles, password }) => password !== undefined && roles.includes(role));
  if (!found) throw new Error(`nobody signs in as ${role}`);
  return found;
};

export const DEMO_TECHNICIAN = withRole('technician');
export const DEMO_ENGINEER = withRole('engineer');
export const DEMO_MANAGER = withRole('manager');

/** Who works on vehicles at a site on a day. */
export const techniciansAt = (site: SiteKey, day: number): DemoPerson[] =>
  PEOPLE.filter((one) => one.site === site && one.roles.includes('technician') && (one.leftOn === undefined || day < one.leftOn));
