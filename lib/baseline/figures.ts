import { toSi, type Quantity, type UnitId } from '@/lib/units';

/** What a healthy baseline is made of: what a case compares a unit with. */
export const FIGURE_IDS = ['build-up-time', 'head-temperature', 'leak-down-released', 'share-loaded', 'oil-carried'] as const;
export type FigureId = (typeof FIGURE_IDS)[number];

/** What the reading depends on, and is asked for with it. */
export type ConditionId = 'ambient' | 'engineSpeed' | 'loadedFor';

export const CONDITION_WORDS: Readonly<Record<ConditionId, string>> = {
  ambient: 'the outside temperature',
  engineSpeed: 'the engine speed',
  loadedFor: 'how long it ran loaded',
};

export interface Figure {
  readonly id: FigureId;
  /** In forms and requests; its error's field is `<field>Error`. */
  readonly field: string;
  readonly name: string;
  /** "the build-up time": in sentences. */
  readonly called: string;
  readonly quantity: Quantity;
  /** The unit that tells the size meant, as `unitFor` takes it. */
  readonly like: UnitId;
  /** Stands before the steps. */
  readonly caution: string;
  readonly steps: readonly string[];
  /** A reading without them can't be compared. */
  readonly conditions: readonly ConditionId[];
  /** Of the instrument as it is commonly used: common practice, no source. SI, as a difference. */
  readonly usualError: number;
  /** What can be read at all, SI, inclusive. */
  readonly range: { readonly min: number; readonly max: number };
}

/**
 * The five figures, in the order in which they are measured. Each is measured as the check of a case that compares
 * with it, or the two could not be compared.
 */
export const FIGURES: readonly Figure[] = [
  {
    id: 'build-up-time',
    field: 'buildUp',
    name: 'Build-up, 85 to 100 psi',
    called: 'the build-up time',
    quantity: 'duration',
    like: 's',
    caution: 'Chock the wheels: the vehicle can roll once the brakes have air. Let the exhaust out of the building and keep clear of belts and fan.',
    steps: [
      'Let the tanks down below 80 psi (550 kPa).',
      'Hold governed speed and time the gauge from 85 to 100 psi (586 to 689 kPa).',
      'Where you know the tank volumes, correct it as a case does: seconds x required / actual volume. Else enter the seconds as read.',
    ],
    conditions: [],
    usualError: 1,
    range: { min: 1, max: 3600 },
  },
  {
    id: 'head-temperature',
    field: 'headTemperature',
    name: 'Temperature at the head',
    called: 'the head temperature',
    quantity: 'temperature',
    like: 'degC',
    caution: 'Head and discharge fitting burn at a touch. Read them from a distance, and keep sleeves and leads clear of belts and fan.',
    steps: [
      'Run it loaded at governed speed for ten minutes.',
      'Read the discharge fitting at the head, on matt paint or tape, and note the place for the next time.',
      'Give the outside temperature, the engine speed and how long it ran loaded, below.',
    ],
    conditions: ['ambient', 'engineSpeed', 'loadedFor'],
    usualError: 5,
    range: { min: toSi(-40, 'temperature', 'degC'), max: toSi(400, 'temperature', 'degC') },
  },
  {
    id: 'leak-down-released',
    field: 'leakDown',
    name: 'Leak-down, brakes released',
    called: 'the leak-down',
    quantity: 'pressureRate',
    like: 'psi/min',
    caution: 'Released brakes let it roll. Chock the wheels on level ground, and nobody goes underneath.',
    steps: [
      'Full tanks, engine off; wait ten minutes so that the air has cooled.',
      'Brakes released: read the fall over two minutes and halve it.',
    ],
    conditions: [],
    usualError: toSi(0.5, 'pressureRate', 'psi/min'),
    range: { min: 0, max: toSi(100, 'pressureRate', 'psi/min') },
  },
  {
    id: 'share-loaded',
    field: 'shareLoaded',
    name: 'Share of time loaded',
    called: 'the share of time loaded',
    quantity: 'ratio',
    like: 'percent',
    caution: 'Never watch a gauge or a watch while you drive: another person reads and writes.',
    steps: [
      'Log the pressure, or count loaded and unloaded minutes, over half an hour of its usual work.',
      'Divide the loaded minutes by all minutes.',
    ],
    conditions: [],
    usualError: 0.05,
    range: { min: 0, max: 1 },
  },
  {
    id: 'oil-carried',
    field: 'oilCarried',
    name: 'Oil carried over',
    called: 'the oil carried over',
    quantity: 'oilRate',
    like: 'mL/h',
    caution: 'A purge is loud and throws oil mist and grit. Engine off while you hang or take the bottle; eyes and ears protected near it.',
    steps: [
      'Hang a clean catch bottle on the purge at one service and take it at the next.',
      'Weigh the oil without its water and divide by the engine hours (1 g is about 1.15 mL).',
    ],
    conditions: [],
    usualError: toSi(0.02, 'oilRate', 'mL/h'),
    range: { min: 0, max: toSi(1000, 'oilRate', 'mL/h') },
  },
];

/**
 * @throws RangeError when there is no such figure: a mistake of ours, since a rulebook's are checked when it is read
 * @example figureOf('share-loaded').quantity // 'ratio'
 */
export function figureOf(id: FigureId): Figure {
  const figure = FIGURES.find((one) => one.id === id);
  if (!figure) throw new RangeError(`there is no figure '${String(id)}'`);
  return figure;
}

/** Whether a text, of a rulebook say, is the id of a figure. */
export const isFigureId = (id: string): id is FigureId => FIGURE_IDS.some((one) => one === id);
