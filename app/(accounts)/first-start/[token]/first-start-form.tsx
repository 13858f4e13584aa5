'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { NewPasswordField } from '@/components/accounts/new-password-field';
import { SubmitButton } from '@/components/accounts/submit-button';
import { TextField } from '@/components/accounts/text-field';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function FirstStartForm({ action }: { action: FormAction }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <TextField
        label="Name of the group"
        name="groupName"
        autoComplete="organization"
        required
        maxLength={120}
        defaultValue={state.values.groupName}
        problem={state.fieldMessages.groupName}
      />
      <TextField
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        defaultValue={state.values.name}
        problem={state.fieldMessages.name}
      />
      <TextField
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        required
        maxLength={254}
        defaultValue={state.values.email}
        problem={state.fieldMessages.email}
      />
      <NewPasswordField problem={state.fieldMessages.password} />
      <div>
        <SubmitButton pending="Opening …">Open the group</SubmitButton>
      </div>
    </form>
  );
}
