/** One measured figure beside the one to reach; `ratio` is a ratio within one run wherever that can be. */
export interface Measure {
  measure: string;
  /** as it stands in the table, with its unit */
  ratio: string;
  toReach: string;
  reached: boolean;
  /** what was measured, how often, and what stands behind it */
  detail: string;
}

/** The middle of several timings. @throws RangeError for none */
export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted[Math.floor(sorted.length / 2)];
  if (middle === undefined) throw new RangeError('nothing was measured');
  return middle;
}
