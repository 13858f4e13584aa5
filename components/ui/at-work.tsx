/** Three dots that breathe beside something in work; still for those who ask for less motion. */
export function AtWork({ label = 'in work' }: { label?: string }) {
  return (
    <span role="img" aria-label={label} className="inline-flex items-center gap-[5px]">
      {[0, 200, 400].map((delay) => (
        <span
          key={delay}
          className="size-[5px] rounded-full bg-ink motion-safe:animate-pulse"
          style={{ animationDelay: `${delay}ms` }}
        />
      ))}
    </span>
  );
}
