import { useId, type InputHTMLAttributes, type ReactNode, type Ref } from 'react';
import { classNames } from './class-names';
import { controlClass, describedBy, FieldFrame, type FieldWords } from './field-frame';

export interface FieldProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'size'>, FieldWords {
  /** Unit, or uncertainty with unit, inside the frame at the right: "cm", "± 0.0002 g". Figures align to it. */
  unit?: ReactNode;
  optional?: boolean;
  ref?: Ref<HTMLInputElement>;
}

/** One line of text or a number. Takes the props of <input>, also those of react-hook-form's `register`. */
export function Field({ label, hint, error, unit, optional, id: givenId, className, ...rest }: FieldProps) {
  const ownId = useId();
  const id = givenId ?? ownId;
  const input = (
    <input
      id={id}
      aria-invalid={error ? true : undefined}
      aria-describedby={
        classNames(describedBy(id, { label, hint, error }), unit !== undefined && `${id}-unit`) || undefined
      }
      inputMode={unit === undefined ? undefined : 'decimal'}
      className={classNames(
        controlClass,
        unit !== undefined && 'min-w-0 rounded-r-none border-r-0 text-right',
        className,
      )}
      {...rest}
    />
  );
  return (
    <FieldFrame id={id} label={label} hint={hint} error={error} optional={optional}>
      {unit === undefined ? (
        input
      ) : (
        <span className="flex">
          {input}
          <span
            id={`${id}-unit`}
            className={classNames(
              'rounded-r border border-l-0 bg-page py-2 pr-2.5 pl-1 text-body leading-[1.3] whitespace-nowrap text-ink-3',
              error ? 'border-b-2 border-dissent' : 'border-rule-strong',
            )}
          >
            {unit}
          </span>
        </span>
      )}
    </FieldFrame>
  );
}
