import 'server-only';
import type { z } from 'zod';
import { failedForm, type FormState } from '@/components/accounts/form-state';
import { typedValues } from '@/components/accounts/typed-values';
import { err, ok, type Result } from '@/lib/result';

/** A form's fields through a schema, or the state that shows what is wrong beside each field. */
export function readForm<T>(schema: z.ZodType<T>, form: FormData): Result<T, FormState> {
  const typed = Object.fromEntries([...form].filter(([, value]) => typeof value === 'string'));
  const parsed = schema.safeParse(typed);
  if (parsed.success) return ok(parsed.data);
  const messages: Record<string, string> = {};
  for (const issue of parsed.error.issues) messages[String(issue.path[0] ?? '')] ??= issue.message;
  return err(failedForm('Something is missing or cannot be used; see below.', typedValues(form), messages));
}
