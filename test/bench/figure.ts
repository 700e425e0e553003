/** One measured figure with the budget it is held against. */
export interface Figure {
  readonly name: string;
  readonly measured: string;
  readonly budget: string;
  /** Null: could not be measured here; `measured` says why. */
  readonly within: boolean | null;
}

/** A line for a person: name, measured, budget, and in words whether it holds. */
export function formatFigure({ name, measured, budget, within }: Figure): string {
  const verdict = within === null ? 'not measured' : within ? 'within' : 'OVER';
  return `${name.padEnd(46)} ${measured.padStart(28)}   budget ${budget.padEnd(16)} ${verdict}`;
}
