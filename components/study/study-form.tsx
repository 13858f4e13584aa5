'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { SubmitButton } from '@/components/accounts/submit-button';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';
import { Field } from '@/components/ui/field';
import { TextArea } from '@/components/ui/text-area';

export function StudyForm({ action }: { action: FormAction }) {
  const [state, submit] = useFormAction(action);
  return (
    <form action={submit} className="grid max-w-[640px] gap-5" noValidate>
      <FormMessage state={state} />
      <Field label="Title" name="title" defaultValue={state.values.title} error={state.fieldMessages.title} />
      <TextArea
        label="Question"
        optional
        name="question"
        rows={3}
        defaultValue={state.values.question}
        error={state.fieldMessages.question}
      />
      <div>
        <SubmitButton pending="Creating …">Create the study</SubmitButton>
      </div>
    </form>
  );
}
