'use client';
import { FormMessage } from '@/components/accounts/form-message';
import { SubmitButton } from '@/components/accounts/submit-button';
import { useFormAction, type FormAction } from '@/components/accounts/use-form-action';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-area';

/** Replicates of an effective moment with what they were measured on, how, and at which temperature. */
export function MeasurementForm({
  action,
  techniques,
}: {
  action: FormAction;
  techniques: readonly string[];
}) {
  const [state, submit] = useFormAction(action);
  const field = (name: string, start = '') => ({
    name,
    defaultValue: state.values[name] ?? start,
    error: state.fieldMessages[name],
  });
  return (
    <form action={submit} className="grid max-w-[760px] gap-5" noValidate>
      <FormMessage state={state} />
      <div className="grid gap-5 book:grid-cols-2">
        <Field label="Sample" hint="A batch of this complex" {...field('sampleCode')} />
        <Select label="Technique" {...field('technique', 'susceptibility balance')}>
          {techniques.map((technique) => (
            <option key={technique}>{technique}</option>
          ))}
        </Select>
        <Field label="Temperature" unit="K" inputMode="decimal" {...field('temperatureK')} />
        <Field
          label="Standard uncertainty of the temperature"
          unit="K"
          inputMode="decimal"
          {...field('uTemperatureK', '0.5')}
        />
      </div>
      <TextArea
        label="Effective moments of the replicates, μB"
        hint="One a line, with point or comma. Nothing is dropped."
        rows={5}
        {...field('replicates')}
      />
      <Field
        label="Standard uncertainty that repeats do not show"
        hint="Calibration, diamagnetic correction, purity; k = 1"
        unit="μB"
        inputMode="decimal"
        {...field('uSystematicBohr')}
      />
      <div className="grid gap-5 book:grid-cols-2">
        <Field label="Measured on" type="date" {...field('measuredOn')} />
        <Field label="Reference" optional hint="Notebook page, paper, laboratory" {...field('reference')} />
      </div>
      <TextArea label="Note" optional rows={2} {...field('note')} />
      <label className="flex items-center gap-2 text-small">
        <input
          type="checkbox"
          name="coldIsMeant"
          value="yes"
          defaultChecked={state.values.coldIsMeant === 'yes'}
        />
        Measured cold (below 60 K)
      </label>
      <div>
        <SubmitButton pending="Saving …">Save the measurement</SubmitButton>
      </div>
    </form>
  );
}
