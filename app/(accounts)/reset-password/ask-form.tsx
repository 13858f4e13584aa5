'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { SubmitButton } from '@/components/accounts/submit-button';
import { Field } from '@/components/ui/field';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function AskForm({ action }: { action: FormAction }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <Field
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        required
        maxLength={254}
        defaultValue={state.values.email}
        error={state.fieldMessages.email}
      />
      <div>
        <SubmitButton pending="Sending …">Send the link</SubmitButton>
      </div>
    </form>
  );
}
