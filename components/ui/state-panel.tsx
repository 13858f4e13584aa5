import type { ReactNode } from 'react';

/** The frame of empty, error and loading states: picture, title, what it means, what to do. */
export function StatePanel({
  picture,
  title,
  children,
  actions,
  level = 2,
  ...rest
}: {
  picture?: ReactNode;
  title: ReactNode;
  children?: ReactNode;
  actions?: ReactNode;
  level?: 1 | 2 | 3;
  role?: string;
  'aria-busy'?: boolean;
}) {
  const Heading = `h${level}` as const;
  return (
    <div className="max-w-[62ch]" {...rest}>
      {picture}
      <Heading className="mt-3.5 mb-1.5 text-part">{title}</Heading>
      {children === undefined ? null : (
        <div className="mb-3.5 text-small text-pretty text-ink-2">{children}</div>
      )}
      {actions === undefined ? null : <div className="flex flex-wrap items-center gap-3">{actions}</div>}
    </div>
  );
}
