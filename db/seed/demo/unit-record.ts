import type { FitRow } from '@/db/queries/fit';
import type { ReadingRow } from '@/db/queries/unit-reading';
import type { RecordFacts } from '@/lib/diagnose';
import { newId } from '@/lib/ids';
import { recordFactsOf } from '@/lib/services/unit/record-facts';
import { readMeasures } from '@/lib/services/units-of-measure';
import { UNIT_MEASURES } from '@/lib/schemas/measures';
import { audited } from './audit-row';
import type { World } from './world';
import { modelNamed, type DemoModel } from './compressor-models';
import type { Mileage, Readings } from './mileage';
import { DEMO_MANAGER, ORGANISATION, WRITING, techniciansAt } from './organisation';
import { writtenDown, type Practice } from './practice';
import type { Random } from './random';
import type { Row } from './rows';
import type { Vehicle } from './vehicles';
import { FIT_NOTES } from './words';

const organisationId = ORGANISATION.id;
const DAYS_BETWEEN_READINGS = 30;
/** Minutes past midnight at which what happened on a day is written down: readings first, then fits. */
const READ_AT = 6 * 60 + 50;
const FITTED_AT = 15 * 60 + 40;
const TYPED_IN_AT = 6 * 60 + 10;

/** A compressor on a unit, as it is and as the record has it. */
export interface Fitted {
  id: string;
  day: number;
  model: DemoModel;
  practice: Practice;
  row: Row<'fit'>;
}

/** What is written down about a unit, readings and fits, as the services write it. */
export class UnitRecord {
  private readonly fits: Fitted[] = [];
  private readonly readings: Row<'unitReading'>[] = [];
  private readonly row: Row<'unit'>;
  private readonly readingDay: number;

  constructor(
    private readonly world: World,
    private readonly vehicle: Vehicle,
    private readonly mileage: Mileage,
    private readonly random: Random,
    cartridgeDay: number | null,
  ) {
    const { reservoirs, requiredReservoirs, site, id, fleetNumber, kind, vocation, builtDay, engineFamily, reservoirCount, note, firstDay } = vehicle;
    const { columns, asTyped } = readMeasures(WRITING, UNIT_MEASURES, { reservoirs, requiredReservoirs });
    const knowsCartridge = cartridgeDay !== null && random.chance(0.85);
    const facts = {
      fleetNumber,
      siteId: site.id,
      vehicleKind: kind,
      country: ORGANISATION.country,
      vocation,
      builtOn: world.calendar.date(builtDay),
      engineFamily,
      ...columns,
      reservoirCount,
      dryerCartridgeChangedOn: knowsCartridge ? world.calendar.date(cartridgeDay) : null,
      asTyped,
      note,
    };
    const createdAt = this.at(firstDay, TYPED_IN_AT);
    this.row = { ...facts, organisationId, id, createdAt, createdBy: DEMO_MANAGER.id };
    this.audit(createdAt, DEMO_MANAGER.id, 'create.unit', 'unit', id, facts);
    this.readingDay = random.whole(0, DAYS_BETWEEN_READINGS - 1);
    this.noteReading(firstDay, createdAt, 'unit', 'create.unit', DEMO_MANAGER.id);
  }

  /** Readings are taken about monthly, and when an instrument is replaced. */
  dayPasses(day: number): void {
    if (day % DAYS_BETWEEN_READINGS !== this.readingDay && !this.mileage.isOdometerNew(day)) return;
    if (day > this.vehicle.firstDay) this.noteReading(day, this.at(day, READ_AT), 'unit', 'add.unit-reading', this.somebody(day));
  }

  fit(day: number, modelName: string, practice: Practice, random: Random): Fitted {
    const model = modelNamed(modelName);
    const { date } = this.world.calendar;
    const isOld = day < this.vehicle.firstDay;
    const by = isOld ? DEMO_MANAGER.id : this.somebody(day);
    const at = isOld ? this.at(this.vehicle.firstDay, TYPED_IN_AT + 5) : this.at(day, FITTED_AT);
    const { odometerM, engineS, asTyped } = this.noteReading(day, at, 'fit', 'create.fit', by);
    const columns = {
      modelId: model.id,
      ...writtenDown(practice, random),
      installedOn: date(day),
      installedOdometerM: odometerM,
      installedEngineS: engineS,
      removedOn: null,
      removedOdometerM: null,
      removedEngineS: null,
      whyOut: null,
      asTyped: { installedOdometerM: asTyped.odometerM, installedEngineS: asTyped.engineS },
      note: !isOld && random.chance(0.08) ? random.pick(FIT_NOTES) : null,
    };
    const id = this.newId(at);
    const fitted = { id, day, model, practice, row: { ...columns, organisationId, id, unitId: this.vehicle.id, createdAt: at, createdBy: by } };
    this.fits.push(fitted);
    this.audit(at, by, 'create.fit', 'fit', id, { unitId: this.vehicle.id, ...columns });
    return fitted;
  }

  /** It comes out at the day and readings at which the next one goes on. */
  takeOut(fitted: Fitted, day: number, whyOut: string): void {
    const { odometerM, engineS, asTyped } = this.mileage.readings(day);
    const change = {
      removedOn: this.world.calendar.date(day),
      removedOdometerM: odometerM,
      removedEngineS: engineS,
      whyOut,
      asTyped: { ...fitted.row.asTyped, removedOdometerM: asTyped.odometerM, removedEngineS: asTyped.engineS },
    };
    const at = this.at(day, FITTED_AT);
    Object.assign(fitted.row, change, { updatedAt: at });
    this.audit(at, this.somebody(day), 'create.fit', 'fit', fitted.id, change);
  }

  cartridgeChanged(day: number): void {
    // A change by itself isn't always written down with the unit.
    if (this.random.chance(0.12)) return;
    const at = this.at(day, READ_AT + 20);
    const dryerCartridgeChangedOn = this.world.calendar.date(day);
    Object.assign(this.row, { dryerCartridgeChangedOn, updatedAt: at });
    this.audit(at, this.somebody(day), 'change.unit', 'unit', this.vehicle.id, { dryerCartridgeChangedOn });
  }

  /** What the record knows on a day, and what a complete one would; `isReadToday`: somebody typed the odometer in. */
  factsOn(day: number, isReadToday: boolean): { recorded: RecordFacts; complete: RecordFacts } {
    const on = this.world.calendar.date(day);
    const today = readingRow(this.readingOn(day, this.mileage.readings(day), 'case'));
    const before = this.readings.map(readingRow);
    const { vocation = null, builtOn = null, dryerCartridgeChangedOn = null } = this.row;
    const known = { unit: { vocation, builtOn, dryerCartridgeChangedOn }, model: this.fits.at(-1)?.model };
    const fits = this.fits.map(({ row, model }) => fitRow(row, model.name));
    const inFull = this.fits.map(({ row, model, practice }) => fitRow({ ...row, ...practice }, model.name));
    const byDay = (rows: ReadingRow[]) => rows.toSorted((a, b) => (a.readOn < b.readOn ? -1 : 1));
    return {
      recorded: recordFactsOf({ ...known, fits, readings: byDay(isReadToday ? [...before, today] : before) }, on),
      complete: recordFactsOf({ ...known, fits: inFull, readings: byDay([...before, today]) }, on),
    };
  }

  /** Every compressor that was on it, in order. */
  get compressors(): readonly Fitted[] {
    return this.fits;
  }

  finish(): void {
    this.world.rows.unit.push(this.row);
    this.world.rows.unitReading.push(...this.readings);
    this.world.rows.fit.push(...this.fits.map(({ row }) => row));
  }

  private noteReading(day: number, at: Date, source: 'unit' | 'fit', action: string, by: string): Readings {
    const readings = this.mileage.readings(day);
    const row = this.readingOn(day, readings, source);
    const id = this.newId(at);
    this.readings.push({ ...row, organisationId, id, createdBy: by, createdAt: at });
    this.audit(at, by, action, 'unit-reading', id, row);
    return readings;
  }

  private readingOn(day: number, readings: Readings, source: 'unit' | 'fit' | 'case') {
    const { odometerM, engineS, asTyped } = readings;
    const odometerReplaced = source === 'unit' && this.mileage.isOdometerNew(day);
    return {
      odometerM,
      engineS,
      asTyped,
      unitId: this.vehicle.id,
      readOn: this.world.calendar.date(day),
      odometerReplaced,
      engineHoursReplaced: false,
      source,
      note: odometerReplaced ? 'New dash: the old one stopped counting.' : null,
    };
  }

  private somebody(day: number): string {
    const [first] = this.random.shuffled(techniciansAt(this.vehicle.site.key, Math.max(0, day)));
    return (first ?? DEMO_MANAGER).id;
  }

  private at(day: number, minute: number): Date {
    return this.world.calendar.at(day, minute, this.vehicle.site.timeZone);
  }

  private audit(at: Date, personId: string, action: string, entity: string, entityId: string, changed: Record<string, unknown>): void {
    this.world.rows.audit.push(audited(this.random, at, personId, { action, entity, entityId, changed: { ...changed } }));
  }

  private newId(at: Date): string {
    return newId(at.getTime(), this.random.bytes(16));
  }
}

/** A fit as the queries select it, with null for what isn't known. */
function fitRow(row: Row<'fit'>, modelName: string): FitRow {
  return {
    ...EMPTY_FIT,
    ...row,
    modelName,
    asTyped: row.asTyped ?? {},
    createdAt: row.createdAt ?? new Date(0),
  };
}

const EMPTY_FIT = {
  installedOdometerM: null,
  installedEngineS: null,
  removedOn: null,
  removedOdometerM: null,
  removedEngineS: null,
  whyOut: null,
  sealant: null,
  dischargeLine: null,
  governor: null,
  feedLine: null,
  intakeHose: null,
  dryerCartridge: null,
  driveGear: null,
  systemCleaned: null,
  breakInRun: null,
  note: null,
  updatedAt: null,
};

type Reading = Omit<Row<'unitReading'>, 'id' | 'organisationId'>;

const readingRow = (row: Reading): ReadingRow => ({
  id: '',
  readOn: row.readOn,
  odometerM: row.odometerM ?? null,
  engineS: row.engineS ?? null,
  odometerReplaced: row.odometerReplaced ?? false,
  engineHoursReplaced: row.engineHoursReplaced ?? false,
  asTyped: row.asTyped ?? {},
  source: row.source,
  note: row.note ?? null,
  by: null,
});
