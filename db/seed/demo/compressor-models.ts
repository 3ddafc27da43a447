import type { Term } from '@/lib/schemas/terms';
import { seededId } from '../seeded-id';

/** A compressor model as somebody typed it in. All of them are inventions, names and figures. */
export interface DemoModel {
  id: string;
  name: string;
  displacement: string;
  bore: string;
  stroke: string;
  cylinders: number;
  driveRatio: string;
  cooling: Term<'cooling'>;
  unloading: Term<'unloading'>;
  intakeType: Term<'intakeType'>;
  drainOpening: Term<'drainOpening'>;
  oilFeedPlace: Term<'oilFeedPlace'>;
  driveGear: Term<'driveGear'>;
  portBore: string;
  lineSize: string;
  note: string | null;
}

const model = (name: string, rest: Omit<DemoModel, 'id' | 'name' | 'note'> & { note?: string }): DemoModel => ({
  id: seededId(`model: ${name}`),
  name,
  note: null,
  ...rest,
});

/** Planted: the one with the small drain hole. */
export const SMALL_HOLE = 'Karda 15';

export const MODELS: DemoModel[] = [
  model(SMALL_HOLE, {
    displacement: '15.0', bore: '3.35', stroke: '1.70', cylinders: 1, driveRatio: '1.1', cooling: 'coolant', unloading: 'head-unloader',
    intakeType: 'boosted', drainOpening: 'small-hole', oilFeedPlace: 'side', driveGear: 'steel', portBore: '0.60', lineSize: '5/8',
    note: 'Oil goes back through one hole in the flange, three eighths wide.',
  }),
  model('Karda 19', {
    displacement: '19.0', bore: '3.55', stroke: '1.92', cylinders: 1, driveRatio: '1.1', cooling: 'coolant', unloading: 'head-unloader',
    intakeType: 'naturally-aspirated', drainOpening: 'large-cavity', oilFeedPlace: 'side', driveGear: 'steel', portBore: '0.60', lineSize: '5/8',
  }),
  model('Ostrel 18', {
    displacement: '18.2', bore: '3.54', stroke: '1.85', cylinders: 1, driveRatio: '1', cooling: 'coolant', unloading: 'inlet-unloader',
    intakeType: 'boosted', drainOpening: 'large-cavity', oilFeedPlace: 'rear', driveGear: 'steel', portBore: '0.62', lineSize: '5/8',
  }),
  model('Ostrel 31 twin', {
    displacement: '31.5', bore: '3.54', stroke: '1.60', cylinders: 2, driveRatio: '1', cooling: 'coolant', unloading: 'inlet-unloader',
    intakeType: 'boosted', drainOpening: 'large-cavity', oilFeedPlace: 'rear', driveGear: 'steel', portBore: '0.75', lineSize: '3/4',
    note: 'For units that unload by air.',
  }),
  model('Lumo 12', {
    displacement: '12.3', bore: '2.95', stroke: '1.80', cylinders: 1, driveRatio: '1.2', cooling: 'air', unloading: 'head-unloader',
    intakeType: 'naturally-aspirated', drainOpening: 'large-cavity', oilFeedPlace: 'side', driveGear: 'fibre', portBore: '0.50', lineSize: '1/2',
  }),
  model('Vessen 16', {
    displacement: '16.1', bore: '3.35', stroke: '1.83', cylinders: 1, driveRatio: '1', cooling: 'coolant', unloading: 'discharge-unloader',
    intakeType: 'naturally-aspirated', drainOpening: 'large-cavity', oilFeedPlace: 'through-drive', driveGear: 'steel', portBore: '0.60', lineSize: '5/8',
  }),
  model('Vessen 22', {
    displacement: '22.0', bore: '3.70', stroke: '2.05', cylinders: 1, driveRatio: '1', cooling: 'coolant', unloading: 'discharge-unloader',
    intakeType: 'boosted', drainOpening: 'large-cavity', oilFeedPlace: 'through-drive', driveGear: 'fibre', portBore: '0.65', lineSize: '5/8',
  }),
  model('Maddern 27 twin', {
    displacement: '27.1', bore: '3.15', stroke: '1.74', cylinders: 2, driveRatio: '1.15', cooling: 'coolant', unloading: 'clutch',
    intakeType: 'naturally-aspirated', drainOpening: 'large-cavity', oilFeedPlace: 'rear', driveGear: 'steel', portBore: '0.70', lineSize: '3/4',
  }),
];

export const modelNamed = (name: string): DemoModel => {
  const found = MODELS.find((each) => each.name === name);
  if (!found) throw new Error(`no model is called ${name}`);
  return found;
};
