import { describe, expect, it } from 'vitest';
import type { PrintedFigure } from '../../../src/design/printed-figures.ts';
import { compareFigures } from '../../../src/recheck/compare-figures.ts';

const figure = (value: PrintedFigure['value'], unit = '', name = 'it'): PrintedFigure => ({ name, value, unit });
const outcome = (then: PrintedFigure, now: PrintedFigure) => compareFigures([then], [now])[0]!.outcome;

describe('compareFigures(then, now)', () => {
  it.each([
    // A picofarad is a value, however small in farads: nothing absolute is forgiven.
    [1e-12, 1.0000000001e-12, 'F', 'within rounding'],
    [1e-12, 1.00000001e-12, 'F', 'differs'],
    [151.25e6, 151.25e6, 'Hz', 'same'],
    [151.25e6, 151.25e6 + 0.1, 'Hz', 'within rounding'],
    [151.25e6, 151.25e6 + 1, 'Hz', 'differs'],
    // What is left of 50 - 50 Ω.
    [3e-15, -7e-15, 'Ω', 'within rounding'],
    [0, 1e-8, 'Ω', 'differs'],
    [1e-16, 4e-13, '', 'within rounding'],
    // |Γ| of 1e-8 and of 1e-7.5 differ by 2.2e-8; of 1e-10 and 1e-9.5 by 2.2e-10.
    [160, 150, 'dB', 'differs'],
    [200, 190, 'dB', 'within rounding'],
    [20, 20.000001, 'dB', 'differs'],
  ])('%d and %d %s: %4$s', (then, now, unit, expected) => {
    expect(outcome(figure(then, unit), figure(now, unit))).toBe(expected);
  });

  it.each([
    ['series-first', 'series-first', 'same'],
    ['series-first', 'shunt-first', 'differs'],
    [true, false, 'differs'],
    [null, null, 'same'],
    [null, 0, 'differs'],
    ['1', 1, 'differs'],
  ])('%s and %s: %s', (then, now, expected) => {
    expect(outcome(figure(then), figure(now))).toBe(expected);
  });

  it('tells another unit from another value', () => {
    expect(outcome(figure(1, 'H'), figure(1, 'F'))).toBe('differs');
  });

  it('lists what was not printed in its place, and what is no longer computed last', () => {
    const compared = compareFigures(
      [figure(1, '', 'gone'), figure(2, '', 'kept')],
      [figure(2, '', 'kept'), figure(3, '', 'new')],
    );
    expect(compared).toEqual([
      { name: 'kept', unit: '', then: 2, now: 2, outcome: 'same' },
      { name: 'new', unit: '', then: undefined, now: 3, outcome: 'differs' },
      { name: 'gone', unit: '', then: 1, now: undefined, outcome: 'differs' },
    ]);
  });

  it('tells two of one name apart by their order', () => {
    const outcomes = compareFigures([figure(1), figure(2)], [figure(1), figure(2)]).map((each) => each.outcome);
    expect(outcomes).toEqual(['same', 'same']);
    expect(compareFigures([figure(1), figure(2)], [figure(1)]).at(-1)).toMatchObject({ then: 2, now: undefined });
  });
});
