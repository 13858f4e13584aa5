/** First stop of the keyboard on every page; `target` is the id of the main region. */
export function SkipLink({ target = 'main' }: { target?: string }) {
  return (
    <a
      href={`#${target}`}
      className="absolute left-2 -top-16 z-20 bg-ink px-3.5 py-2 text-page no-underline focus:top-2"
    >
      Skip to content
    </a>
  );
}
