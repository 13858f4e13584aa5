import type { ReactNode } from 'react';

export interface OutputExcerptProps {
  file: string;
  /** 1-based line that the value was read from. */
  line: number;
  /** Lines of the whole file. */
  lineCount: number;
  /** Lines of the output around it; the first one is line `firstLine`. */
  lines: readonly string[];
  firstLine: number;
  sha256?: string;
  /** Why this line and no other. */
  reason?: ReactNode;
  actions?: ReactNode;
}

const grouped = (value: number) => String(value).replace(/\B(?=(\d{3})+$)/g, value > 9999 ? '\u2009' : '');

/** The lines of an output around the one a number was read from. */
export function OutputExcerpt({
  file,
  line,
  lineCount,
  lines,
  firstLine,
  sha256,
  reason,
  actions,
}: OutputExcerptProps) {
  return (
    <figure className="border border-ink bg-page">
      <figcaption className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule px-3.5 py-2 text-note text-ink-2">
        <span>
          <b className="font-semibold text-ink">{file}</b> line {grouped(line)} of {grouped(lineCount)}
        </span>
        {sha256 === undefined ? null : (
          <span className="text-ink-3" title={sha256}>
            SHA-256 {sha256.slice(0, 8)}…{sha256.slice(-4)}
          </span>
        )}
      </figcaption>
      <pre
        tabIndex={0}
        className="overflow-x-auto bg-page-sunk py-2 font-mono text-[0.78125rem] leading-[1.55] max-book:text-[0.65625rem]"
      >
        {lines.map((text, index) => {
          const number = firstLine + index;
          const row = (
            <>
              <span className="inline-block w-[58px] pr-3.5 text-right text-ink-3 select-none max-book:w-10 max-book:pr-1.5">
                {number}
              </span>
              {text}
              {'\n'}
            </>
          );
          return number === line ? (
            <mark key={number} className="block border-l-[3px] border-calc bg-calc-tint text-ink">
              {row}
            </mark>
          ) : (
            <span key={number} className="block border-l-[3px] border-transparent">
              {row}
            </span>
          );
        })}
      </pre>
      {reason === undefined && actions === undefined ? null : (
        <div className="flex flex-wrap justify-between gap-x-4 border-t border-rule px-3.5 py-2 text-note text-ink-2">
          <span>{reason}</span>
          {actions}
        </div>
      )}
    </figure>
  );
}
