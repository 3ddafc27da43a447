import { BREAK_IN_MEASURES, INSTALLED_MEASURES, MODEL_MEASURES, READING_MEASURES, REMOVED_MEASURES, UNIT_MEASURES, type MeasureField } from '@/lib/schemas/measures';
import type { TermList } from '@/lib/schemas/terms';

export const IMPORT_KINDS = ['units', 'models', 'fits', 'cases'] as const;
export type ImportKind = (typeof IMPORT_KINDS)[number];

/** What is chosen of the organisation's own: sites, and the causes and complaints of its rulebook. */
export type ChoiceList = 'site' | 'cause' | 'complaint' | 'proof' | 'sureness';

interface Common {
  id: string;
  label: string;
  /** A row without it can't be made. */
  needed?: boolean;
  /** What a head of a column may call it, besides its label: letters and digits alone, in lower case. */
  called?: readonly string[];
}

export type Field = Common &
  (
    | { kind: 'text'; most: number }
    | { kind: 'country' }
    | { kind: 'count'; most: number }
    | { kind: 'day' }
    | { kind: 'term'; list: TermList; oneForAll?: boolean }
    | { kind: 'choice'; list: ChoiceList; oneForAll?: boolean }
    | { kind: 'choices'; list: ChoiceList; oneForAll?: boolean }
    | { kind: 'measure'; measure: MeasureField }
  );

export type MeasureOf = Extract<Field, { kind: 'measure' }>;

/** How the words of a measure are made: its name, and what else it is called. */
const MEASURES: Readonly<Record<string, { label: string; called?: readonly string[] }>> = {
  reservoirs: { label: 'Reservoirs, volume', called: ['reservoirvolume', 'reservoirs', 'tankvolume', 'airtanks'] },
  requiredReservoirs: { label: 'Reservoirs, volume asked for', called: ['requiredreservoirs', 'requiredvolume'] },
  displacement: { label: 'Displacement', called: ['swept', 'sweptvolume'] },
  bore: { label: 'Bore' },
  stroke: { label: 'Stroke' },
  driveRatio: { label: 'Drive ratio', called: ['ratio'] },
  portBore: { label: 'Discharge port, bore', called: ['portbore', 'dischargeport', 'port'] },
  lineSize: { label: 'Discharge line, bore', called: ['linesize', 'linebore'] },
  breakInPressure: { label: 'Break-in pressure' },
  breakInLeast: { label: 'Break-in, least time' },
  breakInMost: { label: 'Break-in, longest time' },
  odometer: { label: 'Odometer', called: ['mileage', 'miles', 'km', 'kilometres', 'kilometers', 'distance', 'odo'] },
  engineHours: { label: 'Engine hours', called: ['hours', 'enginehrs', 'hourmeter'] },
  installedOdometer: { label: 'Odometer when fitted', called: ['odometeratinstall', 'installodometer', 'installedmiles', 'installedkm', 'fittedodometer', 'odometerin', 'installmiles'] },
  installedEngineHours: { label: 'Engine hours when fitted', called: ['installhours', 'hoursin', 'fittedhours', 'installedhours'] },
  removedOdometer: { label: 'Odometer when it came out', called: ['odometeratremoval', 'removedmiles', 'removedkm', 'removalodometer', 'odometerout', 'removalmiles'] },
  removedEngineHours: { label: 'Engine hours when it came out', called: ['removalhours', 'hoursout', 'removedhours'] },
};

const measures = (fields: readonly MeasureField[]): Field[] =>
  fields.map((measure) => ({ id: measure.field, kind: 'measure', measure, label: measure.field, ...MEASURES[measure.field] }));

const FLEET_NUMBER: Field = { id: 'fleetNumber', label: 'Fleet number', kind: 'text', most: 40, needed: true, called: ['unit', 'unitnumber', 'unitno', 'vehicle', 'vehicleno', 'truck', 'truckno', 'trucknumber', 'bus', 'fleetno', 'number', 'unitid', 'asset'] };
const NOTE: Field = { id: 'note', label: 'Note', kind: 'text', most: 2000, called: ['notes', 'comment', 'comments', 'remarks', 'remark'] };
const part = (id: string, label: string): Field => ({ id, label, kind: 'term', list: 'withIt', called: [`new${label.toLowerCase().replace(/[^a-z]/g, '')}`] });

/** What each kind of import can be told of a row, in the order of the page. */
export const FIELDS: Readonly<Record<ImportKind, readonly Field[]>> = {
  units: [
    FLEET_NUMBER,
    { id: 'siteId', label: 'Site', kind: 'choice', list: 'site', needed: true, oneForAll: true, called: ['depot', 'yard', 'location', 'workshop', 'terminal'] },
    { id: 'vehicleKind', label: 'Truck or bus', kind: 'term', list: 'vehicleKind', needed: true, oneForAll: true, called: ['kind', 'type', 'vehicletype', 'vehiclekind'] },
    { id: 'vocation', label: 'Work', kind: 'term', list: 'vocation', called: ['vocation', 'duty', 'use'] },
    { id: 'country', label: 'Country', kind: 'country' },
    { id: 'builtOn', label: 'Built on', kind: 'day', called: ['built', 'builddate', 'manufactured', 'inservice'] },
    { id: 'engineFamily', label: 'Engine family', kind: 'text', most: 80, called: ['engine', 'enginemodel'] },
    ...measures(UNIT_MEASURES),
    { id: 'reservoirCount', label: 'Reservoirs, how many', kind: 'count', most: 20, called: ['reservoircount', 'tanks'] },
    { id: 'dryerCartridgeChangedOn', label: 'Dryer cartridge changed on', kind: 'day', called: ['cartridgechanged', 'dryerchanged', 'dryerservice'] },
    ...measures(READING_MEASURES),
    { id: 'readOn', label: 'Read on', kind: 'day', called: ['readingdate', 'odometerdate', 'date', 'asof'] },
    NOTE,
  ],
  models: [
    { id: 'name', label: 'Name', kind: 'text', most: 80, needed: true, called: ['model', 'compressor', 'compressormodel', 'modelname', 'part', 'partnumber'] },
    ...measures(MODEL_MEASURES),
    { id: 'cylinders', label: 'Cylinders', kind: 'count', most: 8 },
    { id: 'cooling', label: 'Cooling', kind: 'term', list: 'cooling' },
    { id: 'unloading', label: 'Unloading', kind: 'term', list: 'unloading', called: ['unloader'] },
    { id: 'intakeType', label: 'Intake', kind: 'term', list: 'intakeType', called: ['intaketype', 'air'] },
    { id: 'drainOpening', label: 'Drain opening', kind: 'term', list: 'drainOpening', called: ['drain', 'oildrain'] },
    { id: 'oilFeedPlace', label: 'Oil feed', kind: 'term', list: 'oilFeedPlace', called: ['feed', 'oilfeedplace', 'feedplace'] },
    { id: 'driveGear', label: 'Drive gear', kind: 'term', list: 'driveGear', called: ['gear'] },
    { id: 'breakInEngineRpm', label: 'Break-in engine speed, rpm', kind: 'count', most: 5000 },
    ...measures(BREAK_IN_MEASURES),
    { id: 'breakInSource', label: 'Break-in figures are from', kind: 'text', most: 300 },
    NOTE,
  ],
  fits: [
    FLEET_NUMBER,
    { id: 'model', label: 'Compressor model', kind: 'text', most: 80, needed: true, called: ['model', 'compressor', 'modelname', 'part', 'partnumber'] },
    { id: 'condition', label: 'New or rebuilt', kind: 'term', list: 'condition', needed: true, oneForAll: true, called: ['condition', 'newrebuilt', 'reman'] },
    { id: 'installedOn', label: 'Fitted on', kind: 'day', needed: true, called: ['installed', 'installdate', 'installedon', 'fitted', 'datefitted', 'dateinstalled', 'datein', 'date'] },
    ...measures(INSTALLED_MEASURES),
    { id: 'removedOn', label: 'Came out on', kind: 'day', called: ['removed', 'removaldate', 'removedon', 'dateremoved', 'dateout', 'outon'] },
    ...measures(REMOVED_MEASURES),
    { id: 'whyOut', label: 'Why it came out', kind: 'term', list: 'whyOut', called: ['whyout', 'whyremoved', 'removalreason', 'reason'] },
    { id: 'sealant', label: 'Sealant', kind: 'term', list: 'sealant' },
    part('dischargeLine', 'Discharge line'),
    part('governor', 'Governor'),
    part('feedLine', 'Oil feed line'),
    part('intakeHose', 'Intake hose'),
    part('dryerCartridge', 'Dryer cartridge'),
    part('driveGear', 'Drive gear'),
    { id: 'systemCleaned', label: 'System cleaned', kind: 'term', list: 'yesNo', called: ['cleaned'] },
    { id: 'breakInRun', label: 'Break-in run', kind: 'term', list: 'yesNo', called: ['breakin', 'runin'] },
    NOTE,
  ],
  cases: [
    FLEET_NUMBER,
    { id: 'reference', label: 'Your own reference', kind: 'text', most: 60, called: ['reference', 'workorder', 'wo', 'wono', 'order', 'ordernumber', 'jobnumber', 'ticket', 'casenumber', 'case'] },
    { id: 'openedOn', label: 'Opened on', kind: 'day', needed: true, called: ['opened', 'opendate', 'openedon', 'date', 'complaintdate', 'datein'] },
    { id: 'closedOn', label: 'Closed on', kind: 'day', needed: true, called: ['closed', 'closedate', 'closedon', 'completed', 'repaired', 'dateout'] },
    { id: 'complaints', label: 'Complaint', kind: 'choices', list: 'complaint', needed: true, oneForAll: true, called: ['complaints', 'symptom', 'complaintcode'] },
    { id: 'complaintWords', label: 'Complaint in words', kind: 'text', most: 1000, called: ['complainttext', 'description', 'problem'] },
    ...measures(READING_MEASURES),
    { id: 'mainCause', label: 'Cause', kind: 'choice', list: 'cause', needed: true, called: ['cause', 'rootcause', 'maincause', 'diagnosis'] },
    { id: 'contributingCauses', label: 'Causes that added to it', kind: 'choices', list: 'cause', called: ['contributing', 'contributingcauses', 'othercauses'] },
    { id: 'unlistedCause', label: 'Cause in your own words', kind: 'text', most: 500, called: ['othercause', 'causetext'] },
    { id: 'proof', label: 'How it is proved', kind: 'choice', list: 'proof', oneForAll: true, called: ['proof', 'proved', 'evidence'] },
    { id: 'sureness', label: 'How sure', kind: 'choice', list: 'sureness', needed: true, oneForAll: true, called: ['sureness', 'confidence', 'certainty'] },
  ],
};

export const KIND_NAMES: Readonly<Record<ImportKind, { one: string; many: string; title: string }>> = {
  units: { one: 'unit', many: 'units', title: 'Units' },
  models: { one: 'compressor model', many: 'compressor models', title: 'Compressor models' },
  fits: { one: 'fit', many: 'fits', title: 'Fits' },
  cases: { one: 'past case', many: 'past cases', title: 'Past cases' },
};

export const fieldOf = (kind: ImportKind, id: string): Field | undefined => FIELDS[kind].find((field) => field.id === id);

/** Whether one value, chosen on the page, may stand for a column that a file doesn't have. */
export const isOneForAll = (field: Field): boolean => 'oneForAll' in field && field.oneForAll === true;
