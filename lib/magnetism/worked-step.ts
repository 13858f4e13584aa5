/** A quantity that enters a calculation from outside: a reading, a constant with uncertainty, a molar mass. */
export interface InputQuantity {
  /** Name by which steps refer to it, unit included, e.g. massGram */
  key: string;
  symbol: string;
  label: string;
  value: number;
  /** Standard uncertainty in the unit of the value; null when none was stated (counts as exact, with a warning) */
  u: number | null;
  /** Degrees of freedom behind u: n − 1 for replicates, null for a stated u (taken as well known) */
  degreesOfFreedom: number | null;
  unit: string;
  source: string;
}

/** Looks up an input or an earlier step by its key. */
export type At = (key: string) => number;

/** One line of a worked calculation before it is evaluated. */
export interface StepDefinition {
  key: string;
  symbol: string;
  /** The formula in symbols */
  expression: string;
  /** The same formula with numbers put in */
  numbers: (at: At) => string;
  unit: string;
  source: string;
  /** NaN where the formula has no real value (the root of a negative number) */
  evaluate: (at: At) => number;
}

/** One line of a worked calculation as shown: null where there is no real value. */
export interface WorkedStep {
  key: string;
  symbol: string;
  expression: string;
  numbers: string;
  value: number | null;
  unit: string;
  /** Standard uncertainty from all inputs by derivatives; null without a value */
  u: number | null;
  source: string;
}
