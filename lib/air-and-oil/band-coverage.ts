/** The share of draws whose true value lay within the band. */
export interface BandCoverage {
  /** With each input off by up to its usual error. */
  readonly usual: number;
  /** With three times that: where a band of first order begins to be off. */
  readonly tripled: number;
}

/**
 * How often the true value lay within the band that promises 95 %, by sum, around the defaults of its inputs: 50,000
 * draws (10,000 of the head pressure) of uniform errors. A test draws again and holds the table to it.
 */
export const BAND_COVERAGE: Readonly<Record<string, BandCoverage>> = {
  'measured-build-up': { usual: 0.949, tripled: 0.948 },
  'build-up': { usual: 0.950, tripled: 0.949 },
  'build-up-limit': { usual: 0.948, tripled: 0.948 },
  'leak-down': { usual: 0.948, tripled: 0.948 },
  'leak-size': { usual: 0.949, tripled: 0.947 },
  'time-loaded': { usual: 0.949, tripled: 0.949 },
  delivery: { usual: 0.951, tripled: 0.956 },
  'discharge-temperature': { usual: 0.948, tripled: 0.948 },
  'compression-index': { usual: 0.949, tripled: 0.949 },
  'line-loss': { usual: 0.947, tripled: 0.946 },
  'head-pressure': { usual: 0.946, tripled: 0.938 },
  'orifice-flow': { usual: 0.950, tripled: 0.950 },
  'break-in-bleed': { usual: 0.950, tripled: 0.954 },
  'drain-capacity': { usual: 0.950, tripled: 0.948 },
  'carry-over': { usual: 0.950, tripled: 0.950 },
  'carry-over-by-weight': { usual: 0.948, tripled: 0.948 },
};
