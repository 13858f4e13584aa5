import { Fragment, type ReactNode } from 'react';

/** Units whose symbol is itself a quantity: set in italics with an upright index. */
const quantitiesAsUnits: Record<string, ReactNode> = {
  muB: (
    <>
      <i>μ</i>
      <sub>B</sub>
    </>
  ),
  Eh: (
    <>
      <i>E</i>
      <sub>h</sub>
    </>
  ),
};

/**
 * A unit, typeset from plain text: "kJ mol-1", "cm3 mol-1", "muB" (Bohr magneton), "Eh" (hartree), "Angstrom".
 * Factors are parted by no-break spaces, exponents raised with a true minus.
 */
export function Unit({ of }: { of: string }) {
  return (
    <span className="whitespace-nowrap">
      {of.split(' ').map((factor, index) => {
        const named = quantitiesAsUnits[factor];
        const [, symbol = factor, exponent] = /^(.*?[^\d-])(-?\d+)$/.exec(factor) ?? [];
        return (
          <Fragment key={index}>
            {index > 0 ? '\u00a0' : null}
            {named ?? (symbol === 'Angstrom' ? 'Å' : symbol)}
            {exponent === undefined ? null : <sup>{exponent.replace('-', '−')}</sup>}
          </Fragment>
        );
      })}
    </span>
  );
}
