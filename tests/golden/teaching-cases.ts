import {
  hours, inH2O, kelvins, miles, millilitres, millilitresPerHour, mm, percent, perHour, psi, psiPerMinute, seconds, years,
} from '@/lib/diagnose/default-rulebook/si';
import type { RecordFacts } from '@/lib/diagnose';
import type { Given } from './findings';
import { reads, says } from './findings';

/**
 * The twelve teaching cases of the default rulebook, invented from common practice. Each is told once as its sentence
 * states it, and again as somebody else would enter it: fewer answers, other checks, or facts from the record.
 */
export interface TeachingCase {
  id: number;
  title: string;
  /** What must lead, in this order if one, in any order if two. */
  expected: string[];
  because: string;
  told: { how: string; findings: Given[]; facts?: RecordFacts }[];
}

/** Every reading that "everything measured in order" stands for, as a sound vehicle gives it. */
const MEASURED_IN_ORDER: Given[] = [
  reads('build-up-time', seconds(21)),
  reads('cut-out-pressure', psi(128)),
  reads('cut-in-pressure', psi(105)),
  reads('governor-span', psi(23)),
  reads('leak-down-released', psiPerMinute(1)),
  reads('leak-down-applied', psiPerMinute(1.5)),
  reads('share-loaded', percent(18)),
  reads('cycles-parked', perHour(3)),
  reads('line-bore', mm(15.5)),
  reads('head-temperature', kelvins(4)),
  reads('head-to-tank-pressure', psi(2)),
  reads('dryer-pressure-drop', psi(1)),
  reads('intake-vacuum', inH2O(8)),
  reads('crankcase-pressure', inH2O(2)),
  reads('oil-pressure-at-feed', psi(32)),
  reads('drain-flow', millilitres(450)),
  reads('coolant-rise', kelvins(4)),
];

const LOOKED_AT_IN_ORDER: Given[] = [
  says('intake-filter-state', 'clean'),
  says('intake-hose-state', 'sound'),
  says('intake-hose-flattens', 'no'),
  says('feed-line-state', 'open'),
  says('engine-oil-level', 'in-range'),
  says('engine-oil-condition', 'normal'),
  says('discharge-line-look', 'falls-freely'),
  says('unloads-at-cut-out', 'unloads'),
  says('purge-at-cut-out', 'sharp'),
  says('noise', 'ordinary'),
  says('coolant-level-falling', 'no'),
];

const without = (given: readonly Given[], ...checks: string[]): Given[] => given.filter(({ check }) => !checks.includes(check));

export const teachingCases: TeachingCase[] = [
  {
    id: 1,
    title: 'Fitted 60 miles ago, and oil pours from the purge',
    expected: ['drain-choked-by-sealant'],
    because: 'a heavy bead has squeezed into a small drain hole, and the crankcase floods',
    told: [
      {
        how: 'as stated',
        findings: [
          reads('miles-since-fit', miles(60)),
          says('oil-at-purge', 'yes'),
          says('oil-amount', 'pours'),
          says('onset', 'after-fitting'),
          says('drain-opening', 'small-hole'),
          says('sealant-at-gasket', 'heavy-bead'),
        ],
      },
      {
        how: 'the fit from the record, only the oil asked',
        findings: [says('oil-amount', 'pours')],
        facts: { milesSinceFit: miles(60), drainOpening: 'small-hole', sealantAtGasket: 'heavy-bead' },
      },
      {
        how: 'without the amount',
        findings: [
          reads('miles-since-fit', miles(60)),
          says('oil-at-purge', 'yes'),
          says('drain-opening', 'small-hole'),
          says('sealant-at-gasket', 'heavy-bead'),
        ],
      },
      {
        how: 'as a complaint, hours instead of miles',
        findings: [
          says('complaint-oil', 'yes'),
          reads('hours-since-fit', hours(2)),
          says('onset', 'after-fitting'),
          says('oil-amount', 'pours'),
          says('sealant-at-gasket', 'heavy-bead'),
          says('drain-opening', 'small-hole'),
        ],
      },
    ],
  },
  {
    id: 2,
    title: 'Replaced two weeks ago, the old discharge line kept',
    expected: ['discharge-line-carboned'],
    because: 'carbon has left 3 mm of a 16 mm bore, and head pressure and heat follow',
    told: [
      {
        how: 'as stated',
        findings: [
          says('discharge-line-changed', 'no'),
          reads('head-temperature', kelvins(75)),
          reads('build-up-time', seconds(48)),
          says('head-safety-valve', 'yes'),
          reads('line-bore', mm(3)),
        ],
      },
      {
        how: 'with the distance of two weeks, the fit from the record',
        findings: [
          reads('head-temperature', kelvins(60)),
          reads('build-up-time', seconds(48)),
          says('head-safety-valve', 'yes'),
          reads('line-bore', mm(3)),
        ],
        facts: { milesSinceFit: miles(4200), engineHoursSinceFit: hours(110), dischargeLineChanged: 'no', previousFitsInTwoYears: 1 },
      },
      {
        how: 'with carbon seen, and heat as a complaint',
        findings: [
          reads('miles-since-fit', miles(2600)),
          says('discharge-line-changed', 'no'),
          says('complaint-heat', 'yes'),
          reads('head-temperature', kelvins(45)),
          reads('build-up-time', seconds(48)),
          says('head-safety-valve', 'yes'),
          reads('line-bore', mm(3)),
        ],
      },
    ],
  },
  {
    id: 3,
    title: '410,000 miles, and oil has crept up over a year',
    expected: ['rings-worn'],
    because: 'a compressor of that age has worn its rings, and everything else is in order',
    told: [
      {
        how: 'as stated',
        findings: [
          reads('miles-since-fit', miles(410_000)),
          says('onset', 'gradually'),
          says('intake-filter-state', 'clean'),
          reads('intake-vacuum', inH2O(8)),
          says('intake-hose-state', 'sound'),
          reads('drain-flow', millilitres(450)),
          says('drain-passage', 'clear'),
          says('discharge-line-look', 'falls-freely'),
          reads('line-bore', mm(15)),
          reads('leak-down-released', psiPerMinute(1)),
          reads('leak-down-applied', psiPerMinute(2)),
          reads('share-loaded', percent(22)),
        ],
      },
      {
        how: 'sparsely, one check for each part in order',
        findings: [
          reads('miles-since-fit', miles(410_000)),
          says('onset', 'gradually'),
          reads('intake-vacuum', inH2O(10)),
          says('drain-passage', 'clear'),
          says('carbon-in-line', 'film'),
          reads('leak-down-released', psiPerMinute(1.2)),
          reads('share-loaded', percent(24)),
        ],
      },
      {
        how: 'with oil at the purge, the distance from the record',
        findings: [
          says('complaint-oil', 'yes'),
          says('oil-at-purge', 'yes'),
          says('onset', 'gradually'),
          says('intake-filter-state', 'clean'),
          says('external-drain', 'falls-freely'),
          reads('line-bore', mm(14)),
          reads('leak-down-released', psiPerMinute(0.8)),
          reads('share-loaded', percent(20)),
        ],
        facts: { milesSinceFit: miles(410_000), engineHoursSinceFit: hours(11_500), vocation: 'long-haul' },
      },
      {
        how: 'with every reading in order',
        findings: [reads('miles-since-fit', miles(410_000)), says('onset', 'gradually'), says('complaint-oil', 'yes'), ...MEASURED_IN_ORDER],
      },
      {
        how: 'with every reading and look in order',
        findings: [reads('miles-since-fit', miles(410_000)), says('onset', 'gradually'), ...MEASURED_IN_ORDER, ...LOOKED_AT_IN_ORDER],
      },
    ],
  },
  {
    id: 4,
    title: 'Naturally aspirated, its filter 58,000 miles old and black',
    expected: ['intake-filter-clogged'],
    because: 'a blocked filter pulls 34 inH2O, and the vacuum draws oil up past the rings',
    told: [
      {
        how: 'as stated',
        findings: [
          says('intake-type', 'naturally-aspirated'),
          reads('intake-filter-age', miles(58_000)),
          says('intake-filter-state', 'black'),
          reads('intake-vacuum', inH2O(34)),
          says('oil-at-purge', 'yes'),
          says('onset', 'gradually'),
        ],
      },
      {
        how: 'intake type from the record, without the course',
        findings: [
          reads('intake-filter-age', miles(58_000)),
          says('intake-filter-state', 'black'),
          reads('intake-vacuum', inH2O(34)),
          says('complaint-oil', 'yes'),
        ],
        facts: { intakeType: 'naturally-aspirated' },
      },
    ],
  },
  {
    id: 5,
    title: 'Leak-down 7 psi a minute, loaded 70 % of the time',
    expected: ['system-leaks'],
    because: 'what leaks away must be pumped again, and the compressor never rests',
    told: [
      {
        how: 'as stated, everything else measured and looked at in order',
        findings: [
          reads('leak-down-released', psiPerMinute(7)),
          reads('share-loaded', percent(70)),
          says('oil-in-wet-tank', 'yes'),
          ...without(MEASURED_IN_ORDER, 'leak-down-released', 'leak-down-applied', 'share-loaded', 'cycles-parked'),
          ...LOOKED_AT_IN_ORDER,
        ],
      },
      {
        how: 'with every other reading in order but the cycles that a leak brings',
        findings: [
          reads('leak-down-released', psiPerMinute(7)),
          reads('share-loaded', percent(70)),
          says('oil-in-wet-tank', 'yes'),
          ...without(MEASURED_IN_ORDER, 'leak-down-released', 'share-loaded', 'cycles-parked'),
        ],
      },
      {
        how: 'the three findings alone',
        findings: [
          reads('leak-down-released', psiPerMinute(7)),
          reads('share-loaded', percent(70)),
          says('oil-in-wet-tank', 'yes'),
        ],
      },
      {
        how: 'with a few looks in order',
        findings: [
          reads('leak-down-released', psiPerMinute(7)),
          reads('share-loaded', percent(70)),
          says('oil-in-wet-tank', 'yes'),
          says('air-at-purge-unloaded', 'no'),
          says('unloads-at-cut-out', 'unloads'),
          reads('cut-out-pressure', psi(125)),
          reads('intake-vacuum', inH2O(10)),
          reads('line-bore', mm(15)),
          says('drain-passage', 'clear'),
        ],
      },
    ],
  },
  {
    id: 6,
    title: 'Engine oil 6 L over full since yesterday’s service',
    expected: ['engine-oil-overfull'],
    because: 'the sump drowns the compressor’s drain, and oil came with the service',
    told: [
      {
        how: 'as stated',
        findings: [
          says('engine-oil-level', 'well-over'),
          says('work-oil-service', 'yes'),
          says('onset', 'after-engine-work'),
          says('oil-at-purge', 'yes'),
        ],
      },
      {
        how: 'begun suddenly, oil as a complaint',
        findings: [
          says('engine-oil-level', 'well-over'),
          says('work-oil-service', 'yes'),
          says('onset', 'suddenly'),
          says('complaint-oil', 'yes'),
        ],
      },
      {
        how: 'without the work before, the oil fresh',
        findings: [
          says('engine-oil-level', 'well-over'),
          says('onset', 'after-engine-work'),
          reads('oil-service-age', miles(200)),
          says('oil-at-purge', 'yes'),
        ],
      },
    ],
  },
  {
    id: 7,
    title: 'A knock, a kinked feed line, 4 psi at the feed',
    expected: ['oil-feed-restricted'],
    because: 'the bearings starve behind the kink',
    told: [
      {
        how: 'as stated',
        findings: [says('noise', 'knock'), says('feed-line-state', 'kinked'), reads('oil-pressure-at-feed', psi(4))],
      },
      {
        how: 'the knock as a complaint',
        findings: [says('complaint-noise', 'yes'), says('feed-line-state', 'kinked'), reads('oil-pressure-at-feed', psi(4))],
      },
      {
        how: 'the knock reported and heard',
        findings: [
          says('complaint-noise', 'yes'),
          says('noise', 'knock'),
          says('feed-line-state', 'kinked'),
          reads('oil-pressure-at-feed', psi(4)),
        ],
      },
    ],
  },
  {
    id: 8,
    title: '3 mL caught in 200 engine hours, the cartridge four years old',
    expected: ['dryer-overdue', 'normal-carryover'],
    because: 'nothing passes that a sound compressor would not pass; the cartridge has gathered it',
    told: [
      {
        how: 'as stated, everything measured in order',
        findings: [
          reads('oil-caught', millilitresPerHour(3 / 200)),
          reads('dryer-cartridge-age', years(4)),
          ...MEASURED_IN_ORDER,
        ],
      },
      {
        how: 'a few readings in order, the age from the record',
        findings: [
          reads('oil-caught', millilitresPerHour(3 / 200)),
          reads('build-up-time', seconds(22)),
          reads('leak-down-released', psiPerMinute(1)),
          reads('share-loaded', percent(20)),
          reads('head-temperature', kelvins(3)),
        ],
        facts: { dryerCartridgeAge: years(4) },
      },
      {
        how: 'the two figures alone',
        findings: [reads('oil-caught', millilitresPerHour(3 / 200)), reads('dryer-cartridge-age', years(4))],
      },
      {
        how: 'readings and looks in order, a film at the purge',
        findings: [
          reads('oil-caught', millilitresPerHour(3 / 200)),
          reads('dryer-cartridge-age', years(4)),
          says('oil-at-purge', 'yes'),
          says('oil-amount', 'film'),
          ...MEASURED_IN_ORDER,
          ...LOOKED_AT_IN_ORDER,
        ],
      },
    ],
  },
  {
    id: 9,
    title: 'Fitted 800 miles ago with no break-in run, light steady oil',
    expected: ['rings-not-seated'],
    because: 'rings that were never loaded have never seated; line and drain are in order',
    told: [
      {
        how: 'as stated',
        findings: [
          reads('miles-since-fit', miles(800)),
          says('break-in-run', 'not-done'),
          says('sealant-at-gasket', 'thin-film'),
          says('oil-amount', 'light'),
          says('oil-pattern', 'steady'),
          says('discharge-line-changed', 'yes'),
          says('drain-passage', 'clear'),
        ],
      },
      {
        how: 'the fit from the record, drain by its flow',
        findings: [says('oil-amount', 'light'), reads('drain-flow', millilitres(400)), says('oil-at-purge', 'yes')],
        facts: {
          milesSinceFit: miles(800),
          breakInRun: 'no',
          sealantAtGasket: 'thin-film',
          dischargeLineChanged: 'yes',
          newOrRebuilt: 'new',
        },
      },
      {
        how: 'without the amount, the line looked into',
        findings: [
          reads('miles-since-fit', miles(800)),
          says('break-in-run', 'not-done'),
          says('sealant-at-gasket', 'thin-film'),
          says('oil-pattern', 'steady'),
          says('oil-at-purge', 'yes'),
          says('carbon-in-line', 'film'),
          says('sealant-in-drain', 'no'),
        ],
      },
      {
        how: 'by what was caught, from the start',
        findings: [
          reads('miles-since-fit', miles(800)),
          says('onset', 'after-fitting'),
          says('break-in-run', 'not-done'),
          says('sealant-at-gasket', 'thin-film'),
          reads('oil-caught', millilitresPerHour(0.6)),
          says('discharge-line-changed', 'yes'),
          says('drain-passage', 'clear'),
        ],
      },
    ],
  },
  {
    id: 10,
    title: 'Coolant in the wet tank, the coolant level falling',
    expected: ['head-gasket-failed'],
    because: 'coolant gets into the air only through the head',
    told: [
      { how: 'as stated', findings: [says('coolant-in-wet-tank', 'yes'), says('coolant-level-falling', 'yes')] },
      {
        how: 'with milky oil',
        findings: [says('coolant-in-wet-tank', 'yes'), says('coolant-level-falling', 'yes'), says('oil-look', 'milky')],
      },
    ],
  },
  {
    id: 11,
    title: 'No build-up, the crank stands still, a fibre gear used again',
    expected: ['drive-gear-failed'],
    because: 'the rim of the fibre gear has let go of its hub',
    told: [
      {
        how: 'as stated',
        findings: [
          says('air-delivery', 'none'),
          says('crank-turns', 'stands-still'),
          says('drive-gear-kind', 'fibre'),
          says('drive-gear-reused', 'yes'),
        ],
      },
      {
        how: 'as a complaint, the gear from the record',
        findings: [says('complaint-no-air', 'yes'), says('crank-turns', 'stands-still')],
        facts: { driveGear: 'fibre', driveGearReused: 'yes' },
      },
      {
        how: 'with the build-up timed until given up',
        findings: [
          reads('build-up-time', seconds(600)),
          says('crank-turns', 'stands-still'),
          says('drive-gear-kind', 'fibre'),
          says('drive-gear-reused', 'yes'),
        ],
      },
    ],
  },
  {
    id: 12,
    title: 'Revved, the intake hose flattens; oil only after hard pulls',
    expected: ['intake-hose-collapsed'],
    because: 'the hose is sucked shut under load, and oil is drawn up with it',
    told: [
      { how: 'as stated', findings: [says('intake-hose-flattens', 'yes'), says('oil-pattern', 'hard-pulls')] },
      {
        how: 'with a soft hose and oil at the purge',
        findings: [
          says('intake-hose-flattens', 'yes'),
          says('intake-hose-state', 'soft'),
          says('oil-pattern', 'hard-pulls'),
          says('oil-at-purge', 'yes'),
        ],
      },
    ],
  },
];
