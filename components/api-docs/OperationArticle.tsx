import Link from 'next/link';
import { Breakable } from '@/components/ui/Breakable';
import { Tag } from '@/components/ui/Tag';
import { fieldsOf, nameIn, typeInWords, type Field, type Schema } from '@/lib/openapi/fields';
import type { ReadableOperation } from '@/lib/openapi/readable';
import { FieldTable } from './FieldTable';
import { Prose } from './Prose';

const WHERE: Record<string, string> = { path: 'in the path', query: 'in the query', header: 'in a header' };

const parameterFields = (parameters: ReadableOperation['parameters']): Field[] =>
  parameters.map(({ name, in: where, required, description, schema }) => ({
    path: name,
    type: `${typeInWords(schema)}, ${WHERE[where] ?? where}`,
    isRequired: required ?? false,
    description: [description, schema.default !== undefined && schema.default !== '' && `Unless given: \`${String(schema.default)}\`.`].filter(Boolean).join(' '),
  }));

export function OperationArticle({ operation: { operationId, method, path, summary, description, scope, parameters, body, answer, refusals } }: { operation: ReadableOperation }) {
  const bodyFields = body ? fieldsOf(body) : [];
  return (
    <article id={operationId} aria-labelledby={`${operationId}-title`} className="grid scroll-mt-4 gap-3 border-t border-ink pt-4">
      <h3 id={`${operationId}-title`} className="text-xl">{summary}</h3>
      <p className="flex flex-wrap items-center gap-3">
        <Tag tone="strong">{method}</Tag>
        <code className="figure wrap-anywhere"><Breakable>{`/api/v1${path}`}</Breakable></code>
        {scope && <span className="text-ink-soft">needs the scope <code className="figure text-[0.9375rem]">{scope}</code></span>}
      </p>
      {description && <Prose>{description}</Prose>}
      {parameters.length > 0 && <FieldTable caption={`Takes: ${summary}`} fields={parameterFields(parameters)} marksOptional />}
      {bodyFields.length > 0 && <FieldTable caption={`Body: ${summary}`} fields={bodyFields} marksOptional />}
      {body && bodyFields.length === 0 && typeInWords(body) !== 'object' && <p>Body: {typeInWords(body)}.</p>}
      <p>
        Answers <span className="figure">{answer.status}</span>{answer.schema && <> with <Answered schema={answer.schema} /></>}, or{' '}
        <Link href="/api/docs#refusals" className="figure">{refusals.join(', ')}</Link>.
      </p>
    </article>
  );
}

function Answered({ schema }: { schema: Schema }) {
  const name = nameIn(schema);
  if (name) return <a href={`#schema-${name}`}>{name}</a>;
  const fields = fieldsOf(schema);
  return <>{fields.length > 0 ? fields.map(({ path, type }) => `${path} (${type})`).join('; ') : typeInWords(schema)}</>;
}
