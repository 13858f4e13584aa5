'use client';
import { Select } from '@/components/ui/select';
import { FormMessage } from './form-message';
import { RoleOptions } from './role-options';
import { SubmitButton } from './submit-button';
import { Field } from '@/components/ui/field';
import { useFormAction, type FormAction } from './use-form-action';

/** Invites one address with a role. */
export function InviteForm({ action, roles }: { action: FormAction; roles: readonly string[] }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-4">
      <FormMessage state={state} />
      <div className="grid items-start gap-4 book:grid-cols-2">
        <Field
          label="E-mail"
          name="email"
          type="email"
          autoComplete="off"
          required
          maxLength={254}
          defaultValue={state.values.email}
          error={state.fieldMessages.email}
        />
        {/* React resets a select to its first render; the key makes the kept choice its first. */}
        <Select
          key={state.values.role ?? 'none'}
          label="Role"
          name="role"
          defaultValue={state.values.role ?? 'experimentalist'}
        >
          <RoleOptions roles={roles} />
        </Select>
        <div>
          <SubmitButton pending="Sending …">Send invitation</SubmitButton>
        </div>
      </div>
    </form>
  );
}
