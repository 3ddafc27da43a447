import type { Metadata } from 'next';
import { DossierSections, Facts } from '@/components/dossier/Blocks';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/PageHeader';
import { orNotFound, pageContext } from '@/lib/auth/page';
import { PERMITTED } from '@/lib/auth/permissions';
import { readDossier } from '@/lib/services/dossier/read';

export const metadata: Metadata = { title: 'Dossier' };

/** A dossier to be read or printed: what its PDF says, from what was kept when it was made. */
export default async function ReadDossierPage({ params }: { params: Promise<{ id: string; dossierId: string }> }) {
  const ctx = await pageContext(PERMITTED['case.see']);
  const { id, dossierId } = await params;
  const { content, reference, contentHash, isUnchanged } = await orNotFound(readDossier({ ctx, input: { caseId: id, dossierId } }));
  const leftOut = content.leftOut.length > 0 ? [{ term: 'Left out by its maker', value: content.leftOut.join('; ') }] : [];
  return (
    <>
      <PageHeader title={content.title} breadcrumbs={[{ label: 'Cases', href: '/cases' }, { label: 'Case', href: `/cases/${id}` }, { label: 'Dossier', href: `/cases/${id}/dossier` }]} lead={`${reference}, ${content.organisation}`} />
      <div className="grid max-w-4xl gap-8">
        <Facts facts={[...content.head, ...leftOut, { term: 'SHA-256 of its content', value: contentHash }, { term: 'Looked at now', value: isUnchanged ? 'Unchanged since it was made' : 'Not what was made: its content no longer has this hash' }]} />
        <DossierSections content={content} />
        <section aria-labelledby="caution">
          <h2 id="caution" className="sr-only">Caution</h2>
          <Notice kind="caution" title="The ranking is advice">{content.caution}</Notice>
        </section>
      </div>
    </>
  );
}
