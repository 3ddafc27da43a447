import { ButtonLink } from '@/components/ui/Button';
import { Wordmark } from '@/components/shell/Wordmark';

export const metadata = { title: 'Not found' };

export default function NotFound() {
  return (
    <main className="mx-auto grid min-h-dvh max-w-page content-center gap-4 px-4 sm:px-6">
      <Wordmark href="/" />
      <h1>Nothing at this address</h1>
      <p className="max-w-prose">It was never there, it was removed, or it belongs to another organisation. Nothing was changed.</p>
      <p>
        <ButtonLink href="/">To the start</ButtonLink>
      </p>
    </main>
  );
}
