import { celsius, hours, inH2O, kelvins, miles, millilitres, millilitresPerHour, mm, percent, perHour, psi, psiPerMinute, seconds, years } from '@/lib/diagnose/default-rulebook/si';
import type { Given } from './findings';
import { reads, says } from './findings';

/** A short case for every cause that no teaching case names: what a workshop would have written down. Invented. */
export const otherCauses: { expected: string; told: string; findings: Given[] }[] = [
  {
    expected: 'drain-restricted',
    told: 'oil by the spoonful since a year, external drain sags, crankcase full, no sealant',
    findings: [
      says('oil-amount', 'heavy'),
      says('onset', 'gradually'),
      says('external-drain', 'kinked-or-sagging'),
      says('crankcase-flooded', 'yes'),
      says('sealant-at-gasket', 'none'),
    ],
  },
  {
    expected: 'crankcase-pressure-high',
    told: 'the engine uses oil and blows by, 14 inH2O in its crankcase, flange wet',
    findings: [
      says('complaint-engine-oil-use', 'yes'),
      says('blow-by-seen', 'yes'),
      reads('crankcase-pressure', inH2O(14)),
      says('flange-leak', 'yes'),
      says('oil-at-purge', 'yes'),
    ],
  },
  {
    expected: 'oil-degraded',
    told: 'oil 62,000 miles old, thin and smelling of fuel, on the dipstick and at the purge',
    findings: [
      reads('oil-service-age', miles(62_000)),
      says('engine-oil-condition', 'fuel'),
      says('oil-look', 'fuel'),
      says('oil-at-purge', 'yes'),
      says('onset', 'gradually'),
    ],
  },
  {
    expected: 'intake-dirt-ingested',
    told: 'clamp loose after the filter, dust in the hose, oil within a year of the fit',
    findings: [
      says('intake-hose-state', 'cracked'),
      says('dirt-past-filter', 'yes'),
      says('onset', 'gradually'),
      reads('miles-since-fit', miles(70_000)),
      says('oil-at-purge', 'yes'),
    ],
  },
  {
    expected: 'oil-in-intake-air',
    told: 'boosted, oil in the hose before the compressor and in the charge pipe',
    findings: [
      says('intake-type', 'boosted'),
      says('oil-in-intake-hose', 'yes'),
      says('turbo-outlet-oil', 'yes'),
      says('oil-at-purge', 'yes'),
      says('blow-by-seen', 'no'),
    ],
  },
  {
    expected: 'valve-leaking',
    told: 'slow air from one day to the next, hot head, air blows back at the intake, the line open',
    findings: [
      says('onset', 'suddenly'),
      reads('build-up-time', seconds(55)),
      reads('head-temperature', kelvins(50)),
      says('blow-back-at-intake', 'yes'),
      reads('line-bore', mm(15)),
    ],
  },
  {
    expected: 'coolant-starved',
    told: 'after a new water pump the head runs hot, 22 K from coolant in to coolant out, build-up in order',
    findings: [
      says('work-cooling', 'yes'),
      reads('head-temperature', kelvins(48)),
      reads('coolant-rise', kelvins(22)),
      reads('build-up-time', seconds(22)),
    ],
  },
  {
    expected: 'governor-faulty',
    told: 'cuts out at 152 psi, wet-tank safety valve has lifted, the signal comes late',
    findings: [
      reads('cut-out-pressure', psi(152)),
      says('wet-tank-safety-valve', 'yes'),
      says('governor-signal', 'wrong'),
      says('complaint-oil', 'no'),
    ],
  },
  {
    expected: 'unloader-stuck',
    told: 'keeps pumping at cut-out though the signal is right, loaded all the time, no leaks',
    findings: [
      says('unloads-at-cut-out', 'keeps-pumping'),
      says('governor-signal', 'right'),
      reads('share-loaded', percent(90)),
      reads('leak-down-released', psiPerMinute(1)),
    ],
  },
  {
    expected: 'discharge-line-kinked-or-frozen',
    told: 'no air on a morning of 15 below, low spot in the line, air came back in the warm bay',
    findings: [
      says('complaint-no-air', 'yes'),
      reads('outside-temperature', celsius(-15)),
      says('discharge-line-look', 'low-spot'),
      says('line-frees-when-warmed', 'yes'),
    ],
  },
  {
    expected: 'dryer-restricted',
    told: 'slow air, weak purge, 20 psi lost over the dryer, old cartridge',
    findings: [
      reads('build-up-time', seconds(44)),
      says('purge-at-cut-out', 'weak-or-none'),
      reads('dryer-pressure-drop', psi(20)),
      reads('dryer-cartridge-age', years(3.5)),
    ],
  },
  {
    expected: 'purge-or-check-valve-leaking',
    told: 'cuts in every other minute parked, air at the purge while unloaded, leak-down in order',
    findings: [
      says('complaint-cycling', 'yes'),
      reads('cycles-parked', perHour(32)),
      says('air-at-purge-unloaded', 'yes'),
      reads('leak-down-released', psiPerMinute(1.5)),
    ],
  },
  {
    expected: 'demand-too-high',
    told: 'unloads by air all day, loaded 68 % of the time, nothing leaks, small compressor',
    findings: [
      says('duty', 'air-for-unloading'),
      reads('share-loaded', percent(68)),
      reads('leak-down-released', psiPerMinute(0.8)),
      says('unloads-at-cut-out', 'unloads'),
      says('compressor-too-small', 'yes'),
    ],
  },
  {
    expected: 'crank-or-bearing-failed',
    told: 'knocked, then stopped pumping; feed line open, the gear sound, crank broken',
    findings: [
      says('noise', 'knock'),
      says('air-delivery', 'none'),
      says('feed-line-state', 'open'),
      says('drive-gear-state', 'sound'),
      says('bearing-state', 'broken-or-seized'),
    ],
  },
  {
    expected: 'normal-carryover',
    told: 'a film at the purge of a three-year-old unit, cartridge new, nothing found',
    findings: [
      says('oil-amount', 'film'),
      reads('dryer-cartridge-age', years(0.5)),
      reads('build-up-time', seconds(20)),
      reads('leak-down-released', psiPerMinute(0.9)),
      says('oil-in-wet-tank', 'no'),
      reads('hours-since-fit', hours(3000)),
      reads('drain-flow', millilitres(500)),
      reads('oil-caught', millilitresPerHour(0.05)),
    ],
  },
];
