import type { z } from 'zod';
import type { FieldErrors } from '@/lib/errors';

/** The first message of each field, by its path ("reservoirs.0.volume"). */
export function fieldErrors(error: z.ZodError): FieldErrors {
  const fields: FieldErrors = {};
  for (const issue of error.issues) {
    const paths = issue.code === 'unrecognized_keys' ? issue.keys.map((key) => [...issue.path, key]) : [issue.path];
    for (const path of paths) fields[path.map(String).join('.')] ??= issue.message;
  }
  return fields;
}
