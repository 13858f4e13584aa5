/** The open book with one spin up on the left page, one down on the right. */
export function Wordmark() {
  return (
    <span className="flex items-center gap-2.5 font-serif text-complex leading-none font-medium tracking-[-0.01em] text-ink">
      <svg aria-hidden="true" width="30" height="22" viewBox="0 0 30 22" fill="none">
        <path
          className="stroke-ink"
          strokeWidth="1.4"
          d="M1 3.5C5.5 1.6 10 2 15 4.6C20 2 24.5 1.6 29 3.5V20C24.5 18.2 20 18.4 15 21C10 18.4 5.5 18.2 1 20Z"
        />
        <path className="stroke-calc" strokeWidth="1.7" d="M8.6 15.5V6.2L5.9 9.6" />
        <path className="stroke-meas" strokeWidth="1.7" d="M21.4 6.2V15.5L24.1 12.1" />
      </svg>
      Spinstead
    </span>
  );
}
