'use client';

import { ErrorPanel } from '@/components/shell/ErrorPanel';

/** Inside the shell, so that the navigation stays. */
export default function SignedInError({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return <ErrorPanel digest={error.digest} retry={retry} homeHref="/cases" />;
}
