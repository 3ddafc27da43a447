import { SOMETHING_ELSE, type Cause, type Check, type Finding, type Rule, type Rulebook } from '@/lib/diagnose';

/** Parts of a rulebook with everything filled in that a test does not care about. */

export const cause = (id: string, prior: number, more: Partial<Cause> = {}): Cause => ({
  id,
  station: null,
  name: id,
  sentence: 'As its name says.',
  prior,
  basis: 'judgement',
  ...more,
});

export const somethingElse = (prior: number): Cause => cause(SOMETHING_ELSE, prior);

/** A check with its answers' background rates. */
export const choice = (id: string, backgrounds: Record<string, number>, more: Partial<Check> = {}): Check => ({
  ...plainCheck(id),
  kind: 'choice',
  states: Object.entries(backgrounds).map(([state, background]) => ({ id: state, label: state, background })),
  ...more,
});

/** A measured check: band i reaches from edges[i - 1] to edges[i]; its bands are "band-0", "band-1"... */
export const measured = (id: string, edges: readonly number[], backgrounds: readonly number[], more: Partial<Check> = {}): Check => ({
  ...plainCheck(id),
  kind: 'measured',
  quantity: 'pressure',
  unit: 'kPa',
  states: backgrounds.map((background, band) => {
    const low = edges[band - 1];
    const high = edges[band];
    return {
      id: `band-${band}`,
      label: `band ${band}`,
      background,
      ...(low === undefined ? {} : { low }),
      ...(high === undefined ? {} : { high }),
    };
  }),
  ...more,
});

function plainCheck(id: string) {
  return {
    id,
    station: 'dryer' as const,
    name: 'Look',
    prompt: 'Look at it.',
    why: 'It tells.',
    steps: [],
    tools: [],
    minutes: 5,
    setUp: {},
    spoils: [],
    cautions: [],
    cannotTell: 0,
    basis: 'judgement' as const,
  };
}

/** A rule that fires when each of the checks named is in the state named. */
export const rule = (name: string, when: Record<string, string>, weights: Record<string, number>, more: Partial<Rule> = {}): Rule => ({
  name,
  conditions: { all: Object.entries(when).map(([fact, value]) => ({ fact, operator: 'equal', value })) },
  weights,
  note: 'So it is.',
  basis: 'judgement',
  ...more,
});

export const book = (parts: Pick<Rulebook, 'causes' | 'checks' | 'rules'> & Partial<Rulebook>): Rulebook => ({
  schemaVersion: 1,
  title: 'A small rulebook',
  panels: [],
  evidenceGroups: [],
  remedies: [],
  cautions: [],
  ...parts,
  settings: {
    beta: 1,
    defaultRho: 0.5,
    defaultReliability: 0.8,
    labourRatePerHour: 120,
    serviceCost: 3000,
    comebackCost: 900,
    setUpMinutes: {
      engine: { off: 1, idle: 1, governed: 1 },
      air: { full: 6, empty: 5 },
      heat: { hot: 15, cold: 45 },
      brakes: { released: 1, applied: 1 },
      access: { 'wheels-chocked': 3, 'cab-tilted': 5, 'panels-off': 10, 'line-open': 12, 'head-off': 45, 'compressor-off': 90 },
    },
    ...parts.settings,
  },
});

/** A sure finding at diagnosis; give `shares` for a split one, none for "can't tell". */
export const finding = (checkId: string, state: string | Record<string, number>, more: Partial<Finding> = {}): Finding => ({
  id: `finding-${checkId}`,
  checkId,
  stage: { kind: 'diagnosis' },
  shares: typeof state === 'string' ? [{ state, share: 1 }] : Object.entries(state).map(([id, share]) => ({ state: id, share })),
  reliability: 1,
  ...more,
});
