/** What the records of a case's unit can know of a sum's inputs, in SI. */
export interface BenchFacts {
  reservoirM3: number | null;
  requiredReservoirM3: number | null;
  displacementM3: number | null;
  boreM: number | null;
  strokeM: number | null;
  cylinders: number | null;
  driveRatio: number | null;
  lineSizeM: number | null;
}

type FactName = keyof BenchFacts;

const UNIT = 'from the record of the unit';
const MODEL = 'from its compressor model';

const FROM: Readonly<Record<FactName, string>> = {
  reservoirM3: UNIT,
  requiredReservoirM3: UNIT,
  displacementM3: MODEL,
  boreM: MODEL,
  strokeM: MODEL,
  cylinders: MODEL,
  driveRatio: MODEL,
  lineSizeM: MODEL,
};

/** Which fact an input is, by sum: inputs of one name mean different things in different sums. */
const INPUTS: Readonly<Record<string, Readonly<Record<string, FactName>>>> = {
  'measured-build-up': { actualVolume: 'reservoirM3', requiredVolume: 'requiredReservoirM3' },
  'build-up-limit': { actualVolume: 'reservoirM3', requiredVolume: 'requiredReservoirM3' },
  'build-up': { volume: 'reservoirM3' },
  'build-up-ratio': { volume: 'reservoirM3' },
  'leak-down': { volume: 'reservoirM3' },
  delivery: { bore: 'boreM', stroke: 'strokeM', cylinders: 'cylinders', driveRatio: 'driveRatio' },
  'break-in-bleed': { displacement: 'displacementM3', driveRatio: 'driveRatio' },
  'line-loss': { nominalBore: 'lineSizeM' },
  'head-pressure': { nominalBore: 'lineSizeM' },
};

/** Inputs of a sum that the records know, and where each comes from. */
export function knownInputs(sumId: string, facts: BenchFacts): Record<string, { si: number; from: string }> {
  return Object.fromEntries(
    Object.entries(INPUTS[sumId] ?? {}).flatMap(([inputId, fact]) => {
      const si = facts[fact];
      return si === null ? [] : [[inputId, { si, from: FROM[fact] }]];
    }),
  );
}
