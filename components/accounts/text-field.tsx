import { useId, type InputHTMLAttributes } from 'react';

interface TextFieldProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'id' | 'className'> {
  label: string;
  name: string;
  hint?: string;
  /** What is wrong with the value. */
  problem?: string;
}

/** A labelled line of text, with its hint and what is wrong with it. */
export function TextField({ label, hint, problem, ...input }: TextFieldProps) {
  const id = useId();
  const said = [hint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ');
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="text-small font-semibold">
        {label}
      </label>
      <input
        {...input}
        id={id}
        aria-invalid={problem ? true : undefined}
        aria-describedby={said || undefined}
        className={`w-full border-0 border-b bg-page-sunk px-2 min-h-10 text-body text-ink ${problem ? 'border-b-2 border-dissent' : 'border-rule-strong'}`}
      />
      {problem ? (
        <p id={`${id}-problem`} role="alert" className="text-small text-dissent">
          {problem}
        </p>
      ) : null}
      {hint ? (
        <p id={`${id}-hint`} className="text-small text-ink-3">
          {hint}
        </p>
      ) : null}
    </div>
  );
}
