import type { AsBuiltFigures } from '../../src/dossier.ts';
import { gamma } from '../../src/evidence/as-built-words.ts';
import { formatFixed } from '../../src/quantity/format.ts';
import { column, figure, type Rows } from '../base/rows.ts';

/** Single causes, each fitted alone, the one that leaves least first; those that can't be told apart are marked. */
export function causeRows({ explanations, distance, alike }: AsBuiltFigures): Rows {
  const marked = alike > 1;
  return {
    columns: [
      column('Single cause, and its size'),
      column('Tolerance of the part'),
      figure('Distance left in Γ (RMS)'),
      figure('Of the distance'),
      ...(marked ? [column('Explains it')] : []),
    ],
    rows: explanations.map(({ words, withinTolerance, residual }, k) => [
      words.charAt(0).toUpperCase() + words.slice(1),
      withinTolerance === null ? '–' : withinTolerance ? 'allows it' : 'exceeded',
      gamma(residual),
      distance === null || distance === 0 ? '–' : `${formatFixed((100 * residual) / distance, 0)} %`,
      ...(marked ? [k < alike ? 'as well as any' : 'less'] : []),
    ]),
  };
}
