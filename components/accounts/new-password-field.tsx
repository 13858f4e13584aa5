import { Field } from '@/components/ui/field';
import { shortestPassword } from '@/lib/access/password-rules';

/** The field for a password that is being chosen; asked once, since it can be set anew by e-mail. */
export function NewPasswordField({ error, label = 'Password' }: { error?: string; label?: string }) {
  return (
    <Field
      label={label}
      name="password"
      type="password"
      autoComplete="new-password"
      required
      hint={`At least ${shortestPassword} characters; a sentence will do.`}
      error={error}
    />
  );
}
