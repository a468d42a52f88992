'use client';

import { ErrorPage } from './_components/error-page';
import './globals.css';

/** The last resort, where not even the root layout could be made: it brings its own document. */
export default function GlobalError({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <html lang="en">
      <body>
        <title>Leadline: error</title>
        <main className="desk-main">
          <ErrorPage error={error} retry={retry} />
        </main>
      </body>
    </html>
  );
}
