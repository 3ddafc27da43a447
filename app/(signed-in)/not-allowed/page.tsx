import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';
import { asRoles } from '@/lib/auth/role-words';
import { homeFor } from '@/lib/auth/navigation';
import { pageContext } from '@/lib/auth/page';

export const metadata: Metadata = { title: 'Not for your role' };

/** Where a page sends somebody whose role it is not for. */
export default async function NotAllowedPage() {
  const { roles } = await pageContext();
  return (
    <>
      <PageHeader title="Not for your role" />
      <EmptyState title={`You are signed in ${asRoles(roles)}`} action={<ButtonLink href={homeFor(roles)}>To your pages</ButtonLink>}>
        An administrator of your organisation can give you more rights.
      </EmptyState>
    </>
  );
}
