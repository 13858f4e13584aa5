import type { ReactNode } from 'react';

export type NoticeKind = 'info' | 'warning' | 'error';

const kinds: Record<NoticeKind, { frame: string; title: string; path: ReactNode }> = {
  info: {
    frame: 'border-rule-strong',
    title: 'text-ink',
    path: <path strokeWidth="2" d="M5 10H28M28 5.5V14.5" />,
  },
  warning: {
    frame: 'border-ink-2',
    title: 'text-ink',
    path: <path strokeWidth="2.6" strokeLinecap="round" strokeDasharray="0 6.25" d="M15.5 10H41" />,
  },
  error: {
    frame: 'border-dissent',
    title: 'text-dissent',
    path: <path strokeWidth="2.6" d="M5 10H22.5L27.5 2.5M51 10H33.5L28.5 17.5" />,
  },
};

/**
 * Something the reader should know here: what happened, where, and what to do.
 * An error that follows an action is announced at once (`live`), the others politely.
 */
export function Notice({
  kind = 'info',
  title,
  children,
  actions,
  live = false,
}: {
  kind?: NoticeKind;
  title: ReactNode;
  children?: ReactNode;
  actions?: ReactNode;
  live?: boolean;
}) {
  const { frame, title: titleClass, path } = kinds[kind];
  return (
    <div
      role={live ? (kind === 'error' ? 'alert' : 'status') : undefined}
      className={`grid grid-cols-[44px_minmax(0,1fr)] gap-x-4 border-l-[3px] bg-page-sunk py-3 pr-4 pl-3.5 ${frame}`}
    >
      <svg
        aria-hidden="true"
        viewBox="0 0 56 20"
        width="44"
        className={`mt-1 ${titleClass}`}
        fill="none"
        stroke="currentColor"
      >
        <circle cx="5" cy="10" r="3.6" fill="currentColor" stroke="none" />
        {kind === 'info' ? (
          <circle cx="51" cy="10" r="3.4" strokeWidth="1.5" />
        ) : (
          <circle cx="51" cy="10" r="3.6" fill="currentColor" stroke="none" />
        )}
        {path}
      </svg>
      <div>
        <p className={`font-semibold ${titleClass}`}>{title}</p>
        {children === undefined ? null : <div className="text-small text-ink-2">{children}</div>}
        {actions === undefined ? null : <div className="mt-2.5 flex flex-wrap gap-3">{actions}</div>}
      </div>
    </div>
  );
}
