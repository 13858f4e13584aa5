'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { SubmitButton } from '@/components/accounts/submit-button';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';
import { Field } from '@/components/ui/field';

export function ComplexForm({ action }: { action: FormAction }) {
  const [state, submit] = useFormAction(action);
  const field = (name: string, start = '') => ({
    name,
    defaultValue: state.values[name] ?? start,
    error: state.fieldMessages[name],
  });
  return (
    <form action={submit} className="grid max-w-[560px] gap-5" noValidate>
      <FormMessage state={state} />
      <Field
        label="Formula with charge"
        hint="[CuCl4]2-, [Fe(OH2)6]2+; outputs are matched by its composition and charge"
        {...field('formula')}
      />
      <Field label="Oxidation state of the metal" inputMode="numeric" {...field('oxidationState', '2')} />
      <Field label="Name" optional {...field('name')} />
      <Field label="Section of the ledger" optional hint="for example: Dry salts" {...field('section')} />
      <div>
        <SubmitButton pending="Adding …">Add the complex</SubmitButton>
      </div>
    </form>
  );
}
