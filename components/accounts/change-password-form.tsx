'use client';
import { FormMessage } from './form-message';
import { NewPasswordField } from './new-password-field';
import { SubmitButton } from './submit-button';
import { Field } from '@/components/ui/field';
import { useFormAction, type FormAction } from './use-form-action';

export function ChangePasswordForm({ action, email }: { action: FormAction; email: string }) {
  const [state, submit] = useFormAction(action);
  return (
    <section aria-labelledby="change-password">
      <h2 id="change-password" className="mb-4 border-b-2 border-ink pb-2 text-section">
        Password
      </h2>
      <form action={submit} className="grid max-w-[420px] gap-5">
        <FormMessage state={state} />
        {/* Tells a password manager whose password this is. */}
        <input type="email" autoComplete="username" value={email} readOnly hidden />
        <Field
          label="Present password"
          name="presentPassword"
          type="password"
          autoComplete="current-password"
          required
          error={state.fieldMessages.presentPassword}
        />
        <NewPasswordField label="New password" error={state.fieldMessages.password} />
        <div>
          <SubmitButton pending="Changing …">Change the password</SubmitButton>
        </div>
      </form>
    </section>
  );
}
