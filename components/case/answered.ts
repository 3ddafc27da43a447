import type { CaseState, FindingView } from '@/lib/schemas/case-view';

/** What people answered and stands, newest first; what the record knows is not among it. */
export const standing = ({ findings }: CaseState): FindingView[] => findings.filter(({ current, source }) => current && source !== 'record');

/** What "undo" takes back. */
export const lastAsked = (state: CaseState): FindingView | undefined => standing(state).find(({ source }) => source === 'asked' || source === 'sum');
