const SEVEN_DAYS_MS = 7 * 24 * 3_600_000;

export const invitationExpiry = (now: Date) => new Date(now.getTime() + SEVEN_DAYS_MS);
