import type { ComparedFigure } from '../../src/recheck/compare-figures.ts';
import { figureWords } from '../../src/recheck/figure-words.ts';
import { column, figure, type Rows } from '../base/rows.ts';

/** Figures then and now, one a row. */
export const rowsOf = (figures: readonly ComparedFigure[]): Rows => ({
  columns: [column('Figure'), figure('Printed'), figure('Computed now')],
  rows: figures.map((each) => {
    const { then, now } = figureWords(each);
    return [each.name, then, now];
  }),
});
