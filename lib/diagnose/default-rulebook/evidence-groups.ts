import type { EvidenceGroup } from '../types';

/** Findings that tell the same story count less and less beside each other; a lower rho where they say the very same. */
export const evidenceGroups: EvidenceGroup[] = [
  { id: 'time-since-fit', name: 'Time since the fit', rho: 0.3 },
  { id: 'onset', name: 'How it began' },
  { id: 'past-fits', name: 'Earlier compressors' },
  { id: 'practice', name: 'How it was fitted' },
  { id: 'complaint-of-air', name: 'Air as reported and timed' },
  { id: 'where-oil-is', name: 'Where oil is found' },
  { id: 'how-much-oil', name: 'How much oil' },
  { id: 'oil-quality', name: 'What the oil is like' },
  { id: 'drain', name: 'The way back for the oil' },
  { id: 'crankcase', name: 'Pressure and level in the engine' },
  { id: 'feed-and-bearings', name: 'Oil feed and bearings' },
  { id: 'drive', name: 'Drive' },
  { id: 'intake', name: 'Restriction at the intake' },
  { id: 'intake-oil', name: 'Oil in the intake air' },
  { id: 'intake-dirt', name: 'Dirt in the intake air' },
  { id: 'cylinder', name: 'Rings, bore and valves' },
  { id: 'heat', name: 'Heat' },
  { id: 'coolant', name: 'Coolant' },
  { id: 'restriction', name: 'Restriction after the head' },
  { id: 'dryer', name: 'Dryer cartridge' },
  { id: 'dryer-air', name: 'Air at the dryer’s purge' },
  { id: 'duty', name: 'Leaks and duty' },
  { id: 'duty-of-vehicle', name: 'What the work asks for' },
  { id: 'governor', name: 'Governor and unloader' },
];
