/** A value of ours held against one from outside the program. */
export interface Check {
  what: string;
  /** where the expected value comes from, with edition */
  source: string;
  /**
   * How sure the expected value is: read in a published copy; recalled from memory and agreeing
   * with an independent calculation; calculated from the formula; or worked out in another way,
   * by another program or a numerical method.
   */
  mark: 'published' | 'from memory' | 'calculated' | 'another way';
  expected: number;
  /** the most that ours may differ, in the same unit */
  tolerance: number;
  ours: () => number;
}
