import { repairWork } from '@/lib/case/view/repair-plan';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { Check } from '@/lib/diagnose/types';

/** A fitting as its cautions see it: what was closed is open. An edition without a proof has none of its own. */
export const fittingWork = ({ rulebook }: Pick<CompiledRulebook, 'rulebook'>): Pick<Check, 'cautions' | 'setUp'> => repairWork({ cautions: rulebook.proof?.fitting.cautions ?? [] });
