import type { ReactNode } from 'react';

/** A fraction set upright: numerator over denominator. */
export function Fraction({ over, under }: { over: ReactNode; under: ReactNode }) {
  return (
    <span className="inline-grid text-center align-middle leading-[1.2]">
      <span className="border-b border-ink px-1.5 pb-0.5">{over}</span>
      <span className="sr-only"> divided by </span>
      <span className="pt-px">{under}</span>
    </span>
  );
}
