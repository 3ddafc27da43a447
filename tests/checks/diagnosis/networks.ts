/** Belief networks: a cause is one joint state of what can't be seen; its id spells it, "tub-bronc" or "none". */
import { inhibition, noisyOr } from '@/lib/diagnose/pairs-noisy-or';
import type { Proofs } from '../../support/outside-values';
import { chance, found, probability, textbook } from './small-rulebook';

type World = Record<string, boolean>;
interface Variable {
  name: string;
  /** P(true), given those before it. */
  given: (world: World) => number;
}

function worlds(variables: readonly Variable[]): { world: World; p: number; id: string }[] {
  let all: { world: World; p: number }[] = [{ world: {}, p: 1 }];
  for (const { name, given } of variables) {
    all = all.flatMap(({ world, p }) => {
      const yes = given(world);
      return [{ world: { ...world, [name]: true }, p: p * yes }, { world: { ...world, [name]: false }, p: p * (1 - yes) }];
    });
  }
  return all.map(({ world, p }) => ({ world, p, id: Object.keys(world).filter((name) => world[name]).join('-') || 'none' }));
}

function network(hidden: readonly Variable[], seen: readonly Variable[]) {
  const states = worlds(hidden);
  return textbook({
    causes: Object.fromEntries(states.map(({ id, p }) => [id, p])),
    checks: Object.fromEntries(seen.map(({ name, given }) => {
      const yes = states.map(({ world }) => given(world));
      return [name, { yes, no: yes.map((p) => 1 - p) }];
    })),
  });
}

const fixed = (p: number) => () => p;
const by = (name: string, yes: number, no: number) => (world: World) => (world[name] ? yes : no);
const has = (name: string) => (id: string) => id.split('-').includes(name);
const yes = (...names: string[]) => names.map((name) => found(name, 'yes'));

const asia = network(
  [
    { name: 'travel', given: fixed(0.01) },
    { name: 'smoke', given: fixed(0.5) },
    { name: 'tub', given: by('travel', 0.05, 0.01) },
    { name: 'lung', given: by('smoke', 0.1, 0.01) },
    { name: 'bronc', given: by('smoke', 0.6, 0.3) },
  ],
  [
    { name: 'asia', given: by('travel', 1, 0) },
    { name: 'xray', given: ({ tub, lung }) => (tub || lung ? 0.98 : 0.05) },
    { name: 'dysp', given: ({ tub, lung, bronc }) => (tub || lung ? (bronc ? 0.9 : 0.7) : bronc ? 0.8 : 0.1) },
  ],
);

const sprinkler = network(
  [
    { name: 'cloudy', given: fixed(0.5) },
    { name: 'sprinkler', given: by('cloudy', 0.1, 0.5) },
    { name: 'rain', given: by('cloudy', 0.8, 0.2) },
  ],
  [
    { name: 'wet', given: (w) => (w.sprinkler ? (w.rain ? 0.99 : 0.9) : w.rain ? 0.9 : 0) },
    { name: 'rain-seen', given: by('rain', 1, 0) },
  ],
);

const burglary = network(
  [
    { name: 'burglary', given: fixed(0.001) },
    { name: 'earthquake', given: fixed(0.002) },
    { name: 'alarm', given: (w) => (w.burglary ? (w.earthquake ? 0.95 : 0.94) : w.earthquake ? 0.29 : 0.001) },
  ],
  [
    { name: 'john', given: by('alarm', 0.9, 0.05) },
    { name: 'mary', given: by('alarm', 0.7, 0.01) },
  ],
);

/** P(fever | one cause alone) of cold, flu and malaria. */
const FEVER: Record<string, number> = { cold: 0.4, flu: 0.8, mal: 0.9 };
const fever = (leak: number, ...causes: string[]) => {
  const alone = causes.map((cause) => noisyOr(leak, [inhibition(FEVER[cause] ?? NaN, 0)]));
  return noisyOr(leak, alone.map((p) => inhibition(p, leak)));
};
const leakyFever = network(
  [
    { name: 'cold', given: fixed(0.1) },
    { name: 'flu', given: fixed(0.05) },
    { name: 'mal', given: fixed(0.001) },
  ],
  [{ name: 'fever', given: (w) => fever(0.02, ...Object.keys(w).filter((name) => w[name])) }],
);

export const networks: Proofs = {
  A01: () => probability(asia, [], has('tub')),
  A03: () => probability(asia, [], has('bronc')),
  A04: () => chance(asia, [], 'asia', 'yes') * chance(asia, yes('asia'), 'dysp', 'yes'),
  A05: () => probability(asia, yes('asia', 'dysp'), has('tub')),
  A07: () => probability(asia, yes('asia', 'dysp'), has('bronc')),
  A08: () => chance(asia, [], 'xray', 'yes'),
  A09: () => chance(asia, [], 'dysp', 'yes'),
  A11: () => probability(asia, yes('asia', 'xray', 'dysp'), has('tub')),
  A12: () => probability(asia, yes('asia', 'xray', 'dysp'), has('lung')),
  A13: () => probability(asia, [found('xray', 'no'), ...yes('dysp')], has('bronc')),
  S02: () => probability(sprinkler, yes('wet'), has('sprinkler')),
  S03: () => probability(sprinkler, yes('wet'), has('rain')),
  S04: () => probability(sprinkler, yes('wet', 'rain-seen'), has('sprinkler')),
  B02: () => probability(burglary, yes('john', 'mary'), has('earthquake')),
  N01: () => fever(0, 'mal'),
  N02: () => fever(0, 'flu'),
  N04: () => fever(0, 'cold'),
  N05: () => fever(0, 'cold', 'mal'),
  N06: () => fever(0, 'cold', 'flu'),
  N08: () => fever(0),
  N09: () => chance(leakyFever, [], 'fever', 'yes'),
  N10: () => probability(leakyFever, yes('fever'), has('cold')),
  N12: () => probability(leakyFever, yes('fever'), has('mal')),
  N13: () => fever(0.02, 'cold', 'flu'),
};
