/**
 * Pairs rows with columns of a square cost matrix so that the sum of costs is least.
 * Source: H. W. Kuhn, Nav. Res. Logist. Q. 1955, 2, 83, in the shortest-augmenting-path form; time grows with
 * the cube of the size.
 * @param cost - n × n, finite
 * @returns for each row its column
 */
export function assignment(cost: readonly (readonly number[])[]): number[] {
  const n = cost.length;
  const rowPotential = new Array<number>(n + 1).fill(0);
  const columnPotential = new Array<number>(n + 1).fill(0);
  const rowOf = new Array<number>(n + 1).fill(0);
  const cameFrom = new Array<number>(n + 1).fill(0);
  for (let row = 1; row <= n; row++) {
    rowOf[0] = row;
    let column = 0;
    const least = new Array<number>(n + 1).fill(Infinity);
    const done = new Array<boolean>(n + 1).fill(false);
    do {
      done[column] = true;
      const current = rowOf[column] ?? 0;
      let step = Infinity;
      let nextColumn = 0;
      for (let j = 1; j <= n; j++) {
        if (done[j]) continue;
        const reduced =
          (cost[current - 1]?.[j - 1] ?? 0) - (rowPotential[current] ?? 0) - (columnPotential[j] ?? 0);
        if (reduced < (least[j] ?? Infinity)) {
          least[j] = reduced;
          cameFrom[j] = column;
        }
        if ((least[j] ?? Infinity) < step) {
          step = least[j] ?? Infinity;
          nextColumn = j;
        }
      }
      for (let j = 0; j <= n; j++) {
        if (done[j]) {
          const r = rowOf[j] ?? 0;
          rowPotential[r] = (rowPotential[r] ?? 0) + step;
          columnPotential[j] = (columnPotential[j] ?? 0) - step;
        } else {
          least[j] = (least[j] ?? Infinity) - step;
        }
      }
      column = nextColumn;
    } while ((rowOf[column] ?? 0) !== 0);
    while (column !== 0) {
      const previous = cameFrom[column] ?? 0;
      rowOf[column] = rowOf[previous] ?? 0;
      column = previous;
    }
  }
  const columns = new Array<number>(n).fill(0);
  for (let j = 1; j <= n; j++) columns[(rowOf[j] ?? 1) - 1] = j - 1;
  return columns;
}
