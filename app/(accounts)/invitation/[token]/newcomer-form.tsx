'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { NewPasswordField } from '@/components/accounts/new-password-field';
import { SubmitButton } from '@/components/accounts/submit-button';
import { TextField } from '@/components/accounts/text-field';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function NewcomerForm({ action, email }: { action: FormAction; email: string }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        defaultValue={state.values.name}
        problem={state.fieldMessages.name}
      />
      <input type="email" autoComplete="username" value={email} readOnly hidden />
      <NewPasswordField problem={state.fieldMessages.password} />
      <div>
        <SubmitButton pending="Joining …">Create the account and join</SubmitButton>
      </div>
    </form>
  );
}
