import { bayesUpdate } from '@/lib/reliability/bayes-update';
import { medianRank } from '@/lib/reliability/median-rank';
import { orGate } from '@/lib/reliability/or-gate';
import { poissonUpperBound } from '@/lib/reliability/poisson-upper-bound';
import { powerLaw } from '@/lib/reliability/power-law';
import { riskPriorityNumber } from '@/lib/reliability/risk-priority-number';
import { weibullLife, weibullReliability } from '@/lib/reliability/weibull';
import { QUANTITY_IDS, convert, unitsOf, type Quantity, type UnitId } from '@/lib/units';
import { unitSpelt } from '@/lib/units/spelling';
import { stated, type Prover, type Row } from './rows';

/** The first quantity that has both units, however they are spelt. */
function conversion({ id, inputs, unit }: Row): number {
  const [, value, written] = /^(-?[\d.]+) ([^(]+)/.exec(inputs) ?? [];
  for (const quantity of QUANTITY_IDS) {
    const [from, to] = [spelt(quantity, written ?? ''), spelt(quantity, unit)];
    if (from !== undefined && to !== undefined) return convert<Quantity>(Number(value), quantity, from, to);
  }
  throw new Error(`${id}: no quantity has ${written} and ${unit}`);
}

function spelt(quantity: Quantity, written: string): UnitId | undefined {
  // A row of pressures counts alike from zero, absolute or not.
  const absolute = quantity === 'absolutePressure' && unitSpelt(quantity, written) === undefined ? `${written.trim()} abs` : written;
  const unit = unitSpelt(quantity, absolute);
  return unit !== undefined && unitsOf(quantity).includes(unit) ? unit : undefined;
}

const failures = (row: Row) => powerLaw((/failures at ([\d,]+) h/.exec(row.inputs)?.[1] ?? '').split(',').map(Number), stated(row, /T=(\d+) h/));
const weibull = (row: Row) => ({ shape: stated(row, /beta=([\d.]+)/), scale: stated(row, /eta=(\d+) h/) });

export const conversionRows: Prover[] = [
  { of: ({ topic }) => topic === 'Unit conversion', prove: conversion },
  { of: ({ topic }) => topic === 'Fahrenheit to Celsius', prove: (row) => convert(stated(row, /^(-?[\d.]+) F/), 'temperature', 'degF', 'degC') },
];

export const reliabilityRows: Prover[] = [
  { of: ({ topic }) => topic.startsWith('Power-law process shape'), prove: (row) => failures(row).shape },
  { of: ({ topic }) => topic.startsWith('Same, unbiased shape'), prove: (row) => failures(row).unbiasedShape ?? NaN },
  { of: ({ topic }) => topic.startsWith('Same, intensity at T'), prove: (row) => failures(row).intensity },
  { of: ({ topic }) => topic.startsWith('Median rank'), prove: (row) => 100 * medianRank(stated(row, /i=(\d+)/), stated(row, /N=(\d+)/)) },
  { of: ({ topic }) => topic === 'Weibull reliability', prove: (row) => 100 * weibullReliability(weibull(row), stated(row, /t=(\d+) h/)) },
  { of: ({ topic }) => topic === 'Weibull B10 life', prove: (row) => weibullLife(weibull(row), 0.1) },
  { of: ({ topic }) => topic === 'Fault tree OR gate', prove: (row) => orGate([stated(row, /^([\d.]+),/), stated(row, /, ([\d.]+)/)]) },
  { of: ({ topic }) => topic === 'Risk priority number', prove: (row) => riskPriorityNumber({ severity: stated(row, /S=(\d+)/), occurrence: stated(row, /O=(\d+)/), detection: stated(row, /D=(\d+)/) }) },
  {
    of: ({ topic }) => topic === 'Bayes update of one cause',
    prove: (row) => bayesUpdate({ prior: stated(row, /prior ([\d.]+)/), ifSo: stated(row, /\|cause\)=([\d.]+)/), ifNot: stated(row, /\|other\)=([\d.]+)/) }),
  },
  {
    of: ({ topic }) => topic.startsWith('Poisson 90 % upper bound'),
    prove: (row) => poissonUpperBound({ count: stated(row, /^(\d+) failures/), exposure: stated(row, /in (\d+) h/), confidence: 0.9 }),
  },
];
