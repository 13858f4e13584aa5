export interface ElementMean {
  element: string;
  count: number;
  meanDistanceAngstrom: number;
  /** Sample standard deviation (n − 1); null for one distance. */
  standardDeviationAngstrom: number | null;
}

/** Mean metal–donor distance per donor element, elements by alphabet. */
export function distancesByElement(
  donors: readonly { element: string; distanceAngstrom: number }[],
): ElementMean[] {
  const elements = [...new Set(donors.map((donor) => donor.element))].sort();
  return elements.map((element) => {
    const distances = donors
      .filter((donor) => donor.element === element)
      .map((donor) => donor.distanceAngstrom);
    const count = distances.length;
    const mean = distances.reduce((sum, d) => sum + d, 0) / count;
    const squares = distances.reduce((sum, d) => sum + (d - mean) ** 2, 0);
    return {
      element,
      count,
      meanDistanceAngstrom: mean,
      standardDeviationAngstrom: count > 1 ? Math.sqrt(squares / (count - 1)) : null,
    };
  });
}
