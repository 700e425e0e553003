/** A closed interval; unit by context (Hz, H or F). `low` <= `high`. */
export interface Span {
  readonly low: number;
  readonly high: number;
}
