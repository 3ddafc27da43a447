import { z } from 'zod';

const id = z.string();
const quantity = z.string().meta({ description: 'What is measured: “pressure”. Its SI value is in the SI unit of that.' });

export const sumList = z
  .object({
    sums: z.array(
      z.object({
        id,
        name: z.string(),
        purpose: z.string(),
        inputs: z.array(
          z.object({
            id,
            label: z.string(),
            quantity,
            unit: z.string().meta({ description: 'What a value without a unit is in.' }),
            symbol: z.string(),
            optional: z.boolean(),
            least: z.number().meta({ description: 'In SI.' }),
            most: z.number().meta({ description: 'In SI.' }),
          }),
        ),
        main: z.string().meta({ description: 'The output that the band is of.' }),
        outputs: z.array(z.object({ id, label: z.string(), quantity })),
        source: z.string(),
      }),
    ),
  })
  .meta({ id: 'Sums' });

export const workedOut = z
  .object({
    sum: id,
    never: z.string().nullable().meta({ description: 'Why the sum comes to nothing, where it does: “As much leaks as is delivered”.' }),
    outputs: z.array(z.object({ id, label: z.string(), quantity, si: z.number().nullable(), text: z.string().nullable().meta({ description: 'In the units of whoever asks.' }) })),
    band: z
      .object({
        output: id,
        low: z.number().nullable().meta({ description: 'In SI; null where “never” is within reach.' }),
        high: z.number().nullable(),
        shares: z.array(z.object({ input: id, share: z.number() })).meta({ description: 'How much of the doubt each input brings, the most first.' }),
      })
      .nullable()
      .meta({ description: 'Where the value lies 19 times in 20.' }),
    notes: z.array(z.string()),
    inputs: z.array(z.object({ id, typed: z.string().nullable(), unit: z.string(), si: z.number(), halfWidthSi: z.number() })).meta({ description: 'What went in; `typed` is null where the usual was taken.' }),
  })
  .meta({ id: 'WorkedOutSum' });
