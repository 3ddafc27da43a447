import { judgement } from '../basis';
import { celsius, inH2O, kelvins, miles, millilitresPerHour, percent, psi, psiPerMinute, years } from '../si';
import type { Rule } from '../../types';
import { answer, band, together } from './rule';

/**
 * What two findings say together beyond what each says alone: interactions, within 10 dB, so few as can be. Every one
 * of them is a group of its own.
 */
export const rules: Rule[] = [
  {
    name: 'Heavy bead on a small drain',
    conditions: together(answer('sealant-at-gasket', 'heavy-bead'), answer('drain-opening', 'small-hole')),
    weights: { 'drain-choked-by-sealant': 4 },
    note: 'A heavy bead squeezes into the small drain hole and closes it.',
    ...judgement,
  },
  {
    name: 'Oil pours from a fresh fit',
    conditions: together(band('miles-since-fit', { below: miles(100) }), answer('oil-amount', 'pours')),
    weights: { 'drain-choked-by-sealant': 3, 'drain-restricted': 1.5, 'rings-not-seated': -3 },
    note: 'Unseated rings pass a little; what pours from a fresh fit is a crankcase that can’t drain.',
    ...judgement,
  },
  {
    name: 'Old line on a new compressor',
    conditions: together(band('miles-since-fit', { below: miles(3000) }), answer('discharge-line-changed', 'no')),
    weights: { 'discharge-line-carboned': 4 },
    note: 'The old line, with the carbon of the last compressor, was left on a new one.',
    ...judgement,
  },
  {
    name: 'Never run in, and new',
    conditions: together(band('miles-since-fit', { below: miles(3000) }), answer('break-in-run', 'not-done')),
    weights: { 'rings-not-seated': 2 },
    note: 'New, and never run in under load: its rings haven’t seated.',
    ...judgement,
  },
  {
    name: 'Crept up over a long life',
    conditions: together(band('miles-since-fit', { from: miles(300_000) }), answer('onset', 'gradually')),
    weights: { 'rings-worn': 3, 'normal-carryover': -2 },
    note: 'Oil that creeps up on a compressor of many miles is how worn rings show; what is ordinary doesn’t grow.',
    ...judgement,
  },
  {
    name: 'Old filter on its own intake',
    conditions: together(band('intake-filter-age', { from: miles(40_000) }), answer('intake-type', 'naturally-aspirated')),
    weights: { 'intake-filter-clogged': 2 },
    note: 'A naturally aspirated compressor has only this filter to breathe through.',
    ...judgement,
  },
  {
    name: 'Soft hose and hard pulls',
    conditions: together(answer('intake-hose-state', 'soft'), answer('oil-pattern', 'hard-pulls')),
    weights: { 'intake-hose-collapsed': 3 },
    note: 'A soft hose closes under load, and the oil comes after hard pulls.',
    ...judgement,
  },
  {
    name: 'Breather into the intake of an engine that blows by',
    conditions: together(answer('breather-routing', 'into-intake'), answer('blow-by-seen', 'yes')),
    weights: { 'oil-in-intake-air': 4, 'crankcase-pressure-high': -1 },
    note: 'What the engine blows by goes into the intake, oil and all.',
    ...judgement,
  },
  {
    name: 'Low spot and frost',
    conditions: together(answer('discharge-line-look', 'low-spot'), band('outside-temperature', { below: celsius(0) })),
    weights: { 'discharge-line-kinked-or-frozen': 5 },
    note: 'Water lies in the low spot, and it was freezing.',
    ...judgement,
  },
  {
    name: 'Overdue cartridge and little oil',
    conditions: together(band('dryer-cartridge-age', { from: years(3) }), band('oil-caught', { below: millilitresPerHour(0.2) })),
    weights: { 'dryer-overdue': 3 },
    note: 'Little oil passes now: what is found has gathered in a cartridge that is long overdue.',
    ...judgement,
  },
  {
    name: 'Always loaded, and nothing leaks',
    conditions: together(band('share-loaded', { from: percent(50) }), band('leak-down-released', { below: psiPerMinute(2) })),
    weights: { 'demand-too-high': 4, 'unloader-stuck': 2, 'governor-faulty': 1.5 },
    note: 'It is always loaded though nothing leaks: the work asks for it, or nothing lets it rest.',
    ...judgement,
  },
  {
    name: 'Right signal, not obeyed',
    conditions: together(answer('governor-signal', 'right'), answer('unloads-at-cut-out', 'keeps-pumping')),
    weights: { 'unloader-stuck': 4, 'governor-faulty': -6 },
    note: 'The governor gives its signal, and the unloader doesn’t obey.',
    ...judgement,
  },
  {
    name: 'Pressure lost before the dryer',
    conditions: together(band('head-to-tank-pressure', { from: psi(15) }), band('dryer-pressure-drop', { below: psi(5) })),
    weights: { 'discharge-line-carboned': 2, 'discharge-line-kinked-or-frozen': 2, 'dryer-restricted': -6 },
    note: 'The pressure is lost between head and dryer: the line holds the air back.',
    ...judgement,
  },
  {
    name: 'Pressure lost in the dryer',
    conditions: together(band('head-to-tank-pressure', { from: psi(15) }), band('dryer-pressure-drop', { from: psi(15) })),
    weights: { 'dryer-restricted': 4, 'discharge-line-carboned': -3, 'discharge-line-kinked-or-frozen': -3 },
    note: 'The pressure is lost in the dryer itself.',
    ...judgement,
  },
  {
    name: 'Hot head, starved of coolant',
    conditions: together(band('head-temperature', { from: kelvins(40) }), answer('coolant-lines-restricted', 'yes')),
    weights: { 'coolant-starved': 3 },
    note: 'The head is hot, and its coolant doesn’t get through.',
    ...judgement,
  },
  {
    name: 'Fibre gear used again',
    conditions: together(answer('drive-gear-kind', 'fibre'), answer('drive-gear-reused', 'yes')),
    weights: { 'drive-gear-failed': 5 },
    note: 'A fibre gear is never used again: its rim lets go of its hub.',
    ...judgement,
  },
  {
    name: 'Overfilled at the service',
    conditions: together(answer('work-oil-service', 'yes'), answer('engine-oil-level', 'well-over')),
    weights: { 'engine-oil-overfull': 2 },
    note: 'The oil was serviced just before, and now stands well over full.',
    ...judgement,
  },
  {
    name: 'Knock and a damaged feed',
    conditions: together(answer('noise', 'knock'), answer('feed-line-state', 'kinked')),
    weights: { 'oil-feed-restricted': 2 },
    note: 'It knocks, and its feed line is kinked: the bearings starve.',
    ...judgement,
  },
  {
    name: 'Vacuum behind a clean filter',
    conditions: together(band('intake-vacuum', { from: inH2O(25) }), answer('intake-filter-state', 'clean')),
    weights: { 'intake-hose-collapsed': 4, 'intake-filter-clogged': -6 },
    note: 'The filter is clean, so the vacuum is made after it: the hose closes.',
    ...judgement,
  },
];
