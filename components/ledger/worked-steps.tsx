import type { ReactNode } from 'react';

export interface WorkedStep {
  key: string;
  symbol: ReactNode;
  formula: ReactNode;
  /** Value with unit and uncertainty. */
  value: ReactNode;
  /** Constants, corrections and where they come from. */
  source?: ReactNode;
}

/** A worked calculation from reading to result: symbol, formula, value, and what it stands on. */
export function WorkedSteps({ steps }: { steps: readonly WorkedStep[] }) {
  return (
    <ol>
      {steps.map((step) => (
        <li
          key={step.key}
          className="grid grid-cols-[52px_minmax(0,1fr)_auto] items-center gap-x-3.5 gap-y-px border-b border-rule py-2.5 last:border-rule-strong max-book:grid-cols-[40px_minmax(0,1fr)]"
        >
          <span className="row-span-2 text-complex max-book:row-span-3 max-book:self-start">
            {step.symbol}
          </span>
          <span className="text-[1rem]">{step.formula}</span>
          <span className="text-right text-meas max-book:col-start-2 max-book:text-left">{step.value}</span>
          {step.source === undefined ? null : (
            <span className="col-span-2 col-start-2 text-note text-ink-3 max-book:col-span-1">
              {step.source}
            </span>
          )}
        </li>
      ))}
    </ol>
  );
}
