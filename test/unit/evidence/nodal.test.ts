import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { solveNodal } from '../../../src/evidence/nodal.ts';

const fifty = new Complex(50, 0);
const l = (x: number): number => x / (2 * Math.PI);

describe('solveNodal(arms, source, load, frequency, availableW)', () => {
  it('gives a matched pair half the source voltage and all its power', () => {
    // 2 W available from 50 Ω: E = √(8·50·2) = 28.28 V peak, half of it at the terminals.
    const { nodes, loadW, lostW, reflectedW, gain, seen } = solveNodal([], fifty, fifty, 1, 2);
    expect(nodes).toHaveLength(1);
    expect(nodes[0]!.abs()).toBeCloseTo(Math.sqrt(200), 12);
    expect([loadW, lostW, gain, seen.re]).toEqual([2, 0, 1, 50].map((value) => expect.closeTo(value, 12) as number));
    expect(reflectedW).toBeCloseTo(0, 25);
  });

  it('divides the power of a lossy series arm between load, loss and reflection', () => {
    // 5 + j50 Ω in series with 50 Ω: |Zin + ZS|² = 105² + 50² = 13525; load 4·50·50/13525, loss 4·50·5/13525.
    const arm = { arm: 'series', part: 'inductor', value: l(50), q: 10 } as const;
    const { loadW, lostW, reflectedW, seen, nodes } = solveNodal([arm], fifty, fifty, 1, 1);
    expect(nodes).toHaveLength(2);
    expect(loadW).toBeCloseTo(10000 / 13525, 13);
    expect(lostW).toBeCloseTo(1000 / 13525, 13);
    expect(reflectedW).toBeCloseTo(2525 / 13525, 13);
    expect(seen.re).toBeCloseTo(55, 12);
    expect(seen.im).toBeCloseTo(50, 12);
  });

  it('divides the power of a lossy shunt arm the same way', () => {
    // Y = (5 − j50)/2525 across 50 Ω; with 1 V: load 1/50, loss 5/2525.
    const arm = { arm: 'shunt', part: 'inductor', value: l(50), q: 10 } as const;
    const { loadW, lostW, reflectedW } = solveNodal([arm], fifty, fifty, 1, 1);
    expect(lostW / loadW).toBeCloseTo((5 / 2525) * 50, 12);
    expect(loadW + lostW + reflectedW).toBeCloseTo(1, 13);
  });
});
