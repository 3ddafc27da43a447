import type { Metadata } from 'next';
import { ROUTES } from '@/app/api/v1/routes';
import { FieldTable } from '@/components/api-docs/FieldTable';
import { OperationArticle } from '@/components/api-docs/OperationArticle';
import { Prose } from '@/components/api-docs/Prose';
import { PageHeader } from '@/components/ui/PageHeader';
import { apiDocument } from '@/lib/openapi/document';
import { readable, type Readable } from '@/lib/openapi/readable';

export const metadata: Metadata = { title: 'API' };

let made: Readable | undefined;

/**
 * The document for reading, from our own hand: each kept library that was tried (docs/api-page.md) brings telemetry or
 * fonts from elsewhere, or style sheets that the content security policy refuses.
 */
export default function ApiDocsPage() {
  const { introduction, groups, schemas } = (made ??= readable(apiDocument(ROUTES)));
  return (
    <div className="py-8">
      <PageHeader title="API" lead={<>For scripts. The same as a document for programs: <a href="/api/v1/openapi.json">openapi.json</a> (OpenAPI 3.1).</>} />
      <div className="grid gap-12">
        <section aria-label="How it works" className="grid gap-3">
          <Prose>{introduction}</Prose>
        </section>
        <nav aria-label="What can be asked" className="columns-[18rem] gap-8">
          {groups.map(({ title, operations }) => (
            <div key={title} className="mb-5 break-inside-avoid">
              <p className="label text-ink-soft">{title}</p>
              <ul>
                {operations.map(({ operationId, summary }) => (
                  <li key={operationId}><a href={`#${operationId}`} className="inline-block py-1">{summary}</a></li>
                ))}
              </ul>
            </div>
          ))}
        </nav>
        {groups.map(({ title, operations }) => (
          <section key={title} aria-labelledby={`group-${title}`} className="grid gap-10">
            <h2 id={`group-${title}`}>{title}</h2>
            {operations.map((operation) => <OperationArticle key={operation.operationId} operation={operation} />)}
          </section>
        ))}
        <section aria-labelledby="answers" className="grid gap-8">
          <h2 id="answers">What answers hold</h2>
          {schemas.map(({ name, description, fields }) => (
            <article key={name} id={`schema-${name}`} aria-labelledby={`schema-${name}-title`} className="grid scroll-mt-4 gap-2">
              <h3 id={`schema-${name}-title`} className="text-xl">{name}</h3>
              {description && <Prose>{description}</Prose>}
              <FieldTable caption={`Fields of ${name}`} fields={fields} />
            </article>
          ))}
        </section>
      </div>
    </div>
  );
}
