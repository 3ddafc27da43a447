import { oilContent } from '@/lib/air-and-oil/carry-over';
import { clearanceWithoutDelivery, delivery, sweptVolume, volumetricEfficiency } from '@/lib/air-and-oil/delivery';
import { laminarGravityFlow } from '@/lib/air-and-oil/drain';
import { oilViscosity, viscosityLine } from '@/lib/air-and-oil/oil-viscosity';
import { fromSi, temperature, toSi } from '@/lib/units';
import { PSIA_14_7, absoluteOf, cfm, stated, type Prover, type Row } from './rows';

const cSt = (value: number) => toSi(value, 'kinematicViscosity', 'cSt');

function displaced(row: Row): number {
  const length = /mm/.test(row.inputs) ? 'mm' : 'in';
  const sweptVolumeM3 = sweptVolume({
    boreM: toSi(stated(row, /bore ([\d.]+)/), 'length', length),
    strokeM: toSi(stated(row, /stroke ([\d.]+)/), 'length', length),
    cylinders: stated(row, /(\d+) cylinders?/),
  });
  return delivery({ sweptVolumeM3, speedHz: toSi(stated(row, /(\d+) rpm/), 'rotationalSpeed', 'rpm'), efficiency: 1, otherLosses: 0 });
}

const clearance = (row: Row) => ({ inletPressurePa: PSIA_14_7, dischargePressurePa: absoluteOf(stated(row, /([\d.]+) psig/)), index: stated(row, /n=([\d.]+)/) });

/** Both points of a data sheet, with the zero of the Celsius scale that the row takes. */
function dataSheet(row: Row) {
  const zero = stated(row, /K=C\+([\d.]+)/);
  const at = (celsius: number) => temperature(celsius + zero);
  const line = viscosityLine(
    { temperatureK: at(40), viscosityM2PerS: cSt(stated(row, /([\d.]+) cSt at 40 C/)) },
    { temperatureK: at(100), viscosityM2PerS: cSt(stated(row, /([\d.]+) cSt at 100 C/)) },
  );
  return { line, at };
}

function viscosityAt(row: Row): number {
  const { line, at } = dataSheet(row);
  return fromSi(oilViscosity(line, at(stated({ ...row, inputs: row.topic }, /viscosity at (-?\d+) C/))), 'kinematicViscosity', 'cSt');
}

function drained(row: Row): number {
  const degrees = /vertical/.test(row.inputs) ? 90 : stated(row, /(\d+) deg/);
  const { flowM3PerS, laminar } = laminarGravityFlow({
    boreM: toSi(stated(row, /(\d+) mm/), 'length', 'mm'),
    viscosityM2PerS: cSt(stated(row, /(\d+) cSt/)),
    slopeRad: toSi(degrees, 'angle', 'deg'),
  });
  return laminar ? fromSi(flowM3PerS, 'flow', 'L/min') : NaN;
}

const content = (row: Row) =>
  fromSi(
    oilContent({
      caughtM3: toSi(stated(row, /(\d+) US fl oz/), 'volume', 'floz'),
      timeS: toSi(stated(row, /per (\d+) h/), 'duration', 'h'),
      shareLoaded: stated(row, /(\d+) % duty/) / 100,
      oilDensityKgPerM3: toSi(stated(row, /([\d.]+) g\/mL/), 'density', 'g/mL'),
      deliveryM3PerS: cfm(stated(row, /(\d+) cfm/)),
    }),
    'concentration',
    'mg/m3',
  );

export const deliveryAndOilRows: Prover[] = [
  { of: ({ topic }) => topic === 'Piston displacement', prove: (row) => fromSi(displaced(row), 'flow', 'cfm') },
  { of: ({ topic }) => topic === 'Piston displacement, SI', prove: (row) => fromSi(displaced(row), 'flow', 'L/min') },
  { of: ({ topic }) => topic === 'Clearance volumetric efficiency', prove: (row) => 100 * volumetricEfficiency({ ...clearance(row), clearance: stated(row, /c=([\d.]+)/) }) },
  { of: ({ topic }) => topic === 'Clearance at which delivery stops', prove: (row) => clearanceWithoutDelivery(clearance(row)) },
  { of: ({ topic }) => topic === 'ASTM D341 constant A', prove: (row) => dataSheet(row).line.a },
  { of: ({ topic }) => topic === 'ASTM D341 constant B', prove: (row) => dataSheet(row).line.b },
  { of: ({ topic }) => topic.startsWith('ASTM D341 viscosity at'), prove: viscosityAt },
  { of: ({ topic }) => topic === 'Gravity drain, full pipe, laminar', prove: drained },
  { of: ({ topic }) => topic === 'Oil concentration in delivered air', prove: content },
];
