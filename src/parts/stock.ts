import type { Tolerance } from './tolerance.ts';

/** One line of a stock list. SI units; null: the list doesn't say. */
export interface StockPart {
  readonly name: string;
  readonly kind: 'inductor' | 'capacitor';
  /** H or F */
  readonly value: number;
  readonly tolerance: Tolerance | null;
  /** Quality factor at `qAtHz`. */
  readonly q: number | null;
  readonly qAtHz: number | null;
  readonly selfResonanceHz: number | null;
  /** Equivalent series inductance of a capacitor, H. */
  readonly eslH: number | null;
  /** Peak or direct voltage, V. */
  readonly ratedVolts: number | null;
  /** RMS current, A. */
  readonly ratedAmps: number | null;
}

/** Most parts that a list may have: it travels in the record. */
export const mostStockParts = 10_000;

/** The parts that can be had, as read from the engineer's own list. */
export interface StockList {
  /** File name. */
  readonly name: string;
  /** SHA-256 of the file's text, 64 hex digits. */
  readonly sha256: string;
  readonly parts: readonly StockPart[];
}
