import type { Metadata } from 'next';
import { RequestResetForm } from '@/components/sign-in/RequestResetForm';
import { requestReset } from './actions';

export const metadata: Metadata = { title: 'A new password' };

export default function RequestResetPage() {
  return (
    <div className="mx-auto grid max-w-md gap-8 py-10">
      <div className="grid gap-2">
        <h1>A new password</h1>
        <p className="text-ink-soft">A link to set one comes by mail.</p>
      </div>
      <RequestResetForm action={requestReset} />
    </div>
  );
}
