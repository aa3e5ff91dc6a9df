/** Capacitance that may hold a direct voltage at a place that people can touch. */

/**
 * Largest capacitance at a voltage for the lowest class of touchable sources, F: the table of single pulses from
 * charged capacitors of IEC 62368-1 (from memory: confirm), a straight line in logarithms between its rows.
 * Infinity up to 60 V; undefined for no number. Example: 100 V: 91 nF.
 */
export function touchableCapacitance(volts: number): number | undefined {
  const size = Math.abs(volts);
  if (Number.isNaN(size)) return undefined;
  if (size <= 60) return Number.POSITIVE_INFINITY;
  const next = rows.findIndex(([v]) => v >= size);
  if (next < 0) return (rows.at(-1)![1] * 1e-9 * rows.at(-1)![0]) / size;
  const [[v0, c0], [v1, c1]] = [rows[next - 1]!, rows[next]!];
  const part = Math.log(size / v0) / Math.log(v1 / v0);
  return 1e-9 * c0 * (c1 / c0) ** part;
}

/** Volt and nanofarad. */
const rows: readonly (readonly [number, number])[] = [
  [60, 300],
  [75, 170],
  [100, 91],
  [125, 61],
  [150, 41],
  [200, 28],
  [250, 18],
  [350, 12],
  [500, 8],
  [1000, 4],
];
