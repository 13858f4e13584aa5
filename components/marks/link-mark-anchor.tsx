import Link from 'next/link';
import { LinkMark, linkMarkSentence, type LinkMarkKind } from './link-mark';

/**
 * A link mark that leads somewhere. Its words appear under it while the pointer rests on it or the keyboard
 * stands on it.
 */
export function LinkMarkAnchor({
  kind,
  href,
  width,
  sentence,
  subject,
}: {
  kind: LinkMarkKind;
  href: string;
  width?: number;
  sentence?: string;
  /** Whose mark it is, read before the words: "Mn dry". */
  subject?: string;
}) {
  const words = sentence ?? linkMarkSentence(kind);
  return (
    <Link
      href={href}
      aria-label={subject === undefined ? words : `${subject}, ${words}`}
      className="group/mark relative inline-grid place-items-center py-1 no-underline"
    >
      <LinkMark kind={kind} width={width} decorative />
      <span
        aria-hidden="true"
        className="pointer-events-none absolute top-full z-10 hidden w-44 border border-ink bg-page px-2 py-1 text-center text-note text-ink group-hover/mark:block group-focus-visible/mark:block"
      >
        {words}
      </span>
    </Link>
  );
}
