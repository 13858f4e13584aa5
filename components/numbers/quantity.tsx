import { classNames } from '@/components/ui/class-names';
import { Absent } from './absent';
import { formatUncertain, type UncertaintyNotation } from './format-uncertain';
import { Unit } from './unit';

export interface QuantityProps {
  /** null is printed as “absent”. */
  value: number | null;
  /** Same unit as the value; the page says whether it is standard or expanded. */
  uncertainty?: number | null;
  /** Plain text as for `Unit`; left out when the unit stands in the column head. */
  unit?: string;
  /** Decimals; left out, the uncertainty decides, or the number itself. */
  digits?: number;
  notation?: UncertaintyNotation;
  /** Prints value × 10^−p followed by × 10^p. */
  powerOfTen?: number;
  /** A limit instead of a value: "< 0.3". */
  bound?: 'below' | 'above';
  /** Weight of a number that is compared across the gutter. */
  strong?: boolean;
  absentWord?: string;
  className?: string;
}

/** A number with uncertainty and unit in the trade's notation: 2.083(5) Å, 4.87 ± 0.06 μB, −3480.762 348 Eh. */
export function Quantity({
  value,
  uncertainty = null,
  unit,
  digits,
  notation = 'plus-minus',
  powerOfTen,
  bound,
  strong = false,
  absentWord,
  className,
}: QuantityProps) {
  if (value === null) return <Absent word={absentWord} />;
  const scale = powerOfTen === undefined ? 1 : 10 ** -powerOfTen;
  const text = formatUncertain(
    value * scale,
    uncertainty === null ? null : uncertainty * scale,
    notation,
    digits,
  );
  const limit = bound === 'below' ? '<\u00a0' : bound === 'above' ? '>\u00a0' : '';
  const inParentheses = text.uncertainty !== null && notation === 'parentheses';
  return (
    <span className={classNames('whitespace-nowrap', className)}>
      <span className={strong ? 'font-semibold' : undefined}>
        {limit}
        {text.value}
        {inParentheses ? `(${text.uncertainty})` : null}
      </span>
      {text.uncertainty !== null && !inParentheses ? (
        <span className="font-normal">{`\u00a0±\u00a0${text.uncertainty}`}</span>
      ) : null}
      {powerOfTen === undefined ? null : (
        <>
          {'\u00a0×\u00a010'}
          <sup>{String(powerOfTen).replace('-', '−')}</sup>
        </>
      )}
      {unit === undefined ? null : (
        <span className="font-normal">
          {/^[°%′″]/.test(unit) && unit !== '%' ? '' : '\u00a0'}
          <Unit of={unit} />
        </span>
      )}
    </span>
  );
}
