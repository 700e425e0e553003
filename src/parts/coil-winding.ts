/** A single-layer air coil. */
export interface CoilWinding {
  readonly designator: string;
  readonly inductanceH: number;
  readonly turns: number;
  /** Of the winding, to the middle of the wire, m. */
  readonly diameterM: number;
  readonly lengthM: number;
  readonly wireLengthM: number;
  readonly wireM: number;
  /** Self-capacitance (Medhurst), F; null outside his table. */
  readonly selfCapacitanceF: number | null;
  readonly selfResonanceHz: number | null;
  /** Where the formulas don't hold; '' where they do. */
  readonly caution: string;
}
