import { shortestPassword } from '@/lib/access/password-rules';
import { TextField } from './text-field';

/** The field for a password that is being chosen; asked once, since it can be set anew by e-mail. */
export function NewPasswordField({ problem, label = 'Password' }: { problem?: string; label?: string }) {
  return (
    <TextField
      label={label}
      name="password"
      type="password"
      autoComplete="new-password"
      required
      hint={`At least ${shortestPassword} characters; a sentence will do.`}
      problem={problem}
    />
  );
}
