import type { Reason } from '@/lib/diagnose';
import type { Report } from './report';

/** Causes less likely than this are only counted. */
const LEAST_SHOWN = 0.01;
/** Weights that would print as 0.0 dB. */
const LEAST_DECIBANS = 0.05;
const SUGGESTIONS_SHOWN = 5;

const FIT = {
  'something-else-leads': 'This doesn’t fit well: no listed cause explains it best.',
  'evidence-against-the-leader': 'This doesn’t fit well: what was found speaks against the leading cause.',
} as const;

/** The report for people. */
export function reportText(report: Report): string {
  const shown = report.causes.filter(({ p }, index) => p >= LEAST_SHOWN || index === 0);
  const rest = report.causes.length - shown.length;
  return [
    report.fit.fits ? undefined : `${FIT[report.fit.reason]}\n`,
    report.fromRecord.length === 0 ? undefined : `From the record: ${report.fromRecord.join(', ')}\n`,
    ...shown.flatMap(({ causeId, name, p, reasons }, index) => [
      `${String(index + 1).padStart(2)}  ${percent(p).padStart(6)}  ${name}  (${causeId})`,
      ...reasonLines(reasons),
    ]),
    rest === 0 ? undefined : `    ${rest} more, each under ${percent(LEAST_SHOWN)}`,
    '',
    ...nextText(report),
  ]
    .filter((line) => line !== undefined)
    .join('\n');
}

function reasonLines(reasons: readonly Reason[]): string[] {
  const told = reasons.filter(({ countedDecibans }) => Math.abs(countedDecibans) >= LEAST_DECIBANS);
  return told.length === 0 ? ['              nothing found tells for or against it'] : told.map(reasonText);
}

function reasonText({ checkIds, countedDecibans, strength, rules }: Reason): string {
  const sign = countedDecibans < 0 ? '-' : '+';
  const words = strength ? `${strength.word} ${strength.direction}` : '';
  const why = rules.map(({ note, basis, source }) => `${note} [${source ?? basis}]`).join(' ') || 'another answer would have told the opposite';
  return `              ${`${sign}${Math.abs(countedDecibans).toFixed(1)} dB`.padStart(8)}  ${words}: ${checkIds.join(' + ')}. ${why}`;
}

function nextText({ enoughIsKnown, nextChecks, repairs }: Report): string[] {
  const checks = nextChecks
    .slice(0, SUGGESTIONS_SHOWN)
    .map(
      ({ checkIds, prompts, word, minutes, why }) =>
        `  ${word}, ${Number(minutes.toFixed(1))} min: ${prompts.join(' / ')}  (${checkIds.join(' + ')})${why.kind === 'waits-for' ? `; waits for ${why.checkIds.join(', ')}, whose evidence it would spoil` : ''}`,
    );
  const steps = repairs.slice(0, SUGGESTIONS_SHOWN).map(({ remedyId, name, p }, index) => `  ${index + 1}. ${name}  (${remedyId}, ${percent(p)})`);
  return [
    enoughIsKnown ? 'Enough is known; repair:' : 'Next checks:',
    ...(enoughIsKnown ? steps : checks),
    ...(enoughIsKnown ? ['Checks that would still tell something:', ...checks] : ['Repairs, as things stand:', ...steps]),
  ];
}

function percent(p: number): string {
  return `${(100 * p).toFixed(p < 0.0995 ? 1 : 0)} %`;
}
