/** One figure of the bench, as `--json` prints it. */
export interface Figure {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  /** What the figure stands beside. */
  readonly beside?: string;
}
