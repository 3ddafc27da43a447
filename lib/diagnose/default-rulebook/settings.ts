import type { RulebookSettings } from '../types';

/**
 * How evidence is weighed, and what time and money are worth where an organisation says nothing. All of it is judgement.
 * Money is in the organisation's own currency; only its proportions matter to the order of repairs.
 */
export const settings: RulebookSettings = {
  beta: 1,
  defaultRho: 0.5,
  defaultReliability: 0.8,
  labourRatePerHour: 120,
  // A specialist who starts afresh, with the vehicle standing still meanwhile.
  serviceCost: 3000,
  // Recovery, a lost day and the work done twice.
  comebackCost: 900,
  setUpMinutes: {
    engine: { off: 1, idle: 1, governed: 1 },
    air: { full: 6, empty: 5 },
    heat: { hot: 15, cold: 45 },
    brakes: { released: 1, applied: 1 },
    access: {
      'wheels-chocked': 3,
      'cab-tilted': 5,
      'panels-off': 10,
      'line-open': 12,
      'head-off': 45,
      'compressor-off': 90,
    },
  },
};
