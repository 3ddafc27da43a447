import type { Check, CheckState, CompiledRulebook } from '@/lib/diagnose';
import { formatQuantity, isUnitOf } from '@/lib/units';

/** A check as `--list --json` gives it. */
export interface ListedCheck {
  id: string;
  station: string;
  prompt: string;
  kind: Check['kind'];
  /** Measured checks: the unit that a number without one is in. */
  unit?: string;
  answers: { id: string; label: string; band?: string }[];
  /** Fact of the record that answers it. */
  record?: string;
}

/** Every check of a rulebook with its answers, in the rulebook's order. */
export function listChecks(compiled: CompiledRulebook): ListedCheck[] {
  return compiled.rulebook.checks.map((check) => ({
    id: check.id,
    station: check.station,
    prompt: check.prompt,
    kind: check.kind,
    ...(check.unit === undefined ? {} : { unit: check.unit }),
    answers: check.states.map((state) => ({
      id: state.id,
      label: state.label,
      ...(check.kind === 'measured' ? { band: bandText(check, state) } : {}),
    })),
    ...(check.fromRecord ? { record: check.fromRecord.fact } : {}),
  }));
}

export function listText(checks: readonly ListedCheck[]): string {
  return checks
    .map(({ id, station, prompt, unit, answers, record }) =>
      [
        `${id}  (${station}${unit === undefined ? '' : `, measured in ${unit}`}${record === undefined ? '' : `, record: ${record}`})`,
        `  ${prompt}`,
        ...answers.map((answer) => (answer.band === undefined ? `    ${answer.id}: ${answer.label}` : `    ${answer.band}: ${answer.label}`)),
      ].join('\n'),
    )
    .join('\n\n');
}

function bandText(check: Check, { low, high }: CheckState): string {
  const { quantity, unit = '' } = check;
  if (quantity === undefined || !isUnitOf(quantity, unit)) return '';
  const shown = (si: number) => formatQuantity(si, { quantity, unit }).replace('\u00a0', ' ');
  if (low === undefined) return `below ${shown(high ?? NaN)}`;
  return high === undefined ? `${shown(low)} or more` : `${shown(low)} to below ${shown(high)}`;
}
