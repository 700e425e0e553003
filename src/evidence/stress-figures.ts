/** Voltages and currents for the available power, in the worst state and at the worst frequency of the band for each part. */
export interface Stress {
  readonly powerW: number;
  /** Load mismatch assessed, with the load states; null: the states alone. */
  readonly vswr: number | null;
  readonly parts: readonly PartStress[];
  /** The part that reaches its derated rating first; null: no rating is known. */
  readonly first: { readonly designator: string; readonly by: StressKind; readonly powerW: number } | null;
  /** Nothing is over its derated rating; null: no rating is known. */
  readonly within: boolean | null;
  readonly words: string;
}

export type StressKind = 'voltage' | 'current' | 'heat';

export interface StressFigures {
  /** Across the part. */
  readonly voltsPeak: number;
  /** Through it. */
  readonly ampsRms: number;
  /** Heat in it. */
  readonly watts: number;
}

export interface PartStress extends StressFigures {
  readonly designator: string;
  /** With the load mismatched, at the worst of all angles; null: not assessed. */
  readonly mismatched: StressFigures | null;
  /** Available power at which it reaches its derated rating, W, and which rating that is; null: none is known. */
  readonly limitW: number | null;
  readonly limitBy: StressKind | null;
}
