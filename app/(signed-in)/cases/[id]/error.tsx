'use client';

import { ErrorPanel } from '@/components/shell/ErrorPanel';

const KEPT = 'Every answer that was shown as saved is kept; one that still waits for the connection stays on this device and is sent from here.';

export default function CaseError(props: { error: Error & { digest?: string }; retry: () => void }) {
  return <ErrorPanel {...props} homeHref="/cases" kept={KEPT} />;
}
