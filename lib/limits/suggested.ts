import { publishedLimit, type PublishedLimit } from '@/lib/air-and-oil/limits';
import type { Limit } from './limit';

/** Published figures for what a check measures. They hold nowhere by themselves: an organisation adopts one, or its own. */
const OF_CHECK: Readonly<Record<string, readonly string[]>> = {
  'build-up-time': ['us-build-up-dual', 'ca-on-build-up'],
  'leak-down-released': ['us-leak-released-single', 'us-leak-released-combination'],
  'leak-down-applied': ['us-leak-applied-single', 'us-leak-applied-combination', 'ca-on-leak-applied-single', 'ca-on-leak-applied-combination'],
  'cut-in-pressure': ['us-cut-in-truck', 'us-cut-in-bus', 'us-governor-section-5'],
  'cut-out-pressure': ['us-cut-out-section-2', 'us-governor-section-5'],
};

/** Checks that published figures are known for, the most used first. */
export const CHECKS_WITH_FIGURES: readonly string[] = Object.keys(OF_CHECK);

export const publishedFor = (checkId: string): PublishedLimit[] => (OF_CHECK[checkId] ?? []).flatMap((id) => publishedLimit(id) ?? []);

/** A published figure as a limit that could be adopted, with how its source stands: a driver's check is no regulation. */
export const limitOf = ({ least, most, below = false, source, standing }: PublishedLimit): Pick<Limit, 'least' | 'most' | 'below' | 'source'> => ({
  least: least ?? null,
  most: most ?? null,
  below,
  source: `${source} (${standing})`,
});
