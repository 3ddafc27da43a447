import type { Check } from '@/lib/diagnose/types';
import { formatQuantity, type UnitPreferences } from '@/lib/units';
import { measureOf } from './measure';

interface Answered {
  kind: string;
  shares: readonly { state: string; share: number }[];
  valueTyped: string | null;
  valueSi: number | null;
  errorSi: number | null;
}

/** An answer as it is shown: "Heavy bead", "48 s ± 1 s", “Can’t tell”. */
export function answerText(check: Check | undefined, answered: Answered, units: UnitPreferences): string {
  if (answered.kind === 'cannot-tell') return 'Can’t tell';
  if (answered.kind === 'skip') return 'Skipped';
  if (answered.kind === 'undo') return 'Taken back';
  if (answered.kind === 'measured') return measuredText(check, answered, units);
  const [first] = answered.shares;
  return check?.states.find((state) => state.id === first?.state)?.label ?? first?.state ?? '';
}

function measuredText(check: Check | undefined, { valueTyped, valueSi, errorSi }: Answered, units: UnitPreferences): string {
  const measure = check && measureOf(check, units);
  if (!measure || valueSi === null) return valueTyped ?? '';
  const value = formatQuantity(valueSi, { quantity: measure.quantity, unit: measure.unit });
  if (!errorSi) return value;
  return `${value} ± ${formatQuantity(errorSi, { quantity: measure.difference, unit: measure.differenceUnit })}`;
}
