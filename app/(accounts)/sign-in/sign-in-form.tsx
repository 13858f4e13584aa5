'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { SubmitButton } from '@/components/accounts/submit-button';
import { Field } from '@/components/ui/field';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function SignInForm({ action, to }: { action: FormAction; to: string }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <input type="hidden" name="to" value={to} />
      <Field
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        required
        maxLength={254}
        defaultValue={state.values.email}
      />
      <Field label="Password" name="password" type="password" autoComplete="current-password" required />
      <div>
        <SubmitButton pending="Signing in …">Sign in</SubmitButton>
      </div>
    </form>
  );
}
