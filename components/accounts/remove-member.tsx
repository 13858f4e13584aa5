'use client';
import { VisuallyHidden } from '@/components/ui/visually-hidden';
import { FormMessage } from './form-message';
import { SubmitButton } from './submit-button';
import { Disclosure } from '@/components/ui/disclosure';
import { Field } from '@/components/ui/field';
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
    <Disclosure
      summary={
        <span>
          Remove<VisuallyHidden> {member.name}</VisuallyHidden> …
        </span>
      }
    >
      <form action={submit} className="grid gap-3 border-l-2 border-rule-strong pl-3">
        <p className="text-small">
          {member.name} loses access at once. What they uploaded, measured and wrote stays, under their name.
        </p>
        <input type="hidden" name="userId" value={member.userId} />
        <Field
          label={`Type “${member.name}” to remove them`}
          name="typedName"
          autoComplete="off"
          required
          defaultValue={state.values.typedName}
          error={state.fieldMessages.typedName}
        />
        <FormMessage state={state} />
        <div>
          <SubmitButton kind="danger" size="small" pending="Removing …">
            Remove {member.name}
          </SubmitButton>
        </div>
      </form>
    </Disclosure>
  );
}
