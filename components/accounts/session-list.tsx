'use client';
import { VisuallyHidden } from '@/components/ui/visually-hidden';
import { FormMessage } from './form-message';
import { LocalTime } from './local-time';
import { SubmitButton } from './submit-button';
import { useFormAction, type FormAction } from './use-form-action';

interface SessionListProps {
  sessions: readonly {
    id: string;
    browser: string;
    startedAt: string;
    seenAt: string;
    /** The one that shows this page. */
    current: boolean;
  }[];
  endOne: FormAction;
  endOthers: FormAction;
}

/** Where a person is signed in, with a way to end each session. */
export function SessionList({ sessions, endOne, endOthers }: SessionListProps) {
  const [one, submitOne] = useFormAction(endOne);
  const [others, submitOthers] = useFormAction(endOthers);
  return (
    <section aria-labelledby="sessions">
      <h2 id="sessions" className="mb-1 border-b-2 border-ink pb-2 text-section">
        Signed in
      </h2>
      <FormMessage state={one} />
      <FormMessage state={others} />
      <ul>
        {sessions.map((session) => (
          <li
            key={session.id}
            className="flex min-h-14 items-center justify-between gap-4 border-b border-rule py-2"
          >
            <div>
              <p>
                {session.browser}
                {session.current ? <span className="text-ink-2"> · this one</span> : null}
              </p>
              <p className="text-small text-ink-2">
                since <LocalTime iso={session.startedAt} />, last used <LocalTime iso={session.seenAt} />
              </p>
            </div>
            {session.current ? null : (
              <form action={submitOne}>
                <input type="hidden" name="sessionId" value={session.id} />
                <SubmitButton kind="default" size="small" pending="Ending …">
                  End<VisuallyHidden> the session of {session.browser}</VisuallyHidden>
                </SubmitButton>
              </form>
            )}
          </li>
        ))}
      </ul>
      <p className="mt-3 text-small text-ink-2">A session ends by itself eight hours after signing in.</p>
      {sessions.length > 1 ? (
        <form action={submitOthers} className="mt-4">
          <SubmitButton kind="default" size="small" pending="Ending …">
            End all others
          </SubmitButton>
        </form>
      ) : null}
    </section>
  );
}
