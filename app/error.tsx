'use client';

import { ErrorPanel } from '@/components/shell/ErrorPanel';

export default function PageError({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <main className="mx-auto max-w-page px-4 sm:px-6">
      <ErrorPanel digest={error.digest} retry={retry} homeHref="/" />
    </main>
  );
}
