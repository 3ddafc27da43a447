/** The share of draws whose true value lay within the band. */
export interface BandCoverage {
  /** With each input off by up to its usual error. */
  readonly usual: number;
  /** With three times that: where a band of first order begins to be off. */
  readonly tripled: number;
  /** How many draws. */
  readonly draws: number;
}

const DRAWS = 50_000;

/**
 * How often the true value lay within the band that promises 95 %, by sum, around the defaults of its inputs, by draws of
 * uniform errors. A test draws again and holds the table to it.
 */
export const BAND_COVERAGE: Readonly<Record<string, BandCoverage>> = {
  'measured-build-up': { usual: 0.949, tripled: 0.948, draws: DRAWS },
  'build-up': { usual: 0.950, tripled: 0.949, draws: DRAWS },
  'build-up-ratio': { usual: 0.950, tripled: 0.950, draws: DRAWS },
  'build-up-limit': { usual: 0.948, tripled: 0.948, draws: DRAWS },
  'leak-down': { usual: 0.948, tripled: 0.948, draws: DRAWS },
  'leak-size': { usual: 0.949, tripled: 0.947, draws: DRAWS },
  'time-loaded': { usual: 0.949, tripled: 0.949, draws: DRAWS },
  delivery: { usual: 0.951, tripled: 0.956, draws: DRAWS },
  'discharge-temperature': { usual: 0.948, tripled: 0.948, draws: DRAWS },
  'compression-index': { usual: 0.949, tripled: 0.949, draws: DRAWS },
  'line-loss': { usual: 0.947, tripled: 0.946, draws: DRAWS },
  'head-pressure': { usual: 0.946, tripled: 0.938, draws: 10_000 },
  'orifice-flow': { usual: 0.950, tripled: 0.950, draws: DRAWS },
  'break-in-bleed': { usual: 0.950, tripled: 0.954, draws: DRAWS },
  'drain-capacity': { usual: 0.950, tripled: 0.948, draws: DRAWS },
  'carry-over': { usual: 0.950, tripled: 0.950, draws: DRAWS },
  'carry-over-by-weight': { usual: 0.948, tripled: 0.948, draws: DRAWS },
};
