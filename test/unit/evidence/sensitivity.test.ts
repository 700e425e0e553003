import { describe, expect, it } from 'vitest';
import { sensitivityOf, yieldIfHalved } from '../../../src/evidence/sensitivity.ts';
import { yieldOf } from '../../../src/evidence/yield.ts';
import { db, inductor, series, varied } from './in-series.ts';

describe('sensitivityOf(subject, yieldsIfHalved)', () => {
  const subject = series([inductor(30), inductor(10)], [varied('L1', 0, 0.01), varied('L2', 1, 0.1)]);

  it('ranks by effect within the tolerance: 1 Ω of 10 Ω before 0.3 Ω of 30 Ω', () => {
    const found = sensitivityOf(subject, [0.5, 0.75]);
    expect(found.map(({ designator, yieldIfHalved }) => [designator, yieldIfHalved])).toEqual([
      ['L2', 0.75],
      ['L1', 0.5],
    ]);
    expect(found[0]!.atToleranceDb).toBeCloseTo(db(41), 10);
    expect(found[1]!.atToleranceDb).toBeCloseTo(db(40.3), 10);
    // One per cent of 10 Ω is 0.1 Ω of the 40 Ω together, of 30 Ω it is 0.3 Ω.
    expect(found[0]!.dbPerPercent).toBeCloseTo(db(40.1) - db(40), 10);
    expect(found[0]!.dbPerMinusPercent).toBeCloseTo(db(39.9) - db(40), 10);
    expect(found[1]!.dbPerPercent).toBeCloseTo(db(40.3) - db(40), 10);
  });
});

describe('yieldIfHalved(subject, part, requiredDb, seed, samples)', () => {
  it('is of the same networks: none that is near enough to the middle is lost', () => {
    // 40 Ω ±10 % against a limit 2 % above: 60 % hold it, and 70 % with ±5 %.
    const subject = series([inductor(40)], [varied('L1', 0, 0.1)]);
    const requiredDb = db(40.8);
    const whole = yieldOf(subject, requiredDb, 3, 4000).value;
    const halved = yieldIfHalved(subject, 0, requiredDb, 3, 4000);
    expect(whole).toBeCloseTo(0.6, 1);
    expect(halved).toBeCloseTo(0.7, 1);
    expect(yieldIfHalved(subject, 0, requiredDb, 3, 4000)).toBe(halved);
  });
});
