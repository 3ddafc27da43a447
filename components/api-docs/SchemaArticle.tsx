import type { ReadableSchema } from '@/lib/openapi/readable';
import { FieldTable } from './FieldTable';
import { Prose } from './Prose';

/** What one kind of answer holds. */
export function SchemaArticle({ schema: { name, description, fields } }: { schema: ReadableSchema }) {
  return (
    <article id={`schema-${name}`} aria-labelledby={`schema-${name}-title`} className="grid scroll-mt-4 gap-2">
      <h3 id={`schema-${name}-title`} className="text-xl">{name}</h3>
      {description && <Prose>{description}</Prose>}
      {fields.length > 0 && <FieldTable caption={`Fields of ${name}`} fields={fields} />}
    </article>
  );
}
