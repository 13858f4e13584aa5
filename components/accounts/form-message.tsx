import type { FormState } from './form-state';

/** The outcome of a form, spoken as soon as it is there. */
export function FormMessage({ state }: { state: Pick<FormState, 'status' | 'message'> }) {
  return (
    <div aria-live="polite" className="empty:absolute">
      {state.message ? (
        <p
          className={
            state.status === 'failed'
              ? 'border-l-4 border-dissent bg-dissent-tint px-3 py-2 text-ink'
              : 'border-l-4 border-ink bg-page-sunk px-3 py-2'
          }
        >
          {state.message}
        </p>
      ) : null}
    </div>
  );
}
