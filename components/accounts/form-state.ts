/** What an action tells its form. The form keeps the values, so that nothing typed is lost. */
export interface FormState {
  status: 'idle' | 'failed' | 'done';
  /** Said above the fields. */
  message: string | null;
  /** Said beside a field, by its name. */
  fieldMessages: Readonly<Record<string, string>>;
  /** What was typed, by field name; never a password. */
  values: Readonly<Record<string, string>>;
}

export const idleForm: FormState = { status: 'idle', message: null, fieldMessages: {}, values: {} };

export function failedForm(
  message: string | null,
  values: FormState['values'] = {},
  fieldMessages: FormState['fieldMessages'] = {},
): FormState {
  return { status: 'failed', message, fieldMessages, values };
}

export function doneForm(message: string | null): FormState {
  return { status: 'done', message, fieldMessages: {}, values: {} };
}
