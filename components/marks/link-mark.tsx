import { classNames } from '@/components/ui/class-names';

/** What one row says of its two sides; the word is `linkMarkWord`. */
export type LinkMarkKind = 'joined' | 'broken' | 'one-ended calculated' | 'one-ended measured' | 'dotted';

const sentences: Record<LinkMarkKind, string> = {
  joined: 'joined: calculated and measured agree',
  broken: 'broken: calculated and measured disagree',
  'one-ended calculated': 'one-ended: only the calculated side has a value',
  'one-ended measured': 'one-ended: only the measured side has a value',
  dotted: 'dotted: cannot tell, ranges overlap',
};

const inks: Record<LinkMarkKind, string> = {
  joined: 'text-ink',
  broken: 'text-dissent',
  'one-ended calculated': 'text-ink-2',
  'one-ended measured': 'text-ink-2',
  dotted: 'text-ink-2',
};

/** The mark in words: for screen readers, titles, mails and exports. */
export function linkMarkSentence(kind: LinkMarkKind): string {
  return sentences[kind];
}

function Thread({ kind }: { kind: LinkMarkKind }) {
  switch (kind) {
    case 'joined':
      return <path strokeWidth="2" d="M5 10H51" />;
    case 'broken':
      return (
        <>
          <path strokeWidth="2.6" strokeLinejoin="miter" d="M5 10H22.5L27.5 2.5" />
          <path strokeWidth="2.6" strokeLinejoin="miter" d="M51 10H33.5L28.5 17.5" />
        </>
      );
    case 'dotted':
      return <path strokeWidth="2.6" strokeLinecap="round" strokeDasharray="0 6.25" d="M15.5 10H41" />;
    case 'one-ended calculated':
    case 'one-ended measured':
      return <path strokeWidth="2" d="M5 10H28M28 5.5V14.5" />;
  }
}

export interface LinkMarkProps {
  kind: LinkMarkKind;
  /** Drawn width in px: 56 in the gutter, 44 in lists, 36 on phones. */
  width?: number;
  /** True beside a visible word, so that a screen reader hears it once. */
  decorative?: boolean;
  /** Says more than the kind alone, for example why the mark is broken. */
  sentence?: string;
  className?: string;
}

/**
 * The link between a calculated and a measured value: two pins and a thread, 56 × 20.
 * The shape tells the state; the colour only repeats it.
 */
export function LinkMark({ kind, width = 56, decorative = false, sentence, className }: LinkMarkProps) {
  const label = sentence ?? linkMarkSentence(kind);
  const oneEnded = kind.startsWith('one-ended');
  return (
    <svg
      viewBox="0 0 56 20"
      width={width}
      height={(width * 20) / 56}
      className={classNames('block shrink-0', inks[kind], className)}
      fill="none"
      stroke="currentColor"
      data-mark={kind}
      {...(decorative ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label })}
    >
      {decorative ? null : <title>{label}</title>}
      <g transform={kind === 'one-ended measured' ? 'matrix(-1 0 0 1 56 0)' : undefined}>
        <circle cx="5" cy="10" r="3.6" fill="currentColor" stroke="none" />
        {oneEnded ? (
          <circle cx="51" cy="10" r="3.4" strokeWidth="1.5" />
        ) : (
          <circle cx="51" cy="10" r="3.6" fill="currentColor" stroke="none" />
        )}
        <Thread kind={kind} />
      </g>
    </svg>
  );
}
