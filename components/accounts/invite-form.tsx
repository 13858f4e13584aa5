'use client';
import { useId } from 'react';
import { FormMessage } from './form-message';
import { RoleSelect } from './role-select';
import { SubmitButton } from './submit-button';
import { TextField } from './text-field';
import { useFormAction, type FormAction } from './use-form-action';

/** Invites one address with a role. */
export function InviteForm({ action, roles }: { action: FormAction; roles: readonly string[] }) {
  const [state, submit] = useFormAction(action);
  const roleId = useId();
  return (
    <form action={submit} className="grid gap-4">
      <FormMessage state={state} />
      <div className="grid items-start gap-4 book:grid-cols-2">
        <TextField
          label="E-mail"
          name="email"
          type="email"
          autoComplete="off"
          required
          maxLength={254}
          defaultValue={state.values.email}
          problem={state.fieldMessages.email}
        />
        <div className="grid gap-1">
          <label htmlFor={roleId} className="text-small font-semibold">
            Role
          </label>
          {/* React resets a select to its first render; the key makes the kept choice its first. */}
          <RoleSelect
            key={state.values.role ?? 'none'}
            id={roleId}
            roles={roles}
            defaultValue={state.values.role ?? 'experimentalist'}
          />
        </div>
        <div>
          <SubmitButton pending="Sending …">Send invitation</SubmitButton>
        </div>
      </div>
    </form>
  );
}
