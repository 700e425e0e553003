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

/** The same as plain data, as a record holds it, with where it came from. */
export interface MeasuredData {
  /** File name, or "table". */
  readonly name: string;
  /** SHA-256 of the file's or table's text, 64 hex digits. */
  readonly sha256: string;
  /** Samples in the file; more than are here where it was thinned. */
  readonly samples: number;
  /** Largest distance between a sample left out and the curve through those kept; 0 where none was. */
  readonly thinningError: number;
  /** Ω */
  readonly referenceOhm: number;
  readonly frequencyHz: readonly number[];
  readonly re: readonly number[];
  readonly im: readonly number[];
}
