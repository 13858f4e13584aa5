import type { Quantity } from './quantity-schema';
import type { InputQuantity } from './worked-step';

/** A field of a form as an input of the worked calculation. */
export function quantityInput(
  key: string,
  symbol: string,
  label: string,
  quantity: Quantity,
  unit: string,
  source = 'entered',
): InputQuantity {
  return { key, symbol, label, ...quantity, unit, source };
}

/** A constant without uncertainty worth propagating. */
export const exact = (value: number): Quantity => ({ value, u: 0, degreesOfFreedom: null });
