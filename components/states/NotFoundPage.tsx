import { ButtonLink } from '@/components/ui/Button';
import { EmptyState } from '@/components/ui/EmptyState';
import { PageHeader } from '@/components/ui/PageHeader';

interface Props {
  /** "case", "compressor model" */
  kind: string;
  /** Why it may be gone, and what to do. */
  children: string;
  to: { href: string; label: string };
}

/** Nothing at this address, by the kind of thing that was looked for. Also what a thing of another organisation looks like. */
export function NotFoundPage({ kind, children, to }: Props) {
  return (
    <>
      <PageHeader title={`No such ${kind}`} lead="Nothing was changed." />
      <EmptyState title={`There is no ${kind} at this address`} action={<ButtonLink href={to.href}>{to.label}</ButtonLink>}>
        {children}
      </EmptyState>
    </>
  );
}
