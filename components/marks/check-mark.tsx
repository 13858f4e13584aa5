/** State of a check: a tick, three dots, a broken ring, or the broken thread for one that fails. */
export type CheckState = 'holds' | 'fails' | 'cannot tell' | 'not evaluated';

/** The picture of a check's state, with its word for screen readers. */
export function CheckMark({ state }: { state: CheckState }) {
  return (
    <svg
      role="img"
      aria-label={state}
      width="16"
      height="16"
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      className={`block ${state === 'fails' ? 'text-dissent' : 'text-ink'}`}
    >
      <title>{state}</title>
      {state === 'holds' ? <path strokeWidth="2" d="M2.5 8.5L6.5 12.5L14 3.5" /> : null}
      {state === 'fails' ? <path strokeWidth="2.2" d="M0 8H6L9 3.5M16 8H10L7 12.5" /> : null}
      {state === 'not evaluated' ? (
        <circle cx="8" cy="8" r="5.6" strokeWidth="1.6" strokeDasharray="2.6 2.2" />
      ) : null}
      {state === 'cannot tell' ? (
        <path strokeWidth="2.6" strokeLinecap="round" strokeDasharray="0 4.7" d="M1.5 8H15" />
      ) : null}
    </svg>
  );
}
