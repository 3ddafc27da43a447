'use client';

import '@fontsource-variable/archivo/wdth.css';
import '@fontsource/atkinson-hyperlegible-next/400.css';
import '@fontsource/atkinson-hyperlegible-next/700.css';
import '@fontsource/atkinson-hyperlegible-mono/400.css';
import './globals.css';
import { ErrorPanel } from '@/components/shell/ErrorPanel';

/** Where not even the root layout could be drawn: a document of its own, in the theme that the device asks for. */
export default function GlobalError(props: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <html lang="en">
      <body>
        <title>Something failed · Carryover</title>
        <main className="mx-auto max-w-page px-4 sm:px-6">
          <p className="heading pt-6 text-2xl">Carryover</p>
          <ErrorPanel {...props} homeHref="/" />
        </main>
      </body>
    </html>
  );
}
