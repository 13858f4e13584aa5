'use client';
import { unstable_rethrow } from 'next/navigation';
import { useActionState } from 'react';
import { failedForm, idleForm, type FormState } from './form-state';
import { typedValues } from './typed-values';

export type FormAction = (previous: FormState, form: FormData) => Promise<FormState>;

/** A server action as a form's state. When the server cannot be reached, the form says so and keeps its text. */
export function useFormAction(action: FormAction) {
  return useActionState<FormState, FormData>(async (previous, form) => {
    try {
      return await action(previous, form);
    } catch (error) {
      unstable_rethrow(error); // a redirect, or a page that is missing or forbidden
      console.error(error);
      return failedForm(
        'The server could not be reached or failed. What you typed is kept; try again in a moment.',
        typedValues(form),
      );
    }
  }, idleForm);
}
