import type { Cause } from '../types';
import { NORMAL_CARRYOVER, SOMETHING_ELSE } from '../types';

/**
 * What a case can end in. The priors are shares of all cases and sum to 1; every one is judgement, to be replaced by
 * counted cases as soon as an organisation has them.
 */
export const causes: Cause[] = [
  // Crankcase and drain: the oil can't leave
  {
    id: 'drain-choked-by-sealant',
    station: 'crankcase-and-drain',
    name: 'Drain choked by sealant',
    sentence:
      'Sealant squeezed out at the mounting gasket closes the oil drain, soonest where the opening is small, so that the crankcase floods and the piston pumps oil from the first minutes after fitting.',
    prior: 0.05,
    basis: 'judgement',
  },
  {
    id: 'drain-restricted',
    station: 'crankcase-and-drain',
    name: 'Drain restricted',
    sentence:
      'Something other than sealant holds the oil back: a wrong or shifted gasket, a kinked or sludged external drain, or a drain that enters below the oil level.',
    prior: 0.03,
    basis: 'judgement',
  },
  {
    id: 'crankcase-pressure-high',
    station: 'crankcase-and-drain',
    name: 'Crankcase pressure high',
    sentence: 'Blow-by or a plugged breather pressurises the engine’s crankcase, so that oil can’t fall back to it.',
    prior: 0.04,
    basis: 'judgement',
  },
  {
    id: 'engine-oil-overfull',
    station: 'crankcase-and-drain',
    name: 'Engine oil overfull',
    sentence: 'The engine’s oil stands above full, overfilled or raised by fuel or coolant, and drowns the compressor’s drain.',
    prior: 0.02,
    basis: 'judgement',
  },

  // Oil feed
  {
    id: 'oil-feed-restricted',
    station: 'oil-feed',
    name: 'Oil feed restricted',
    sentence:
      'The feed line is kinked, collapsed or sludged, or its port is sealed over, and the bearings starve until they knock and seize.',
    prior: 0.02,
    basis: 'judgement',
  },
  {
    id: 'oil-degraded',
    station: 'oil-feed',
    name: 'Engine oil degraded',
    sentence: 'Fuel-diluted, sooted or overdue engine oil is too thin for the rings and bakes to carbon early.',
    prior: 0.02,
    basis: 'judgement',
  },

  // Intake
  {
    id: 'intake-filter-clogged',
    station: 'intake',
    name: 'Intake filter clogged',
    sentence: 'The filter of a naturally aspirated compressor is blocked, and the vacuum behind it draws oil up past the rings.',
    prior: 0.04,
    basis: 'judgement',
  },
  {
    id: 'intake-hose-collapsed',
    station: 'intake',
    name: 'Intake hose collapses',
    sentence: 'A soft, oil-swollen intake hose is sucked shut under load or as boost comes on, and the vacuum draws oil up.',
    prior: 0.03,
    basis: 'judgement',
  },
  {
    id: 'intake-dirt-ingested',
    station: 'intake',
    name: 'Dirt past the filter',
    sentence: 'A leak or a dirty box after the filter lets dust in, and the dust scores bore and rings.',
    prior: 0.02,
    basis: 'judgement',
  },
  {
    id: 'oil-in-intake-air',
    station: 'intake',
    name: 'Oil arrives with the air',
    sentence:
      'Oil comes in with the air, from a turbocharger seal, a breather led into the intake or an over-oiled filter, and the compressor only passes it on.',
    prior: 0.02,
    basis: 'judgement',
    source: 'The over-oiled filter is from memory.',
  },

  // Cylinder and head
  {
    id: 'rings-worn',
    station: 'cylinder-and-head',
    name: 'Rings worn',
    sentence: 'Rings and bore have worn over high miles, and carryover has grown slowly with them.',
    prior: 0.09,
    basis: 'judgement',
  },
  {
    id: 'rings-not-seated',
    station: 'cylinder-and-head',
    name: 'Rings not seated',
    sentence: 'A newly fitted compressor was not run in under load, and has passed a light, steady amount of oil from the start.',
    prior: 0.03,
    basis: 'judgement',
  },
  {
    id: 'valve-leaking',
    station: 'cylinder-and-head',
    name: 'Valve leaking',
    sentence: 'A broken, warped or carboned inlet or discharge valve lets air back, so that it is compressed again: hot, and slow to build up.',
    prior: 0.03,
    basis: 'judgement',
  },
  {
    id: 'head-gasket-failed',
    station: 'cylinder-and-head',
    name: 'Head gasket or head failed',
    sentence: 'A failed head gasket or a cracked head lets coolant into the air, or air into the coolant.',
    prior: 0.03,
    basis: 'judgement',
  },
  {
    id: 'coolant-starved',
    station: 'cylinder-and-head',
    name: 'Head starved of coolant',
    sentence: 'The coolant line to the head is restricted or air-locked, and the head overheats.',
    prior: 0.02,
    basis: 'judgement',
  },

  // Unloader and governor
  {
    id: 'governor-faulty',
    station: 'unloader-and-governor',
    name: 'Governor faulty',
    sentence: 'The governor cuts in or out at the wrong pressure, over too narrow a span, or sticks.',
    prior: 0.03,
    basis: 'judgement',
  },
  {
    id: 'unloader-stuck',
    station: 'unloader-and-governor',
    name: 'Unloader stuck or leaking',
    sentence: 'The unloader sticks or leaks, so that the compressor never rests, or never pumps.',
    prior: 0.03,
    basis: 'judgement',
  },

  // Discharge line: the air can't leave
  {
    id: 'discharge-line-carboned',
    station: 'discharge-line',
    name: 'Discharge line carboned',
    sentence:
      'Baked oil has narrowed the discharge line, most in its first two metres; often it is the old line that stayed when the compressor was changed.',
    prior: 0.08,
    basis: 'judgement',
  },
  {
    id: 'discharge-line-kinked-or-frozen',
    station: 'discharge-line',
    name: 'Discharge line kinked or frozen',
    sentence: 'A kink, a low spot that holds ice, or a wrong fitting closes the discharge line.',
    prior: 0.02,
    basis: 'judgement',
  },

  // Dryer
  {
    id: 'dryer-restricted',
    station: 'dryer',
    name: 'Dryer restricted',
    sentence: 'The dryer’s inlet or its desiccant is plugged, and air backs up to the head.',
    prior: 0.02,
    basis: 'judgement',
  },
  {
    id: 'dryer-overdue',
    station: 'dryer',
    name: 'Dryer overdue',
    sentence: 'The cartridge is past its service interval and gives up ordinary oil that it has collected; the compressor is sound.',
    prior: 0.05,
    basis: 'judgement',
  },
  {
    id: 'purge-or-check-valve-leaking',
    station: 'dryer',
    name: 'Purge or check valve leaking',
    sentence: 'Air is lost at the purge or back through the dryer’s check valve, and the compressor cycles fast to replace it.',
    prior: 0.03,
    basis: 'judgement',
  },

  // Tanks and system
  {
    id: 'system-leaks',
    station: 'tanks-and-system',
    name: 'System leaks',
    sentence: 'The system loses more air than its limit allows, and the compressor stays loaded, hot and short of rest.',
    prior: 0.05,
    basis: 'judgement',
  },
  {
    id: 'demand-too-high',
    station: 'tanks-and-system',
    name: 'Demand too high',
    sentence: 'Accessories, unloading work or the vocation ask for more air than this size of compressor can give.',
    prior: 0.02,
    basis: 'judgement',
  },

  // Drive
  {
    id: 'drive-gear-failed',
    station: 'drive',
    name: 'Drive gear failed',
    sentence: 'Steel teeth are chipped or worn, or the rim of a fibre gear has let go of its hub.',
    prior: 0.01,
    basis: 'judgement',
  },
  {
    id: 'crank-or-bearing-failed',
    station: 'drive',
    name: 'Crank or bearing failed',
    sentence: 'A bearing, rod or crank has failed, often after starved oil or long overpressure.',
    prior: 0.01,
    basis: 'judgement',
  },

  // At no part
  {
    id: NORMAL_CARRYOVER,
    station: null,
    name: 'Normal carryover, nothing to repair',
    sentence: 'The oil is the small amount that every compressor passes, in proportion to its hours and load.',
    prior: 0.09,
    basis: 'judgement',
    // At worst a dryer cartridge earlier than planned.
    costIfLeft: 80,
  },
  {
    id: SOMETHING_ELSE,
    station: null,
    name: 'Something else',
    sentence: 'None of the causes listed fits.',
    prior: 0.07,
    basis: 'judgement',
  },
];
