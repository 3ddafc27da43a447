import type { Metadata } from 'next';
import { VerifyForm } from '@/components/dossier/VerifyForm';
import { verify } from './actions';

export const metadata: Metadata = { title: 'Verify a dossier' };

/** For anybody who holds a dossier: whether it was made here, and whether its file is unchanged. */
export default function VerifyPage() {
  return (
    <div className="grid max-w-prose grid-cols-[minmax(0,1fr)] gap-6 py-10">
      <h1>Verify a dossier</h1>
      <p>
        A dossier carries a reference, such as D-2026-00012, and a hash: 64 digits and letters that come out differently when anything is changed. Choose the file that you hold, or type the hash that is printed at the foot of each page.
      </p>
      <VerifyForm action={verify} />
    </div>
  );
}
