import { buildUpTime, freeAirDelivery, leastDelivery, unloadedTime, type Arrival } from '@/lib/air-and-oil/build-up';
import { correctedEndPressure, fallOfLeak, fallingPressureFactor, halvingLeak, leakDown, pressureAfterCooling } from '@/lib/air-and-oil/leak-down';
import { timeLoaded } from '@/lib/air-and-oil/time-loaded';
import { fromSi, toGauge } from '@/lib/units';
import { PSIA_14_7, absoluteOf, cfm, cubicFeet, fahrenheit, psig, stated, type Prover, type Row } from './rows';

const inCfm = (m3PerS: number) => fromSi(m3PerS, 'flow', 'cfm');
const inPsig = (pa: typeof PSIA_14_7) => fromSi(toGauge(pa, PSIA_14_7), 'pressure', 'psi');
const volumeM3 = (row: Row) => cubicFeet(stated(row, /V=([\d.]+) ft3/));
const seconds = (arrival: Arrival) => (arrival.kind === 'after' ? arrival.timeS : NaN);

const rise = (row: Row) => ({
  volumeM3: volumeM3(row),
  fromPressurePa: psig(stated(row, /(\d+)->/)),
  toPressurePa: psig(stated(row, /->(\d+)/)),
  atmospherePa: PSIA_14_7,
});

const delivered = (tank: (row: Row) => number, air: (row: Row) => number) => (row: Row) =>
  inCfm(freeAirDelivery({ ...rise(row), timeS: stated(row, /in (\d+) s/), tankTemperatureK: fahrenheit(tank(row)), airTemperatureK: fahrenheit(air(row)) }));

const cooling = (row: Row) => ({ startTemperatureK: fahrenheit(stated(row, /(?:Ti=|cools )(\d+) F/)), endTemperatureK: fahrenheit(stated(row, /(?:Tf=|-> )(\d+) F/)) });

export const tankRows: Prover[] = [
  { of: ({ topic }) => topic === 'Receiver pump-up time', prove: (row) => seconds(buildUpTime({ ...rise(row), deliveryM3PerS: cfm(stated(row, /Q=([\d.]+)/)), leakM3PerS: 0 })) },
  { of: ({ topic }) => topic === 'Free-air delivery from a pump-up test', prove: delivered(() => 70, () => 70) },
  {
    of: ({ topic }) => topic === 'Free-air delivery, temperature corrected',
    prove: delivered((row) => stated(row, /tank (\d+) F/), (row) => stated(row, /ambient (\d+) F/)),
  },
  { of: ({ topic }) => topic === 'Minimum delivery for a build-up limit', prove: (row) => inCfm(leastDelivery({ ...rise(row), timeS: stated(row, /in (\d+) s/) })) },
  {
    of: ({ topic }) => topic === 'Leak from pressure drop',
    prove: (row) =>
      inCfm(
        leakDown({
          volumeM3: volumeM3(row),
          startPressurePa: psig(120),
          endPressurePa: psig(120 - stated(row, /drop (\d+) psi/)),
          timeS: 60 * stated(row, /in (\d+) min/),
          startTemperatureK: fahrenheit(70),
          endTemperatureK: fahrenheit(70),
          atmospherePa: PSIA_14_7,
        }).meanLeakM3PerS,
      ),
  },
  {
    of: ({ topic }) => topic.startsWith('Leak from pressure drop x1.25'),
    prove: (row) =>
      inCfm(
        halvingLeak({
          volumeM3: volumeM3(row),
          startPressurePa: psig(stated(row, /P1=(\d+)/)),
          endPressurePa: psig(stated(row, /P2=(\d+)/)),
          timeS: 60 * stated(row, /T=(\d+) min/),
          atmospherePa: PSIA_14_7,
        }),
      ),
  },
  {
    of: ({ topic }) => topic.startsWith('Exact factor'),
    prove: (row) => fallingPressureFactor({ startPressurePa: absoluteOf(stated(row, /(\d+) ->/)), endPressurePa: absoluteOf(stated(row, /-> (\d+) psig/)) }),
  },
  {
    of: ({ topic }) => topic === 'Temperature-corrected end pressure',
    prove: (row) => inPsig(correctedEndPressure({ ...cooling(row), endPressurePa: absoluteOf(stated(row, /Pf=(\d+)/)) })),
  },
  {
    of: ({ topic }) => topic === 'Pressure fall by cooling alone',
    prove: (row) => inPsig(pressureAfterCooling({ ...cooling(row), startPressurePa: absoluteOf(stated(row, /(\d+) psig/)) })),
  },
  {
    of: ({ topic }) => topic === 'Leak share by load/unload timing',
    prove: (row) => 100 * timeLoaded({ loadedS: 60 * stated(row, /loaded ([\d.]+) min/), unloadedS: 60 * stated(row, /unloaded ([\d.]+) min/) }),
  },
  {
    of: ({ topic }) => topic === 'Loaded time per cycle',
    prove: (row) => seconds(buildUpTime({ ...rise(row), deliveryM3PerS: cfm(stated(row, /Q=([\d.]+)/)), leakM3PerS: cfm(stated(row, /leak ([\d.]+) cfm/)) })),
  },
  { of: ({ topic }) => topic === 'Unloaded time per cycle', prove: (row) => seconds(unloadedTime({ ...rise(row), demandM3PerS: cfm(stated(row, /leak ([\d.]+) cfm/)) })) },
  {
    of: ({ topic }) => topic === 'Pressure fall per minute for a leak',
    prove: (row) => fromSi(fallOfLeak({ leakM3PerS: cfm(stated(row, /leak ([\d.]+) cfm/)), volumeM3: volumeM3(row), atmospherePa: PSIA_14_7 }), 'pressureRate', 'psi/min'),
  },
];
