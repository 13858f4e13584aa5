import type { ReactNode } from 'react';

const symbols = {
  muEff: (
    <>
      <i>μ</i>
      <sub>eff</sub>
    </>
  ),
  mu: <i>μ</i>,
  unpaired: <i>n</i>,
  tau4: (
    <>
      τ<sub>4</sub>
    </>
  ),
  tau4Prime: (
    <>
      τ<sub>4</sub>′
    </>
  ),
  tau5: (
    <>
      τ<sub>5</sub>
    </>
  ),
  chiG: (
    <>
      <i>χ</i>
      <sub>g</sub>
    </>
  ),
  chiM: (
    <>
      <i>χ</i>
      <sub>M</sub>
    </>
  ),
  chiMCorrected: (
    <>
      <i>χ</i>
      <sub>M</sub>′
    </>
  ),
  s2: (
    <>
      ⟨<i>S</i>
      <sup>2</sup>⟩
    </>
  ),
  deltaE: (
    <>
      Δ<i>E</i>
    </>
  ),
  baur: <i>D</i>,
  coverage: <i>k</i>,
} satisfies Record<string, ReactNode>;

export type QuantityName = keyof typeof symbols;

/** The symbol of a quantity, set as the trade sets it: italic letter, upright index. */
export function QuantitySymbol({ of }: { of: QuantityName }) {
  return <span className="font-sans whitespace-nowrap">{symbols[of]}</span>;
}
