import { Fragment } from 'react';
import { classNames } from '@/components/ui/class-names';
import { parseFormula } from './parse-formula';

/** A chemical formula, typeset: `text="[CuCl4]2-"`. What it understands is said at `parseFormula`. */
export function Formula({ text, className }: { text: string; className?: string }) {
  return (
    <span className={classNames('font-serif tracking-normal whitespace-nowrap', className)}>
      {parseFormula(text).map((run, index) => {
        if (run.kind === 'sub') return <sub key={index}>{run.text}</sub>;
        if (run.kind === 'sup') return <sup key={index}>{run.text}</sup>;
        return <Fragment key={index}>{run.text}</Fragment>;
      })}
    </span>
  );
}
