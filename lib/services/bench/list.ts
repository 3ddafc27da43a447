import { z } from 'zod';
import { SUMS } from '@/lib/air-and-oil/sums';
import { PERMITTED } from '@/lib/auth/permissions';
import { unitsOfInput } from '@/lib/bench/read-texts';
import { symbolOf } from '@/lib/bench/show';
import { defineRead } from '../define';

/** Every sum, with what it takes: for a script to find its way. */
export const listSums = defineRead({
  name: 'list.sums',
  doing: 'use the bench',
  roles: PERMITTED['bench.use'],
  input: z.strictObject({}),
  run: async ({ ctx }) => ({
    sums: SUMS.map(({ id, name, purpose, inputs, main, outputs, source }) => ({
      id,
      name,
      purpose,
      inputs: inputs.map((input) => ({
        id: input.id,
        label: input.label,
        quantity: input.quantity,
        unit: unitsOfInput(input, ctx.person.units).unit,
        symbol: symbolOf(input, ctx.person),
        optional: input.optional,
        least: input.least,
        most: input.most,
      })),
      main,
      outputs: outputs.map((output) => ({ id: output.id, label: output.label, quantity: output.quantity })),
      source,
    })),
  }),
});
