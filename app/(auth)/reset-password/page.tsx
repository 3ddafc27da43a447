import type { Metadata } from 'next';
import { Doorway } from '@/components/sign-in/Doorway';
import { RequestResetForm } from '@/components/sign-in/RequestResetForm';
import { requestReset } from './actions';

export const metadata: Metadata = { title: 'A new password' };

export default function RequestResetPage() {
  return (
    <Doorway>
      <div className="grid gap-2">
        <h1>A new password</h1>
        <p className="text-ink-soft">A link to set one comes by mail.</p>
      </div>
      <RequestResetForm action={requestReset} />
    </Doorway>
  );
}
