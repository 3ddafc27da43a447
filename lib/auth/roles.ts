/** What a person may be in an organisation; several at once. */
export const ROLES = ['technician', 'engineer', 'manager', 'trainer', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

export const isRole = (text: string): text is Role => (ROLES as readonly string[]).includes(text);

/** Everybody who is signed in. */
export const ANYONE: readonly Role[] = ROLES;
/** Those who work on cases. */
export const CASE_WORKERS: readonly Role[] = ['technician', 'engineer', 'manager'];

export const hasAnyRole = (held: readonly Role[], wanted: readonly Role[]) => wanted.some((role) => held.includes(role));
