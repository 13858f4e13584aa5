'use client';
import { FormMessage } from './form-message';
import { SubmitButton } from './submit-button';
import { TextField } from './text-field';
import { useFormAction, type FormAction } from './use-form-action';

/** Takes a person out of the group, after their name was typed: it cannot be undone, only begun again. */
export function RemoveMember({
  member,
  action,
}: {
  member: { userId: string; name: string };
  action: FormAction;
}) {
  const [state, submit] = useFormAction(action);
  return (
    <details className="text-small">
      <summary className="w-max text-ink-2 underline decoration-rule-strong underline-offset-3">
        Remove<span className="sr-only"> {member.name}</span> …
      </summary>
      <form action={submit} className="mt-2 grid gap-3 border-l-2 border-rule-strong pl-3">
        <p>
          {member.name} loses access at once. What they uploaded, measured and wrote stays, under their name.
        </p>
        <input type="hidden" name="userId" value={member.userId} />
        <TextField
          label={`Type “${member.name}” to remove them`}
          name="typedName"
          autoComplete="off"
          required
          defaultValue={state.values.typedName}
          problem={state.fieldMessages.typedName}
        />
        <FormMessage state={state} />
        <div>
          <SubmitButton kind="plain" pending="Removing …">
            Remove {member.name}
          </SubmitButton>
        </div>
      </form>
    </details>
  );
}
