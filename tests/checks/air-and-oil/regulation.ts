import { buildUpLimit, requiredReservoirVolume } from '@/lib/air-and-oil/reservoir';
import { CHAMBER_VOLUMES, chamberVolume, earlyVehicleWarning, publishedLimit, reliefAccumulation, reservoirTestPressure, westernAustraliaBuildUp } from '@/lib/air-and-oil/limits';
import { ISO_8573_OIL, J300_AT_100_C, J300_CRANKING, J300_HIGH_SHEAR } from '@/lib/air-and-oil/limits';
import { fromSi, toSi, type Quantity, type UnitId } from '@/lib/units';
import { psig, stated, type Prover, type Row } from './rows';

/** The figures of a published limit in the unit in which its source writes it. */
function published(id: string): number[] {
  const found = publishedLimit(id);
  if (!found) throw new Error(`no limit ${id}`);
  return [found.least, found.most].filter((si) => si !== undefined).map((si) => fromSi<Quantity>(si, found.quantity, found.like));
}

const inPsi = (pa: number) => fromSi(pa, 'pressure', 'psi');

const LIMITS: Record<string, string[]> = {
  'REG-09': ['us-cut-in-bus'],
  'REG-10': ['us-low-air-warning'],
  'REG-11': ['us-supply-line-retention'],
  'REG-15': ['us-leak-released-single'],
  'REG-17': ['us-leak-applied-single'],
  'REG-18': ['us-leak-applied-combination'],
  'REG-19': ['us-build-up-dual'],
  'REG-22': ['ca-on-leak-applied-combination', 'ca-on-leak-applied-single'],
  'REG-23': ['us-ca-safety-valve'],
  'REG-27': ['eu-supply-coupling'],
  'REG-29': ['un-r13-fill-time', 'un-r13-fill-time-coupling'],
  'REG-30': ['us-cleaning-air'],
  'REG-31': ['us-low-air-warning-driver'],
  'REG-33': ['us-governor-section-5'],
  'REG-34': ['us-cut-out-section-2'],
  'REG-35': ['us-ca-low-air-warning'],
  'REG-37': ['us-nv-application-drop', 'us-tx-application-drop'],
  'REG-38': ['eu-reservoir-actuations'],
  'REG-39': ['eu-coupling-full-application'],
};

const OIL: Record<string, () => readonly [number[], UnitId, Quantity]> = {
  'OIL-01': () => [[J300_AT_100_C[40].least, J300_AT_100_C[40].below], 'cSt', 'kinematicViscosity'],
  'OIL-02': () => [[J300_AT_100_C[30].least, J300_AT_100_C[30].below], 'cSt', 'kinematicViscosity'],
  'OIL-04': () => [[J300_CRANKING['15W'].most, J300_CRANKING['10W'].most], 'mPas', 'dynamicViscosity'],
  'OIL-05': () => [[J300_HIGH_SHEAR['15W-40'].least, J300_HIGH_SHEAR['10W-40'].least, J300_HIGH_SHEAR['30'].least], 'mPas', 'dynamicViscosity'],
  'OIL-21': () => [[ISO_8573_OIL[1], ISO_8573_OIL[2], ISO_8573_OIL[3], ISO_8573_OIL[4]], 'mg/m3', 'concentration'],
};

const buildUp = (row: Row) => {
  if (row.inputs.startsWith('actual reservoir = required reservoir')) return buildUpLimit({ actualVolumeM3: 1, requiredVolumeM3: 1 });
  return buildUpLimit({
    actualVolumeM3: toSi(stated(row, /actual (\d+) in3/), 'volume', 'in3'),
    requiredVolumeM3: toSi(stated(row, /required (\d+) in3/), 'volume', 'in3'),
  });
};

const reservoirs = (row: Row) => {
  const [two, four] = [stated(row, /^(\d+) chambers type 20/), stated(row, /(\d+) type 30/)];
  for (const type of [20, 30] as const) {
    const [rated] = [stated(row, new RegExp(`type ${type} \\((\\d+) in3\\)`))];
    if (Math.abs(fromSi(CHAMBER_VOLUMES[type], 'volume', 'in3') - rated) > 1e-9) throw new Error(`type ${type} is rated ${rated} in3`);
  }
  return fromSi(requiredReservoirVolume(chamberVolume({ 20: two, 30: four })), 'volume', 'in3');
};

const cutOut = (row: Row) => psig(stated(row, /cut-out (\d+) psi/));

export const regulation: Prover[] = [
  { of: ({ id }) => id in LIMITS, prove: ({ id }) => (LIMITS[id] ?? []).flatMap(published) },
  // Two minutes, which the row writes in seconds.
  { of: ({ id }) => id === 'REG-21', prove: () => publishedLimit('ca-on-build-up')?.most ?? NaN },
  { of: ({ topic }) => topic.startsWith('FMVSS 121 S5.1.1 build-up'), prove: buildUp },
  { of: ({ topic }) => topic.startsWith('FMVSS 121 Table V'), prove: reservoirs },
  { of: ({ topic }) => topic.startsWith('FMVSS 121 S5.1.2.2'), prove: (row) => inPsi(reservoirTestPressure(cutOut(row))) },
  { of: ({ topic }) => topic.startsWith('49 CFR 393.51(c)'), prove: (row) => inPsi(earlyVehicleWarning(cutOut(row))) },
  { of: ({ topic }) => topic === 'Receiver relief accumulation', prove: (row) => inPsi(reliefAccumulation(psig(stated(row, /pressure (\d+) psi/)))) },
  { of: ({ topic }) => topic === 'Western Australia build-up', prove: (row) => inPsi(westernAustraliaBuildUp(cutOut(row))) },
  {
    of: ({ id }) => id in OIL,
    prove: ({ id }) => {
      const [values, unit, quantity] = OIL[id]?.() ?? [[], 'one', 'count'];
      return values.map((si) => fromSi<Quantity>(si, quantity, unit));
    },
  },
];
