import type { Line, Section } from './landmark';

/**
 * A section that is a table: lines to pass over, rows, and a line that is no row any more.
 * Nothing is saved unless the table came to its own end, so one that is cut short is absent.
 * @param row - one row, or null when the line is none
 * @param save - called once with all rows (at least one) when the first line after them comes
 * @param heading - at most so many lines may stand above the first row (headings, rules, blanks)
 */
export function rowTable<Row>(options: {
  row: (line: Line) => Row | null;
  save: (rows: Row[], closing: Line) => void;
  heading?: number;
}): Section {
  const { row, save, heading = 8 } = options;
  const rows: Row[] = [];
  let above = 0;
  return {
    take(line) {
      const next = row(line);
      if (next !== null) {
        rows.push(next);
        return true;
      }
      if (rows.length === 0) return ++above <= heading;
      save(rows, line);
      return false;
    },
  };
}
