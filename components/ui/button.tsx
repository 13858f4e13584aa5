import type { ButtonHTMLAttributes, ReactNode } from 'react';
import { classNames } from './class-names';

export type ButtonKind = 'main' | 'default' | 'quiet' | 'danger';

const base =
  'inline-flex items-center justify-center gap-2 rounded border py-2 text-[0.9375rem] leading-[1.2] transition-colors duration-100 active:translate-y-px motion-reduce:transition-none';

const kinds: Record<ButtonKind, string> = {
  main: 'px-4 font-semibold no-underline border-ink bg-ink text-page hover:bg-ink-2',
  default: 'px-4 font-semibold no-underline border-ink bg-transparent text-ink hover:bg-page-sunk',
  danger: 'px-4 font-semibold no-underline border-dissent bg-transparent text-dissent hover:bg-dissent-tint',
  quiet:
    'border-transparent px-1.5 font-normal text-ink underline decoration-rule-strong underline-offset-[3px] hover:decoration-current',
};

const off =
  'disabled:cursor-not-allowed disabled:border-dashed disabled:border-rule-strong disabled:bg-transparent disabled:text-ink-3 disabled:active:translate-y-0';

/** The look of a button, for links that do a button's work. */
export function buttonClass(kind: ButtonKind = 'default', size: 'normal' | 'small' = 'normal'): string {
  return classNames(base, kinds[kind], off, size === 'small' ? 'min-h-[34px]' : 'min-h-[38px]');
}

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  kind?: ButtonKind;
  size?: 'normal' | 'small';
  /** Work is under way: the button stays in place, is not pressed twice, and says so. */
  busy?: boolean;
  children: ReactNode;
}

export function Button({
  kind,
  size,
  busy = false,
  disabled,
  type = 'button',
  className,
  children,
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      disabled={disabled ?? busy}
      aria-busy={busy || undefined}
      className={classNames(buttonClass(kind, size), className)}
      {...rest}
    >
      {children}
    </button>
  );
}
