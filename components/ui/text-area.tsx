import { useId, type Ref, type TextareaHTMLAttributes } from 'react';
import { classNames } from './class-names';
import { controlClass, describedBy, FieldFrame, type FieldWords } from './field-frame';

export interface TextAreaProps extends TextareaHTMLAttributes<HTMLTextAreaElement>, FieldWords {
  optional?: boolean;
  ref?: Ref<HTMLTextAreaElement>;
}

/** Text of several lines. */
export function TextArea({
  label,
  hint,
  error,
  optional,
  id: givenId,
  rows = 3,
  className,
  ...rest
}: TextAreaProps) {
  const ownId = useId();
  const id = givenId ?? ownId;
  return (
    <FieldFrame id={id} label={label} hint={hint} error={error} optional={optional}>
      <textarea
        id={id}
        rows={rows}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, { label, hint, error })}
        className={classNames(controlClass, className)}
        {...rest}
      />
    </FieldFrame>
  );
}
