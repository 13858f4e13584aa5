import type { Metadata } from 'next';
import { connection } from 'next/server';
import { notFound } from 'next/navigation';
import { isDemoMode } from '@/lib/access/demo-mode';
import { listCapturedMails } from '@/lib/mail/captured-mails';

export const metadata: Metadata = { title: 'Captured mail', robots: { index: false } };

/** Mails that the capture server kept instead of sending; only in development and in the demo. */
export default async function CapturedMailPage() {
  await connection();
  const folder = process.env.MAIL_CAPTURE_DIR;
  if (!folder || (process.env.NODE_ENV === 'production' && !isDemoMode())) notFound();
  const mails = await listCapturedMails(folder);
  return (
    <main id="main" className="px-edge py-10">
      <h1 className="text-title">Captured mail</h1>
      <p className="mt-2 mb-6 text-ink-2">
        Nothing is sent here: a server on this machine keeps every mail of the demo.
      </p>
      {mails.length === 0 ? <p>No mail yet.</p> : null}
      {mails.map((mail) => (
        <article key={`${mail.date} ${mail.to}`} className="mb-6 border border-rule-strong bg-page p-5">
          <h2 className="text-group">{mail.subject}</h2>
          <p className="text-note text-ink-3">
            to {mail.to} · {mail.date}
          </p>
          <pre className="mt-3 font-sans whitespace-pre-wrap">{mail.text}</pre>
        </article>
      ))}
    </main>
  );
}
