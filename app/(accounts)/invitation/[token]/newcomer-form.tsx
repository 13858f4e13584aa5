'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { NewPasswordField } from '@/components/accounts/new-password-field';
import { SubmitButton } from '@/components/accounts/submit-button';
import { Field } from '@/components/ui/field';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function NewcomerForm({ action, email }: { action: FormAction; email: string }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <Field
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        defaultValue={state.values.name}
        error={state.fieldMessages.name}
      />
      <input type="email" autoComplete="username" value={email} readOnly hidden />
      <NewPasswordField error={state.fieldMessages.password} />
      <div>
        <SubmitButton pending="Joining …">Create the account and join</SubmitButton>
      </div>
    </form>
  );
}
