'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { SubmitButton } from '@/components/accounts/submit-button';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';

/** One button that takes the invitation up, or the step before it. */
export function JoinForm({ action, label }: { action: FormAction; label: string }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid gap-5">
      <FormMessage state={state} />
      <div>
        <SubmitButton>{label}</SubmitButton>
      </div>
    </form>
  );
}
