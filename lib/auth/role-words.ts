import type { Role } from './roles';

const list = new Intl.ListFormat('en-GB');

/**
 * What somebody works as, for the middle of a sentence.
 * @example asRoles(['technician', 'engineer']) // 'as a technician and an engineer'
 */
export const asRoles = (roles: readonly Role[]): string => `as ${list.format(roles.map((role) => `${/^[aeiou]/.test(role) ? 'an' : 'a'} ${role}`))}`;
