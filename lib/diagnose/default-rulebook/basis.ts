/** Where a check, a limit or a rule comes from, spread into what states it. */
export const judgement = { basis: 'judgement' } as const;
export const commonPractice = { basis: 'common practice', source: 'Common practice, no source.' } as const;
export const fromMemory = { basis: 'common practice', source: 'Common practice, from memory.' } as const;
export const driverManual = {
  basis: 'common practice',
  source: 'Model commercial driver manual, section 5 (air brakes).',
} as const;

/** Of a rule: what it says has a basis, how much it weighs never has another than judgement. */
export const weighedPractice = {
  basis: 'common practice',
  source: 'Common practice, no source; the weight is judgement.',
} as const;
export const weighedMemory = {
  basis: 'common practice',
  source: 'Common practice, from memory; the weight is judgement.',
} as const;
export const weighedManual = {
  basis: 'common practice',
  source: 'Limit: model commercial driver manual, section 5; the weight is judgement.',
} as const;
export const weighedBuildUp = {
  basis: 'regulation',
  source: 'Limit: 49 CFR 571.121 S5.1.1, which binds new vehicles and is a reference in service; the weight is judgement.',
} as const;
export const weighedCutIn = {
  basis: 'regulation',
  source: 'Limit: 49 CFR 571.121 S5.1.1.1; the weight is judgement.',
} as const;
