import { dischargeTemperature } from '@/lib/air-and-oil/discharge-temperature';
import { adiabaticMeanEffectivePressure, compressionPower, interstagePressure, isothermalMeanEffectivePressure } from '@/lib/air-and-oil/mean-effective-pressure';
import { realDischargeTemperature } from '@/lib/air-and-oil/real-discharge-temperature';
import { absolutePressure, fromSi, toGauge, toSi } from '@/lib/units';
import { PSIA_14_7, absoluteOf, cfm, fahrenheit, stated, type Prover, type Row } from './rows';

const inFahrenheit = (kelvin: number) => fromSi(kelvin, 'temperature', 'degF');
const inPsi = (pa: number) => fromSi(pa, 'pressure', 'psi');

const compression = (row: Row) => ({
  inletTemperatureK: fahrenheit(stated(row, /inlet (\d+) F/)),
  inletPressurePa: PSIA_14_7,
  dischargePressurePa: absoluteOf(stated(row, /([\d.]+) psig/)),
});

const ends = (row: Row) => ({ inletPressurePa: PSIA_14_7, dischargePressurePa: absoluteOf(stated(row, /([\d.]+) psig/)) });

const FRICTION = 0.15;
const hpPerCfm = (meanEffectivePressurePa: number) => fromSi(compressionPower({ meanEffectivePressurePa, freeAirFlowM3PerS: cfm(1) }), 'power', 'hp');

export const compressionRows: Prover[] = [
  { of: ({ topic }) => topic === 'Isentropic discharge temperature, k=1.4', prove: (row) => inFahrenheit(dischargeTemperature({ ...compression(row), index: 1.4 })) },
  { of: ({ topic }) => topic === 'Polytropic discharge temperature', prove: (row) => inFahrenheit(dischargeTemperature({ ...compression(row), index: stated(row, /n=([\d.]+)/) })) },
  {
    of: ({ topic }) => topic === 'Isentropic temperature with intake vacuum',
    prove: (row) => {
      const vacuum = toSi(stated(row, /intake (\d+) inH2O/), 'vacuum', 'inH2O');
      return inFahrenheit(dischargeTemperature({ ...compression(row), inletPressurePa: absolutePressure(PSIA_14_7 - vacuum), index: 1.4 }));
    },
  },
  {
    of: ({ topic }) => topic.startsWith('Isentropic temperature, variable cp'),
    prove: (row) => inFahrenheit(realDischargeTemperature(compression(row))),
  },
  { of: ({ topic }) => topic === 'Single-stage adiabatic mean effective pressure', prove: (row) => inPsi(adiabaticMeanEffectivePressure(ends(row))) },
  { of: ({ topic }) => topic === 'Same plus 15 % friction', prove: (row) => inPsi(adiabaticMeanEffectivePressure({ ...ends(row), friction: FRICTION })) },
  { of: ({ topic }) => topic === 'Isothermal mean effective pressure', prove: (row) => inPsi(isothermalMeanEffectivePressure(ends(row))) },
  { of: ({ topic }) => topic === 'Isothermal power per cfm free air', prove: (row) => hpPerCfm(isothermalMeanEffectivePressure(ends(row))) },
  { of: ({ topic }) => topic === 'Two-stage adiabatic MEP', prove: (row) => inPsi(adiabaticMeanEffectivePressure({ ...ends(row), stages: 2 })) },
  { of: ({ topic }) => topic === 'Two-stage adiabatic power per cfm', prove: (row) => hpPerCfm(adiabaticMeanEffectivePressure({ ...ends(row), stages: 2 })) },
  { of: ({ topic }) => topic.startsWith('Intercooler gauge pressure'), prove: (row) => inPsi(toGauge(interstagePressure(ends(row)), PSIA_14_7)) },
  { of: ({ topic }) => topic === 'Theoretical adiabatic horsepower per 100 scfm', prove: (row) => 100 * hpPerCfm(adiabaticMeanEffectivePressure(ends(row))) },
];
