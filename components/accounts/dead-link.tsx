import Link from 'next/link';
import type { ReactNode } from 'react';

/** Said of a one-time link that was used, withdrawn, has run out or was never issued. */
export function DeadLink({ what, children }: { what: string; children: ReactNode }) {
  return (
    <>
      <h1 className="mb-3 text-title">This link does not work</h1>
      <p>
        {what} It may have been used already, have run out, or have lost a letter on its way from the mail.
      </p>
      <p className="mt-3">{children}</p>
      <p className="mt-6 text-small">
        <Link href="/sign-in">To sign-in</Link>
      </p>
    </>
  );
}
