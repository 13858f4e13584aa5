import { VisuallyHidden } from '@/components/ui/visually-hidden';
import { SubmitButton } from './submit-button';

interface DemoAccountsProps {
  accounts: readonly { name: string; email: string; role: string; password: string }[];
  action: (form: FormData) => Promise<void>;
  to: string;
}

/** The accounts of the invented group, one button each. Shown in demo mode only. */
export function DemoAccounts({ accounts, action, to }: DemoAccountsProps) {
  return (
    <section
      aria-labelledby="demo-accounts"
      className="max-book:border-t-2 max-book:border-ink max-book:pt-5"
    >
      <h2 id="demo-accounts" className="text-section">
        Demo accounts
      </h2>
      <p className="mt-2 mb-4 text-ink-2">
        This is a demonstration: the group, its people and its measurements are invented, and everybody who
        can open this page can sign in. Keep nothing here.
      </p>
      <ul>
        {accounts.map((account) => (
          <li
            key={account.email}
            className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-t border-rule py-3"
          >
            <div className="min-w-0">
              <p className="font-semibold">
                {account.name} <span className="font-normal text-ink-2">· {account.role}</span>
              </p>
              <p className="text-small text-ink-2">
                {account.email} · <code className="font-mono text-note">{account.password}</code>
              </p>
            </div>
            <form action={action}>
              <input type="hidden" name="email" value={account.email} />
              <input type="hidden" name="to" value={to} />
              <SubmitButton kind="default" size="small" pending="Signing in …">
                <VisuallyHidden>Sign in as {account.name}, </VisuallyHidden>
                <span aria-hidden="true">Sign in</span>
                <VisuallyHidden>{account.role}</VisuallyHidden>
              </SubmitButton>
            </form>
          </li>
        ))}
      </ul>
    </section>
  );
}
