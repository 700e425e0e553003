import { describe, expect, it } from 'vitest';
import { percentilesOf } from '../../../src/evidence/percentiles.ts';
import { drawsOf } from '../../../src/evidence/spread.ts';
import { db, f0, inductor, series, varied } from './in-series.ts';

describe('percentilesOf(subject, seed, samples, fractions)', () => {
  it('takes the smallest return loss that the fraction of networks does not exceed', () => {
    const subject = series([inductor(40)], [varied('L1', 0, 0.1)]);
    const { scale } = drawsOf(subject.parts, 1, subject.spread, 'uniform', 9, 0, 10);
    const sorted = [...scale[0]!].map((s) => db(40 * s)).toSorted((a, b) => a - b);
    const found = percentilesOf(subject, 9, 10, [0.1, 0.25, 0.5, 1]);
    const curves = found.states[0]!.curvesDb.map(([value]) => value!);
    [0, 2, 4, 9].forEach((rank, k) => expect(curves[k]).toBeCloseTo(sorted[rank]!, 10));
    expect(found.states[0]!.nominalDb[0]).toBeCloseTo(db(40), 10);
    expect(found.states[0]!.frequencyHz).toEqual([f0]);
  });
});
