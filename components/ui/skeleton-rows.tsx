/** Bars where rows will stand while a page is being read; the words say what is awaited. */
export function SkeletonRows({ rows = 3, label = 'Loading' }: { rows?: number; label?: string }) {
  const widths = ['w-[86%]', 'w-[64%]', 'w-[74%]', 'w-[91%]', 'w-[58%]'];
  return (
    <div role="status" aria-busy="true" className="grid content-start gap-[9px] py-2">
      <span className="sr-only">{label}</span>
      {Array.from({ length: rows }, (_, index) => (
        <span
          key={index}
          aria-hidden="true"
          className={`block h-2.5 bg-rule motion-safe:animate-pulse ${widths[index % widths.length]}`}
        />
      ))}
    </div>
  );
}
