import type { ReactNode } from 'react';
import { requireContext } from '@/lib/auth/session';
import { SignedInFrame } from '../signed-in-frame';

export default async function SignedInLayout({ children }: { children: ReactNode }) {
  return <SignedInFrame ctx={await requireContext()}>{children}</SignedInFrame>;
}
