'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { NewPasswordField } from '@/components/accounts/new-password-field';
import { SubmitButton } from '@/components/accounts/submit-button';
import { Field } from '@/components/ui/field';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

export function FirstStartForm({ action }: { action: FormAction }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <Field
        label="Name of the group"
        name="groupName"
        autoComplete="organization"
        required
        maxLength={120}
        defaultValue={state.values.groupName}
        error={state.fieldMessages.groupName}
      />
      <Field
        label="Your name"
        name="name"
        autoComplete="name"
        required
        maxLength={120}
        defaultValue={state.values.name}
        error={state.fieldMessages.name}
      />
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
      <NewPasswordField error={state.fieldMessages.password} />
      <div>
        <SubmitButton pending="Opening …">Open the group</SubmitButton>
      </div>
    </form>
  );
}
