import type { Metadata } from 'next';
import Link from 'next/link';
import { ButtonLink } from '@/components/ui/Button';
import { DataTable } from '@/components/ui/DataTable';
import { PageHeader } from '@/components/ui/PageHeader';
import { pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { listSites } from '@/lib/services/site/list';

export const metadata: Metadata = { title: 'Sites' };

export default async function SitesPage() {
  const ctx = await pageContext(PERMITTED['site.manage']);
  const sites = await listSites({ ctx, input: {} });
  return (
    <>
      <PageHeader
        title="Sites"
        lead="Workshops and depots. Days, such as those of a caution, are counted in a site's time zone."
        actions={<ButtonLink href="/settings/sites/new">Add a site</ButtonLink>}
      />
      <DataTable
        caption="Sites"
        captionHidden
        rows={sites}
        rowKey={({ id }) => id}
        columns={[
          { key: 'name', header: 'Name', rowHeader: true, cell: ({ id, name }) => <Link href={`/settings/sites/${id}`}>{name}</Link> },
          { key: 'zone', header: 'Time zone', cell: ({ timeZone }) => timeZone },
        ]}
      />
    </>
  );
}
