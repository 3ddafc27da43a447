/** Where a check, limit or weight comes from, spread into what states it. */
export const judgement = { basis: 'judgement' } as const;
export const commonPractice = { basis: 'common practice', source: 'Common practice, no source.' } as const;
export const fromMemory = { basis: 'common practice', source: 'Common practice, from memory.' } as const;
export const driverManual = {
  basis: 'common practice',
  source: 'Model commercial driver manual, section 5 (air brakes).',
} as const;
