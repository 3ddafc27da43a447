/** From a file of a spreadsheet to records, and to what is wrong with the rest. Pure: no database, no clock. */
export { DAY_ORDERS, DAY_ORDER_NAMES, guessDayOrder, readDay, type DayOrder } from './day';
export { guessDecimalMark } from './decimal-mark';
export { DELIMITERS, DELIMITER_NAMES, sniffDelimiter, type Delimiter } from './delimiter';
export { ENCODINGS, ENCODING_NAMES, sniffEncoding, type Encoding } from './encoding';
export { FIELDS, fieldOf, IMPORT_KINDS, isOneForAll, KIND_NAMES, type ChoiceList, type Field, type ImportKind } from './fields';
export { guessColumns } from './guess';
export { guessMapping, lookAt, type Looked } from './look-at';
export type { Choice, ImportRecord, Mapping, ReadRow, RowProblem, Value } from './mapping';
export { readRow, unitForField, type RowSettings } from './read-row';
export { readTable, type TableRow } from './read-table';
