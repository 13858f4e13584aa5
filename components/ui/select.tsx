import { useId, type ReactNode, type Ref, type SelectHTMLAttributes } from 'react';
import { classNames } from './class-names';
import { controlClass, describedBy, FieldFrame, type FieldWords } from './field-frame';

export interface SelectProps extends SelectHTMLAttributes<HTMLSelectElement>, FieldWords {
  optional?: boolean;
  ref?: Ref<HTMLSelectElement>;
  /** <option> elements. */
  children: ReactNode;
}

/** A choice of one from a short list. */
export function Select({
  label,
  hint,
  error,
  optional,
  id: givenId,
  className,
  children,
  ...rest
}: SelectProps) {
  const ownId = useId();
  const id = givenId ?? ownId;
  return (
    <FieldFrame id={id} label={label} hint={hint} error={error} optional={optional}>
      <select
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, { label, hint, error })}
        className={classNames(controlClass, className)}
        {...rest}
      >
        {children}
      </select>
    </FieldFrame>
  );
}
