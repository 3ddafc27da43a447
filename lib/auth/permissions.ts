import { ANYONE, CASE_WORKERS, hasAnyRole, type Role } from './roles';

/**
 * Who may do what: the one table that services refuse by and the navigation is cut to.
 *
 * Technicians and engineers work on cases and managers see them through, so that all three also keep the records that
 * a case stands on. Trainers read the units that their drills come from; the casebook gives them cases without names.
 * Administrators look after people and places and see units, because sites are where units stand.
 */
export const PERMITTED = {
  'case.see': CASE_WORKERS,
  'case.work': CASE_WORKERS,
  'watch.hold-early': ['engineer', 'manager'],
  'unit.see': ANYONE,
  'unit.edit': CASE_WORKERS,
  'model.see': ANYONE,
  'model.edit': ['engineer', 'manager'],
  'bench.use': ANYONE,
  'limit.see': CASE_WORKERS,
  'limit.adopt': ['engineer', 'manager'],
  'fleet.see': ['engineer', 'manager'],
  'own-settings': ANYONE,
  'people.manage': ['administrator'],
  'site.manage': ['administrator'],
  'organisation.manage': ['administrator'],
  'job.see': ['administrator'],
  'job.retry': ['administrator'],
  'audit.see': ['administrator'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMITTED;

export const may = (held: readonly Role[], permission: Permission) => hasAnyRole(held, PERMITTED[permission]);
