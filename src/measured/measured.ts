/**
 * Measured one-port data, as read from a file or a pasted table. Conventions: reflection coefficient in one real
 * reference resistance; frequencies ascending, each once; arrays of equal length.
 */
export interface Measured {
  readonly frequencyHz: Float64Array;
  readonly re: Float64Array;
  readonly im: Float64Array;
  /** Ω */
  readonly referenceOhm: number;
}
