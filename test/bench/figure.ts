/** One measured figure with the budget it is held against. */
export interface Figure {
  readonly name: string;
  readonly measured: string;
  readonly budget: string;
  /** Null: could not be measured here; `measured` says why. */
  readonly within: boolean | null;
}

export function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

/** A line for a person: name, measured, budget, and in words whether it holds. */
export function formatFigure({ name, measured, budget, within }: Figure): string {
  const verdict = within === null ? 'not measured' : within ? 'within' : 'OVER';
  return `${name.padEnd(46)} ${measured.padStart(28)}   budget ${budget.padEnd(16)} ${verdict}`;
}
