import type { Metadata } from 'next';
import Link from 'next/link';
import { Prose } from '@/components/api-docs/Prose';
import { SchemaArticle } from '@/components/api-docs/SchemaArticle';
import { DataTable } from '@/components/ui/DataTable';
import { PageHeader } from '@/components/ui/PageHeader';
import { PROBLEMS } from '@/lib/openapi/problem';
import { readableApi } from './readable-api';

export const metadata: Metadata = { title: 'API' };

const STATUSES = [
  { status: '304', means: 'It is still as the tag of `If-None-Match` names it.' },
  ...Object.entries(PROBLEMS).map(([status, means]) => ({ status, means })),
];

/**
 * The document for reading, from our own hand: each kept library that was tried (docs/api-page.md) brings telemetry or
 * fonts from elsewhere, or style sheets that the content security policy refuses.
 */
export default function ApiDocsPage() {
  const { introduction, groups, problem } = readableApi();
  return (
    <div className="py-8">
      <PageHeader title="API" lead={<>For scripts. The same as a document for programs: <a href="/api/v1/openapi.json">openapi.json</a> (OpenAPI 3.1).</>} />
      <div className="grid gap-12">
        <section aria-label="How it works" className="grid gap-3">
          <Prose>{introduction}</Prose>
        </section>
        <section aria-labelledby="asked" className="grid gap-4">
          <h2 id="asked">What can be asked</h2>
          <div className="columns-[18rem] gap-8">
            {groups.map(({ id, title, operations }) => (
              <section key={id} aria-labelledby={`group-${id}`} className="mb-5 break-inside-avoid">
                <h3 id={`group-${id}`} className="text-lg"><Link href={`/api/docs/${id}`}>{title}</Link></h3>
                <ul>
                  {operations.map(({ operationId, summary }) => (
                    <li key={operationId}><Link href={`/api/docs/${id}#${operationId}`} className="inline-block py-1">{summary}</Link></li>
                  ))}
                </ul>
              </section>
            ))}
          </div>
        </section>
        <section aria-labelledby="refusals" className="grid gap-4">
          <h2 id="refusals" className="scroll-mt-4">How something is refused</h2>
          <DataTable
            caption="What a status means"
            rows={STATUSES}
            rowKey={({ status }) => status}
            columns={[
              { key: 'status', header: 'Status', rowHeader: true, cell: ({ status }) => <span className="figure">{status}</span> },
              { key: 'means', header: 'Means', cell: ({ means }) => <Prose>{means}</Prose> },
            ]}
          />
          <SchemaArticle schema={problem} />
        </section>
      </div>
    </div>
  );
}
