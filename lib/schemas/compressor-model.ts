import { z } from 'zod';
import { line, optionalLine, rowId } from './common';
import { filterOf, filterText, ordered } from './list';
import { measureText, optionalCount, reason, versionText } from './record';
import { optionalTerm } from './terms';

const facts = {
  name: line('a name', 80),
  displacement: measureText,
  bore: measureText,
  stroke: measureText,
  cylinders: optionalCount(8),
  /** Compressor turns for one of the engine. */
  driveRatio: measureText,
  cooling: optionalTerm('cooling'),
  unloading: optionalTerm('unloading'),
  intakeType: optionalTerm('intakeType'),
  drainOpening: optionalTerm('drainOpening'),
  oilFeedPlace: optionalTerm('oilFeedPlace'),
  driveGear: optionalTerm('driveGear'),
  portBore: measureText,
  lineSize: measureText,
  breakInEngineRpm: optionalCount(5000),
  breakInPressure: measureText,
  breakInLeast: measureText,
  breakInMost: measureText,
  breakInSource: optionalLine(300),
  note: optionalLine(2000),
};

export const createModelInput = z.strictObject({ id: rowId, ...facts });

export const changeModelInput = z.strictObject({ modelId: rowId, version: versionText, ...facts });

export const modelIdInput = z.strictObject({ modelId: rowId });

export const hideModelInput = z.strictObject({ modelId: rowId, reason });

export const showModelInput = z.strictObject({ modelId: rowId, reason: optionalLine(500) });

export const MODEL_SORTS = ['name', 'displacement', 'on-units'] as const;

export const listModelsInput = z.object({
  q: filterText,
  drain: filterOf(['large-cavity', 'small-hole']),
  hidden: filterOf(['yes']),
  ...ordered(MODEL_SORTS),
});
