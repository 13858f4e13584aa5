import Link from 'next/link';
import type { ReactNode } from 'react';

export interface SiftChoice {
  key: string;
  count: number;
  label: ReactNode;
  /** A small picture before the words, decorative. */
  picture?: ReactNode;
  current: boolean;
  /** Address of the sifted page; a list that lives in the client gives `onPick` to `Sift` instead. */
  href?: string;
}

const chip =
  'flex items-center gap-2 border py-1.5 pr-3 pl-2 text-small text-ink-2 no-underline hover:border-rule-strong';

/** Filter chips with counts: which rows are shown. */
export function Sift({
  label = 'Show only',
  choices,
  onPick,
}: {
  label?: string;
  choices: readonly SiftChoice[];
  onPick?: (key: string) => void;
}) {
  return (
    <div
      role="group"
      aria-label={label}
      className="flex flex-wrap items-center gap-x-1.5 gap-y-1 max-book:gap-0.5 print:hidden"
    >
      {choices.map((choice) => {
        const look = `${chip} ${choice.current ? 'border-ink bg-page hover:border-ink' : 'border-transparent'}`;
        const words = (
          <>
            {choice.picture}
            <span>
              <b className="font-semibold text-ink">{choice.count}</b> {choice.label}
            </span>
          </>
        );
        return choice.href === undefined ? (
          <button
            key={choice.key}
            type="button"
            aria-pressed={choice.current}
            onClick={() => onPick?.(choice.key)}
            className={look}
          >
            {words}
          </button>
        ) : (
          <Link
            key={choice.key}
            href={choice.href}
            scroll={false}
            aria-current={choice.current ? 'true' : undefined}
            className={look}
          >
            {words}
          </Link>
        );
      })}
    </div>
  );
}
