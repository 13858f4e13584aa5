'use client';
import { useEffect } from 'react';
import { Button } from '@/components/ui/button';

/** A fault on our side: nothing of its inside is shown. */
export default function ErrorPage({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  useEffect(() => console.error(error), [error]);
  return (
    <main id="main" className="px-edge py-14">
      <h1 className="text-title">This page could not be made</h1>
      <p className="mt-3 max-w-[60ch] text-ink-2">
        Something failed on the server. Nothing that was entered or uploaded is lost. Try again; if it stays,
        tell whoever runs this installation{error.digest ? ` the number ${error.digest}` : ''}.
      </p>
      <p className="mt-4">
        <Button onClick={reset}>Try again</Button>
      </p>
    </main>
  );
}
