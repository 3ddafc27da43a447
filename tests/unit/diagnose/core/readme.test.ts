import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { compareCauses, compileRulebook, rank, type RankedCause } from '@/lib/diagnose';
import { readmeFindings, readmeRulebook } from './readme-case';

const readme = readFileSync('lib/diagnose/README.md', 'utf8').replace(/\s+/g, ' ');
const compiled = compileRulebook(readmeRulebook);
const ranking = rank(compiled, readmeFindings);
const four = (value: number) => value.toFixed(4);

describe('the case that the README walks by hand', () => {
  it('has the completed tables that stand there', () => {
    for (const { id, stateIds, table } of compiled.checks.values()) {
      compiled.causeIds.forEach((causeId, cause) => {
        const weights = table.map((state) => state[cause] ?? NaN);
        if (weights.every((weight) => weight === 0)) return;
        const row = `| ${id} | ${causeId} | ${weights.map((weight, state) => `${stateIds[state]} ${four(weight)}`).join(', ')} |`;
        expect(readme).toContain(row);
      });
    }
  });

  it('has the scores that stand there', () => {
    const rowOf = ({ causeId, prior, terms, scoreNats, p }: RankedCause) =>
      `| ${[causeId, four(Math.log(prior)), terms.map(({ countedNats }) => four(countedNats)).join(' + ') || '0', four(scoreNats), four(Math.exp(scoreNats)), four(p)].join(' | ')} |`;
    for (const ranked of ranking.causes) expect(readme).toContain(rowOf(ranked));
    const sum = ranking.causes.reduce((total, { scoreNats }) => total + Math.exp(scoreNats), 0);
    expect(readme).toContain(`sum to ${four(sum)}`);
  });

  it('has the comparison that stands there', () => {
    const { logRatioNats, priorNats, groups } = compareCauses(ranking, 'drain-choked', 'line-carboned');
    expect(readme).toContain(`${four(priorNats)} (priors)`);
    for (const { group, nats } of groups) expect(readme).toContain(`${four(nats)} (\`${group}\`)`);
    expect(readme).toContain(`= ${four(logRatioNats)}`);
  });
});
