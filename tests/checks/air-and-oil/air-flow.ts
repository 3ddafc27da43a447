import { harrisLoss, harrisLossRatio } from '@/lib/air-and-oil/harris-loss';
import { darcyWeisbachLoss, massFlowOf } from '@/lib/air-and-oil/line-friction';
import { criticalFlowConstant, criticalPressureRatio, orificeFlow } from '@/lib/air-and-oil/orifice-flow';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { fromSi, toGauge, toSi } from '@/lib/units';
import { PSIA_14_7, absoluteOf, cfm, fahrenheit, feet, inches, stated, type Prover, type Row } from './rows';

const inPsi = (pa: number) => fromSi(pa, 'pressure', 'psi');
const lbPerFt3 = (value: number) => toSi(value, 'density', 'lb/ft3');

/** Density of free air that the printed table states, lb/ft3. */
const TABLE_DENSITY = 0.07494;

const orifice = (coefficient: (row: Row) => number) => (row: Row) => {
  const { freeAirFlowM3PerS } = orificeFlow({
    diameterM: inches(stated(row, /([\d./]+) in/)),
    upstreamPressurePa: absoluteOf(stated(row, /([\d.]+) psig/)),
    downstreamPressurePa: PSIA_14_7,
    upstreamTemperatureK: fahrenheit(70),
    dischargeCoefficient: coefficient(row),
    freeAirDensityKgPerM3: lbPerFt3(TABLE_DENSITY),
  });
  return fromSi(freeAirFlowM3PerS, 'flow', 'cfm');
};

const line = (row: Row) => ({
  lengthM: feet(stated(row, /L=([\d.]+) ft/)),
  boreM: inches(stated(row, /ID ([\d.]+)/)),
});

const harris = (row: Row) =>
  inPsi(harrisLoss({ ...line(row), freeAirFlowM3PerS: cfm(stated(row, /Q=([\d.]+) cfm/)), linePressurePa: absoluteOf(stated(row, /P=([\d.]+)\+14\.7 psia/)) }));

const darcy = (row: Row) =>
  inPsi(
    darcyWeisbachLoss({
      ...line(row),
      massFlowKgPerS: massFlowOf(cfm(stated(row, /Q=([\d.]+) cfm/)), lbPerFt3(stated(row, /\(([\d.]+) lb\/ft3\)/))),
      airTemperatureK: fahrenheit(stated(row, /(\d+) F;/)),
      linePressurePa: absoluteOf(stated(row, /([\d.]+) psig/)),
      roughnessM: stated(row, /roughness ([\d.]+) um/) * 1e-6,
    }),
  );

/** The constant that the loss of one foot of one inch at 1 cfm and 1 psia comes from. */
const harrisConstant = () => 1 / inPsi(harrisLoss({ lengthM: feet(1), boreM: inches(1), freeAirFlowM3PerS: cfm(1), linePressurePa: absoluteOf(1 - 14.7) }));

/** In lb, s, in, lbf and degrees Rankine, from R in ft lbf / (lb R). */
function fliegner(row: Row): number {
  const gasConstant = stated(row, /R=([\d.]+)/) * 0.3048 * STANDARD_GRAVITY * 1.8;
  return criticalFlowConstant(stated(row, /k=([\d.]+)/), gasConstant) * STANDARD_GRAVITY * Math.sqrt(1.8);
}

export const airFlowRows: Prover[] = [
  { of: ({ topic }) => topic === 'Air through orifice, C=1.0', prove: orifice(() => 1) },
  { of: ({ topic }) => topic === 'Sharp-edged orifice (x0.65)', prove: orifice((row) => stated(row, /C=([\d.]+)/)) },
  { of: ({ topic }) => topic === 'Subcritical orifice (adiabatic formula)', prove: orifice(() => 1) },
  { of: ({ topic }) => topic.startsWith('Critical pressure ratio'), prove: (row) => criticalPressureRatio(stated(row, /k=([\d.]+)/)) },
  {
    of: ({ topic }) => /^Upstream \d+ psig chokes/.test(topic),
    prove: (row) => inPsi(toGauge((criticalPressureRatio() * absoluteOf(stated(row, /([\d.]+) psig upstream/))) as typeof PSIA_14_7, PSIA_14_7)),
  },
  { of: ({ topic }) => topic.startsWith('Fliegner-type'), prove: fliegner },
  { of: ({ topic }) => topic === 'Harris: equivalence of the two forms', prove: harrisConstant },
  { of: ({ topic }) => topic === 'Harris pressure drop', prove: harris },
  {
    of: ({ topic }) => topic === 'Harris: effect of bore loss',
    prove: (row) => harrisLossRatio({ nominalBoreM: stated(row, /bore ([\d.]+)/), boreM: stated(row, /-> ([\d.]+) in/) }),
  },
  { of: ({ topic }) => topic.startsWith('Darcy-Weisbach drop'), prove: darcy },
];
