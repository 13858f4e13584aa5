import type { Metadata } from 'next';
import Link from 'next/link';
import { askForReset } from './actions';
import { AskForm } from './ask-form';

export const metadata: Metadata = { title: 'Forgotten password' };

export default function ForgottenPasswordPage() {
  return (
    <>
      <h1 className="mb-3 text-title">Forgotten password</h1>
      <p className="mb-6 text-ink-2">A link to choose a new one goes to the e-mail of your account.</p>
      <AskForm action={askForReset} />
      <p className="mt-5 text-small">
        <Link href="/sign-in">Back to sign-in</Link>
      </p>
    </>
  );
}
