'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { NewPasswordField } from '@/components/accounts/new-password-field';
import { SubmitButton } from '@/components/accounts/submit-button';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function NewPasswordForm({ action, email }: { action: FormAction; email: string }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      {/* Tells a password manager whose password this is. */}
      <input type="email" autoComplete="username" value={email} readOnly hidden />
      <NewPasswordField label="New password" error={state.fieldMessages.password} />
      <div>
        <SubmitButton pending="Setting …">Set the password</SubmitButton>
      </div>
    </form>
  );
}
