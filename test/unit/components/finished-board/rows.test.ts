import { expect, it } from 'vitest';
import { causeRows } from '../../../../components/finished-board/rows.ts';
import type { AsBuiltFigures } from '../../../../src/dossier.ts';

const cause = (words: string, residual: number, withinTolerance: boolean | null) =>
  ({ kind: 'value', at: 0, size: 1, designator: 'L1', words, residual, withinTolerance }) as const;
const explanations = [
  cause('L1 is 12 % high', 0.02, false),
  cause('the load is off', 0.021, null),
  cause('C1 is 1 % low', 0.06, true),
];

it('causeRows(figures) gives what each cause leaves, and marks those that can’t be told apart', () => {
  const figures = { explanations, distance: 0.08, alike: 2 } as unknown as AsBuiltFigures;
  // 0.02/0.08 = 25 %, 0.021/0.08 = 26.25 %, 0.06/0.08 = 75 %
  expect(causeRows(figures).rows).toEqual([
    ['L1 is 12 % high', 'exceeded', '0.020', '25 %', 'as well as any'],
    ['The load is off', '–', '0.021', '26 %', 'as well as any'],
    ['C1 is 1 % low', 'allows it', '0.060', '75 %', 'less'],
  ]);
  expect(causeRows({ ...figures, alike: 1 }).columns).toHaveLength(4);
});
