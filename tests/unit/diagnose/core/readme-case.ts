import type { Finding, Rulebook } from '@/lib/diagnose';
import { book, cause, choice, finding, measured, rule, somethingElse } from '@/tests/support/rulebook-parts';

/** The small rulebook that lib/diagnose/README.md walks through by hand. */
export const readmeRulebook: Rulebook = book({
  causes: [
    cause('drain-choked', 0.2, { station: 'crankcase-and-drain' }),
    cause('line-carboned', 0.3, { station: 'discharge-line' }),
    cause('rings-worn', 0.3, { station: 'cylinder-and-head' }),
    somethingElse(0.2),
  ],
  checks: [
    choice('began', { 'at-once': 0.2, gradually: 0.5, suddenly: 0.3 }),
    choice('sealant', { 'heavy-bead': 0.1, 'thin-film': 0.3, none: 0.6 }),
    measured('head-temperature', [420, 450], [0.6, 0.3, 0.1], { quantity: 'temperature', unit: 'K' }),
    choice('build-up', { slow: 0.25, normal: 0.75 }),
  ],
  evidenceGroups: [{ id: 'heat', name: 'Heat and back-pressure', rho: 0.5 }],
  rules: [
    rule('began at once', { began: 'at-once' }, { 'drain-choked': 6, 'rings-worn': -7 }),
    rule('heavy bead', { sealant: 'heavy-bead' }, { 'drain-choked': 7 }),
    {
      ...rule('head hot', {}, { 'line-carboned': 6 }, { group: 'heat' }),
      conditions: { all: [{ fact: 'head-temperature', operator: 'greaterThanInclusive', value: 450 }] },
    },
    {
      ...rule('head warm', {}, { 'line-carboned': 2 }, { group: 'heat' }),
      conditions: {
        all: [
          { fact: 'head-temperature', operator: 'greaterThanInclusive', value: 420 },
          { fact: 'head-temperature', operator: 'lessThan', value: 450 },
        ],
      },
    },
    rule('slow build-up', { 'build-up': 'slow' }, { 'line-carboned': 5 }, { group: 'heat' }),
    rule('at once after a heavy bead', { began: 'at-once', sealant: 'heavy-bead' }, { 'drain-choked': 2 }),
  ],
});

/** Began at once; a heavy bead, thought so; head at 448 K give or take 4; build-up slow. */
export const readmeFindings: Finding[] = [
  finding('began', 'at-once'),
  finding('sealant', 'heavy-bead', { reliability: 0.8 }),
  finding('head-temperature', { 'band-1': 0.75, 'band-2': 0.25 }),
  finding('build-up', 'slow'),
];
