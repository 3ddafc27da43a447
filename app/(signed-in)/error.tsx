'use client';

import { ErrorPanel } from '@/components/shell/ErrorPanel';

/** Inside the shell, so that the navigation stays. */
export default function SignedInError(props: { error: Error & { digest?: string }; retry: () => void }) {
  return <ErrorPanel {...props} homeHref="/cases" />;
}
