import { gaugePressure, temperature, toAbsolute, toSi, type GaugePressure } from '@/lib/units';
import { REFERENCE_INDEX, dischargeTemperature as sum, type Compression } from '../discharge-temperature';
import { frac, ln, minus, number, pow, symbol, times } from '../formula/expression';
import { requireWithin } from '../out-of-range';
import { polytropicIndex } from '../polytropic-index';
import { realDischargeTemperature } from '../real-discharge-temperature';
import { standardAtmosphere } from '../standard-atmosphere';
import { altitude, index, inletTemperature } from './inputs';
import { defineSum, input, output } from './sum';

const BURNS = 'The head and the discharge line burn skin. Put the probe on with the engine off, and read it from where nothing turns.';

const ends = {
  inletTemperature: { ...inletTemperature, optional: false },
  intakePressure: input('Gauge pressure at the intake', 'p_in', 'pressure', 'psi', {
    optional: true,
    byDefault: 0,
    least: -5,
    most: 40,
    off: 0.1,
    note: 'Below zero for suction, above zero where the intake is boosted.',
  }),
  dischargePressure: input('Gauge pressure at the head', 'p_out', 'pressure', 'psi', { byDefault: 120, least: 0, most: 400, off: 3 }),
  altitude,
};

const absoluteTerms = {
  inletAbsolute: output('Pressure at the intake, absolute', 'p_1', 'absolutePressure', 'psia'),
  dischargeAbsolute: output('Pressure at the head, absolute', 'p_2', 'absolutePressure', 'psia'),
};

/** The compression that the inputs describe. */
function compressionOf(given: { inletTemperature: number; intakePressure: number; dischargePressure: number; altitude: number }): Compression {
  requireWithin('dischargePressure', 'pressure', given.dischargePressure, { least: given.intakePressure });
  const atmosphere = standardAtmosphere(given.altitude);
  const absolute = (gauge: GaugePressure) => toAbsolute(gauge, atmosphere);
  return {
    inletTemperatureK: temperature(given.inletTemperature),
    inletPressurePa: absolute(gaugePressure(given.intakePressure)),
    dischargePressurePa: absolute(gaugePressure(given.dischargePressure)),
  };
}

/** 5 psi: below it temperatures tell no index. */
const LEAST_RISE = toSi(5, 'pressure', 'psi');

const ratio = frac(symbol('dischargeAbsolute'), symbol('inletAbsolute'));

const CANNOT_TELL = [
  'Whether the head is sound: compare with what this unit or its model reads when it is healthy. No published limit was found for compressors on vehicles.',
  'The temperature inside the head from that of the line: air cools on its way to the probe.',
];

export const dischargeTemperature = defineSum({
  id: 'discharge-temperature',
  name: 'Discharge temperature',
  purpose: 'See how hot compression alone makes the air, to put beside what you measured.',
  cautions: [BURNS],
  inputs: { ...ends, index: index(1.35) },
  outputs: {
    temperature: output('Temperature at this index', 'T_2', 'temperature', 'degF'),
    lowerReference: output('Reference, n = 1.3', 'T_1.3', 'temperature', 'degF'),
    upperReference: output('Reference, n = 1.4', 'T_1.4', 'temperature', 'degF'),
    realAir: output('Real air, no heat lost', 'T_s', 'temperature', 'degF'),
  },
  main: 'temperature',
  expression: times(symbol('inletTemperature'), pow(ratio, frac(minus(symbol('index'), number(1)), symbol('index')))),
  terms: absoluteTerms,
  assumptions: ['The air is compressed once, from the state at the intake.', 'Pressures and temperatures count from absolute zero.'],
  cannotTell: ['A cooled head reads well below the reference, and air that a leaking valve lets be compressed again can pass it: it is no bound.', ...CANNOT_TELL],
  source: 'Polytropic compression of a gas, any text on thermodynamics; real air by the specific heats of the NIST Chemistry WebBook.',
  compute: (given) => {
    const compression = compressionOf(given);
    return {
      values: {
        temperature: sum({ ...compression, index: given.index }),
        lowerReference: sum({ ...compression, index: REFERENCE_INDEX.least }),
        upperReference: sum({ ...compression, index: REFERENCE_INDEX.most }),
        realAir: realDischargeTemperature(compression),
        inletAbsolute: compression.inletPressurePa,
        dischargeAbsolute: compression.dischargePressurePa,
      },
    };
  },
});

export const compressionIndex = defineSum({
  id: 'compression-index',
  name: 'Index of compression',
  purpose: 'Turn the temperatures you measured into an index, so that runs at different pressures can be compared.',
  cautions: [BURNS],
  inputs: {
    ...ends,
    dischargePressure: { ...ends.dischargePressure, least: LEAST_RISE },
    dischargeTemperature: input('Air at the head', 'T_2', 'temperature', 'degF', { byDefault: 380, least: -60, most: 1000, off: 9 }),
  },
  outputs: {
    index: output('Index of compression', 'n', 'ratio', 'one'),
    lowerReference: output('Reference, n = 1.3', 'T_1.3', 'temperature', 'degF'),
    upperReference: output('Reference, n = 1.4', 'T_1.4', 'temperature', 'degF'),
  },
  main: 'index',
  expression: frac(number(1), minus(number(1), frac(ln(frac(symbol('dischargeTemperature'), symbol('inletTemperature'))), ln(ratio)))),
  terms: absoluteTerms,
  assumptions: ['Both temperatures are of the air, and both pressures are read at the same time, in a steady run.'],
  cannotTell: CANNOT_TELL,
  source: 'Polytropic compression of a gas, any text on thermodynamics.',
  compute: (given) => {
    // Nothing can be told from a compression of a few psi.
    requireWithin('dischargePressure', 'pressure', given.dischargePressure, { least: given.intakePressure + LEAST_RISE });
    requireWithin('dischargeTemperature', 'temperature', given.dischargeTemperature, { least: given.inletTemperature });
    const compression = compressionOf(given);
    const hottest = compression.inletTemperatureK * (compression.dischargePressurePa / compression.inletPressurePa);
    if (given.dischargeTemperature >= hottest * 0.999) {
      return { kind: 'never', because: 'No index gives so much heat from so little pressure: the head is heated by more than one compression, or a reading is wrong.' };
    }
    return {
      values: {
        index: polytropicIndex({ ...compression, dischargeTemperatureK: temperature(given.dischargeTemperature) }),
        lowerReference: sum({ ...compression, index: REFERENCE_INDEX.least }),
        upperReference: sum({ ...compression, index: REFERENCE_INDEX.most }),
        inletAbsolute: compression.inletPressurePa,
        dischargeAbsolute: compression.dischargePressurePa,
      },
    };
  },
});
