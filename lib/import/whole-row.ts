import type { ImportKind } from './fields';
import type { ImportRecord, RowProblem } from './mapping';

interface Settings {
  somethingElse: string;
}

const problem = (message: string, accepts: string): RowProblem => ({ column: '', text: '', message, accepts });

/** What can't be true of a row although each of its cells can be read. The forms refuse the same. */
export function wholeProblems(kind: ImportKind, record: ImportRecord, { somethingElse }: Settings): RowProblem[] {
  switch (kind) {
    case 'units':
      return [];
    case 'models':
      return ofModel(record);
    case 'fits':
      return ofFit(record);
    case 'cases':
      return ofCase(record, somethingElse);
  }
}

const si = (record: ImportRecord, field: string): number | undefined => {
  const value = record[field];
  return typeof value === 'object' && 'si' in value ? value.si : undefined;
};

function ofModel(record: ImportRecord): RowProblem[] {
  const figures = ['breakInEngineRpm', 'breakInPressure', 'breakInLeast', 'breakInMost'].filter((field) => record[field] !== undefined);
  const [least, most] = [si(record, 'breakInLeast'), si(record, 'breakInMost')];
  return [
    ...(figures.length > 0 && !record.breakInSource ? [problem('It doesn’t say where the figures of the break-in run are from.', 'Where they are from, or no such figure.')] : []),
    ...(figures.length === 0 && record.breakInSource ? [problem('It says where figures of a break-in run are from, and gives none.', 'At least one figure, or no source.')] : []),
    ...(least !== undefined && most !== undefined && least > most ? [problem('The longest break-in time is shorter than the least.', 'A longest time of at least as much.')] : []),
  ];
}

function ofFit(record: ImportRecord): RowProblem[] {
  const { installedOn = '', removedOn, whyOut, removedOdometer, removedEngineHours } = record;
  const isOut = whyOut !== undefined || removedOdometer !== undefined || removedEngineHours !== undefined;
  const runsBack = (installed: string, removed: string) => {
    const [before, after] = [si(record, installed), si(record, removed)];
    return before !== undefined && after !== undefined && after < before;
  };
  return [
    ...(isOut && !removedOn ? [problem('It says something of its coming out, but not the day.', 'The day on which it came out, or nothing of its coming out.')] : []),
    ...(removedOn && !whyOut ? [problem('It came out, and nothing says why.', 'Why it came out; “Nobody knows” will do.')] : []),
    ...(removedOn && removedOn < installedOn ? [problem('It came out before it was fitted.', 'A day on or after that of the fitting. Check the order of day and month as well.')] : []),
    ...(runsBack('installedOdometer', 'removedOdometer') ? [problem('Its odometer ran backwards.', 'A figure at coming out that isn’t lower than at the fitting.')] : []),
    ...(runsBack('installedEngineHours', 'removedEngineHours') ? [problem('Its hour meter ran backwards.', 'A figure at coming out that isn’t lower than at the fitting.')] : []),
  ];
}

function ofCase({ openedOn = '', closedOn = '', mainCause, contributingCauses = [], unlistedCause, proof }: ImportRecord, somethingElse: string): RowProblem[] {
  const others = Array.isArray(contributingCauses) ? contributingCauses : [];
  return [
    ...(closedOn < openedOn ? [problem('It was closed before it was opened.', 'A day on or after that of the opening. Check the order of day and month as well.')] : []),
    ...(others.includes(mainCause) ? [problem('The main cause is named again among those that added to it.', 'Each cause once.')] : []),
    ...(mainCause === somethingElse && !unlistedCause ? [problem('The cause is none of the rulebook’s, and nothing says what it was.', 'What it was, in your own words.')] : []),
    ...(proof === 'isolated' && others.length > 0 ? [problem('Isolated means that one remedy alone was done and held; causes that added to it speak against that.', '“Held with others”, or no further causes.')] : []),
  ];
}
