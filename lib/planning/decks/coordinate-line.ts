import type { Vector3 } from '../../chemistry/structure';

/** "Fe        1.90641800    0.00000000   -1.25058800": symbol, then x, y, z in Å; eight decimals, never −0. */
export function coordinateLine(symbol: string, position: Vector3): string {
  const numbers = position.map((value) => {
    const text = value.toFixed(8);
    return (/^-0\.0+$/.test(text) ? text.slice(1) : text).padStart(15);
  });
  return symbol.padEnd(3) + numbers.join('');
}

/** One coordinate line per atom. */
export const coordinateLines = (elements: readonly string[], positions: readonly Vector3[]): string[] =>
  positions.map((position, index) => coordinateLine(elements[index] ?? 'X', position));
