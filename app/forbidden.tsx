import type { Metadata } from 'next';
import Link from 'next/link';
import { findActor } from '@/app/_server/actor';

export const metadata: Metadata = { title: 'Not allowed' };

/** Shown with status 403 where a page needs a role that the signed-in person does not have. */
export default async function Forbidden() {
  const actor = await findActor();
  return (
    <main id="main" className="mx-auto w-full max-w-[620px] px-edge py-9">
      <div className="border border-rule-strong bg-page px-leaf py-8">
        <h1 className="mb-4 text-title">Not allowed</h1>
        <p className="text-lead">
          {actor
            ? `You are signed in as ${actor.name}, ${actor.role} of ${actor.groupName}. This page needs another role.`
            : 'This page needs a role that you do not have.'}
        </p>
        <p className="mt-3">A PI of the group can change roles under Settings, Members.</p>
        <p className="mt-6">
          <Link href="/">To the group’s front page</Link>
        </p>
      </div>
    </main>
  );
}
