'use client';
import { VisuallyHidden } from '@/components/ui/visually-hidden';
import { FormMessage } from './form-message';
import { LocalTime } from './local-time';
import { SubmitButton } from './submit-button';
import { useFormAction, type FormAction } from './use-form-action';

interface OpenInvitationsProps {
  invitations: readonly {
    id: string;
    email: string;
    role: string;
    invitedAt: string;
    expiresAt: string;
    /** Whether the link has run out. */
    over: boolean;
  }[];
  withdraw: FormAction;
  sendAgain: FormAction;
}

/** The invitations that wait for an answer. */
export function OpenInvitations({ invitations, withdraw, sendAgain }: OpenInvitationsProps) {
  const [withdrawn, submitWithdraw] = useFormAction(withdraw);
  const [sent, submitAgain] = useFormAction(sendAgain);
  return (
    <section aria-labelledby="open-invitations" className="mt-8">
      <h3 id="open-invitations" className="mb-2 text-group">
        Waiting for an answer
      </h3>
      <FormMessage state={withdrawn} />
      <FormMessage state={sent} />
      {invitations.length === 0 ? <p className="text-ink-2">No invitation is open.</p> : null}
      <ul>
        {invitations.map(({ id, email, role, invitedAt, expiresAt, over }) => (
          <li
            key={id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-t border-rule py-3"
          >
            <div>
              <p>
                <span className="font-semibold">{email}</span> · {role}
              </p>
              <p className="text-small text-ink-2">
                invited <LocalTime iso={invitedAt} />, {over ? 'ran out' : 'works until'}{' '}
                <LocalTime iso={expiresAt} />
              </p>
            </div>
            <div className="flex gap-2">
              <form action={submitAgain}>
                <input type="hidden" name="invitationId" value={id} />
                <SubmitButton kind="default" size="small" pending="Sending …">
                  Send again<VisuallyHidden> to {email}</VisuallyHidden>
                </SubmitButton>
              </form>
              <form action={submitWithdraw}>
                <input type="hidden" name="invitationId" value={id} />
                <SubmitButton kind="default" size="small" pending="Withdrawing …">
                  Withdraw<VisuallyHidden> the invitation of {email}</VisuallyHidden>
                </SubmitButton>
              </form>
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
}
