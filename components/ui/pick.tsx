import type { InputHTMLAttributes, ReactNode, Ref } from 'react';

export interface PickProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'type'> {
  /** `checkbox` picks several, `radio` one. */
  type?: 'checkbox' | 'radio';
  ref?: Ref<HTMLInputElement>;
  children: ReactNode;
}

/** One choice of a set, framed when picked; put several in a <fieldset> with a <legend>. */
export function Pick({ type = 'checkbox', children, ...rest }: PickProps) {
  return (
    <label className="flex cursor-pointer items-center gap-2 border border-rule-strong py-[5px] pr-3 pl-2.5 text-small has-checked:border-ink has-checked:outline has-checked:outline-1 has-checked:-outline-offset-2 has-checked:outline-ink has-focus-visible:outline-2 has-focus-visible:outline-offset-3 has-focus-visible:outline-focus">
      <input type={type} className="m-0 size-[15px] accent-ink focus-visible:outline-none" {...rest} />
      {children}
    </label>
  );
}
