import { DataTable } from '@/components/ui/DataTable';
import { Breakable } from '@/components/ui/Breakable';
import type { Field } from '@/lib/openapi/fields';
import { Line } from './Prose';

/** What something takes or holds, a line for each field. */
export function FieldTable({ caption, fields, marksOptional = false }: { caption: string; fields: readonly Field[]; marksOptional?: boolean }) {
  return (
    <DataTable
      caption={caption}
      rows={fields.map((field, index) => ({ ...field, key: `${index} ${field.path}` }))}
      rowKey={({ key }) => key}
      columns={[
        { key: 'name', header: 'Name', rowHeader: true, cell: ({ path, isRequired }) => <><code className="figure text-[0.9375rem]"><Breakable>{path}</Breakable></code>{marksOptional && !isRequired && <span className="block text-sm font-normal text-ink-soft">optional</span>}</> },
        { key: 'type', header: 'Is', cell: ({ type, of }) => <span className="block min-w-40 wrap-break-word">{of ? <a href={`#schema-${of}`}>{type}</a> : type}</span> },
        { key: 'means', header: 'Means', cell: ({ description, when }) => (when || description) && <span className="block min-w-40">{when && <span className="block text-ink-soft">When {when}.</span>}{description && <Line>{description}</Line>}</span> },
      ]}
    />
  );
}
