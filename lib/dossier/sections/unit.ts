import { dayText } from '@/lib/schemas/day-text';
import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { termLabel } from '@/lib/schemas/terms';
import { facts, heading, text } from '../blocks';
import { measured } from '../measured';
import type { Writer } from '../writer';

export interface UnitPart {
  unit: {
    fleetNumber: string;
    vehicleKind: string;
    vocation: string | null;
    builtOn: string | null;
    engineFamily: string | null;
    reservoirM3: number | null;
    dryerCartridgeChangedOn: string | null;
  };
  siteName: string;
  odometerM: number | null;
  engineS: number | null;
  /** The compressor that was on it when the case was opened; null: not in the record. */
  model: {
    name: string;
    displacementM3: number | null;
    boreM: number | null;
    strokeM: number | null;
    cylinders: number | null;
    driveRatio: number | null;
    cooling: string | null;
    unloading: string | null;
    intakeType: string | null;
    drainOpening: string | null;
    oilFeedPlace: string | null;
    driveGear: string | null;
    portBoreM: number | null;
    lineSizeM: number | null;
  } | null;
}

/** @param part.unit.fleetNumber withheld where the maker wants it so */
export function unitSection({ unit, siteName, odometerM, engineS, model }: UnitPart, { units }: Writer, { withoutFleet }: { withoutFleet: boolean }): DossierBlock[] {
  return [
    ...facts(
      ['Fleet number', withoutFleet ? 'withheld' : unit.fleetNumber],
      ['Kind of vehicle', termLabel('vehicleKind', unit.vehicleKind)],
      ['Work it does', termLabel('vocation', unit.vocation)],
      ['Built', unit.builtOn && dayText(unit.builtOn)],
      ['Engine family', unit.engineFamily],
      ['Site', withoutFleet ? null : siteName],
      ['Odometer when the case was opened', measured(odometerM, 'distance', units)],
      ['Engine hours when the case was opened', measured(engineS, 'engineHours', units)],
      ['All reservoirs', measured(unit.reservoirM3, 'volume', units, 'in3')],
      ['Dryer cartridge last changed by itself', unit.dryerCartridgeChangedOn && dayText(unit.dryerCartridgeChangedOn)],
    ),
    ...heading('Compressor model'),
    ...(model ? modelFacts(model, units) : text('Which compressor was on the unit is not in the record.')),
  ];
}

const modelFacts = (model: NonNullable<UnitPart['model']>, units: Writer['units']): DossierBlock[] =>
  facts(
    ['Model', model.name],
    ['Displacement', measured(model.displacementM3, 'displacement', units)],
    ['Bore', measured(model.boreM, 'length', units, 'in')],
    ['Stroke', measured(model.strokeM, 'length', units, 'in')],
    ['Cylinders', model.cylinders?.toString()],
    ['Turns for one of the engine', measured(model.driveRatio, 'ratio', units, 'one')],
    ['Head is cooled by', termLabel('cooling', model.cooling)],
    ['Unloads by', termLabel('unloading', model.unloading)],
    ['Intake', termLabel('intakeType', model.intakeType)],
    ['Drain opening', termLabel('drainOpening', model.drainOpening)],
    ['Oil feed at', termLabel('oilFeedPlace', model.oilFeedPlace)],
    ['Drive gear', termLabel('driveGear', model.driveGear)],
    ['Discharge port', measured(model.portBoreM, 'length', units, 'in')],
    ['Discharge line as the model has it', measured(model.lineSizeM, 'length', units, 'in')],
  );
