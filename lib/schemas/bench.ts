import { z } from 'zod';
import { rowId, rulebookId, sumInputs } from './case';

export const sumTargetInput = z.strictObject({ caseId: rowId, checkId: rulebookId, sumId: rulebookId });

/** What was typed for a sum, by input: "3 ft3", and how far it can be off: "0.1 ft3". */
export const workOutInput = z.strictObject({ sum: rulebookId, inputs: sumInputs.default({}) });
