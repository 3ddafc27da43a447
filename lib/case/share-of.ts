import type { StateShare } from '@/lib/diagnose/types';

/** How much of an answer lies in some of a check's states. @returns 0 to 1 */
export const shareOf = (shares: readonly StateShare[], states: readonly string[]): number => shares.reduce((sum, { state, share }) => sum + (states.includes(state) ? share : 0), 0);
