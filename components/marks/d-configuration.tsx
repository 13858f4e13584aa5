import { Fragment } from 'react';
import { dConfiguration } from './d-filling';

/** "t2g" → t with lowered 2g; a label of plain letters with primes keeps them. */
function LevelLabel({ text }: { text: string }) {
  const [, letter = text, index = '', primes = ''] = /^([a-z])([\dgu]*)([′″]?)$/.exec(text) ?? [];
  return (
    <>
      {letter}
      {index === '' ? null : <sub>{index}</sub>}
      {primes}
    </>
  );
}

/** A configuration in the trade's notation, for T-4 and OC-6 where it is in use: e² t₂³, t₂g⁶ eg². Else nothing. */
export function DConfiguration({
  geometry,
  dCount,
  multiplicity,
}: {
  geometry: string;
  dCount: number;
  multiplicity: number;
}) {
  if (geometry !== 'T-4' && geometry !== 'OC-6') return null;
  const levels = dConfiguration(geometry, dCount, multiplicity);
  if (levels === null) return null;
  return (
    <span className="whitespace-nowrap">
      {levels
        .filter(({ electrons }) => electrons > 0)
        .map(({ label, electrons }, index) => (
          <Fragment key={label}>
            {index > 0 ? ' ' : null}
            <LevelLabel text={label} />
            <sup>{electrons}</sup>
          </Fragment>
        ))}
    </span>
  );
}
