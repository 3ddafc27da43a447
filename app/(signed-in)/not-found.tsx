import { ButtonLink } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';

/** Also what a page of another organisation looks like. */
export default function SignedInNotFound() {
  return (
    <>
      <PageHeader title="Not found" />
      <EmptyState title="Nothing at this address" action={<ButtonLink href="/cases">To the cases</ButtonLink>}>
        It was never here, or it was removed. Nothing was changed.
      </EmptyState>
    </>
  );
}
