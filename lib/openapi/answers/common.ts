import { z } from 'zod';

/** Pieces of what is answered. These schemas describe; nothing is parsed with them but in tests. */

export const id = z.uuid();
export const instant = z.iso.datetime().meta({ description: 'UTC' });
export const day = z.iso.date();
export const probability = z.number().min(0).max(1);
export const count = z.int();
export const si = (unit: string) => z.number().nullable().meta({ description: `In ${unit}.` });
export const idAnswer = z.object({ id });

/** Texts by column, as they were typed. */
export const asTyped = z.record(z.string(), z.string()).meta({ description: 'What was typed for a measure, by field.' });

/** What a change holds, field by field, as text: read it, alter some of it, send it. */
export const texts = <Field extends string>(...fields: Field[]) =>
  z.object(Object.fromEntries(fields.map((field) => [field, z.string()])) as Record<Field, z.ZodString>).meta({ description: 'What a change of this would hold as it is now.' });

/** A page of a list. */
export const list = <Name extends string, Row extends z.ZodType>(name: Name, row: Row) =>
  z.object({
    [name]: z.array(row),
    next: z.string().nullable().meta({ description: 'The cursor of the next page; null on the last.' }),
  } as Record<Name, z.ZodArray<Row>> & { next: z.ZodNullable<z.ZodString> });
