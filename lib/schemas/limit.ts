import { z } from 'zod';
import { browseInput } from './browse';
import { checkbox, line, optionalId, optionalLine, rowId } from './common';
import { measureText, optionalDay, reason } from './record';
import { optionalTerm } from './terms';

/** A check of the rulebook, by its id. */
const checkId = z.string('Choose the check.').trim().min(1, 'Choose the check.').max(80);

export const adoptLimitInput = z.strictObject({
  id: rowId,
  checkId,
  least: measureText,
  most: measureText,
  below: checkbox,
  /** Where the figure is from: a limit without a source is an opinion. */
  source: line('where the figure is from', 300),
  modelId: optionalId,
  country: z
    .union([z.literal(''), z.string().trim().toUpperCase().regex(/^[A-Z]{2}$/)], 'Give the two letters of the country, such as US.')
    .nullish()
    .transform((text) => text || null),
  vehicleKind: optionalTerm('vehicleKind'),
  builtFrom: optionalDay,
  builtBefore: optionalDay,
});

export const withdrawLimitInput = z.strictObject({ limitId: rowId, reason });

export const limitIdInput = z.strictObject({ limitId: rowId });

export const browseLimitsInput = browseInput;

const idInAddress = z.string().regex(/^[a-z0-9-]{1,80}$/).optional().catch(undefined);

/** For which check a limit is to be adopted, and from which published figure; nonsense in an address is neither. */
export const limitFormInput = z.object({ check: idInAddress, from: idInAddress });

export const liftHoldInput = z.strictObject({ unitId: rowId, holdId: rowId, found: line('what was measured or seen', 200), note: optionalLine(500) });
