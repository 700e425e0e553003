/** One formula of the basis of calculation. A number, once published, keeps its meaning: reports cite it. */
export interface Formula {
  readonly number: string;
  readonly title: string;
  /** Each in the notation of `mathml`. */
  readonly lines: readonly string[];
  /** When it holds, what a case left open comes to. */
  readonly text: readonly string[];
  /** Symbol, meaning, unit, range where it is limited. */
  readonly symbols: readonly (readonly [symbol: string, meaning: string, unit: string, range: string])[];
  readonly source: string;
}
