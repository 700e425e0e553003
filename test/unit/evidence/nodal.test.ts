import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { branchesOf } from '../../../src/evidence/branch.ts';
import { solveNodal } from '../../../src/evidence/nodal.ts';

const fifty = new Complex(50, 0);
const l = (x: number): number => x / (2 * Math.PI);

describe('solveNodal(ladder, source, load, availableW)', () => {
  it('gives a matched pair half the source voltage and all its power', () => {
    // 2 W available from 50 Ω: E = √(8·50·2) = 28.28 V peak, half of it at the terminals.
    const { nodes, loadW, lostW, reflectedW, gain, seen } = solveNodal(branchesOf([], 1), fifty, fifty, 2);
    expect(nodes).toHaveLength(1);
    expect(nodes[0]!.abs()).toBeCloseTo(Math.sqrt(200), 12);
    expect([loadW, lostW, gain, seen.re]).toEqual([2, 0, 1, 50].map((value) => expect.closeTo(value, 12) as number));
    expect(reflectedW).toBeCloseTo(0, 25);
  });

  it('divides the power of a lossy series arm between load, loss and reflection', () => {
    // 5 + j50 Ω in series with 50 Ω: |Zin + ZS|² = 105² + 50² = 13525; load 4·50·50/13525, loss 4·50·5/13525.
    const arm = { arm: 'series', part: 'inductor', value: l(50), q: 10 } as const;
    const { loadW, lostW, reflectedW, seen, nodes } = solveNodal(branchesOf([arm], 1), fifty, fifty, 1);
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
    const { loadW, lostW, reflectedW } = solveNodal(branchesOf([arm], 1), fifty, fifty, 1);
    expect(lostW / loadW).toBeCloseTo((5 / 2525) * 50, 12);
    expect(loadW + lostW + reflectedW).toBeCloseTo(1, 13);
  });

  it('gives what each arm bears', () => {
    // 5 + j50 Ω in series with 50 Ω, 1 W from 50 Ω: E = 20 V peak, I = 20/|105 + j50| = 20/√13525 A peak.
    const arm = { arm: 'series', part: 'inductor', value: l(50), q: 10 } as const;
    const { arms } = solveNodal(branchesOf([arm], 1), fifty, fifty, 1);
    expect(arms).toHaveLength(1);
    expect(arms[0]!.amps.abs()).toBeCloseTo(20 / Math.sqrt(13525), 13);
    expect(arms[0]!.volts.abs()).toBeCloseTo((20 * Math.sqrt(2525)) / Math.sqrt(13525), 12);
    expect(arms[0]!.watts).toBeCloseTo(1000 / 13525, 13);
  });

  it('has a stray susceptance at every node', () => {
    // 50 Ω beside j0.02 S is 25 − j25 Ω: through j50 Ω that is 25 + j25 Ω = 1/(0.02 − j0.02), which the stray at the
    // source's node makes 1/0.02 = 50 Ω: matched, and lossless.
    const series = { arm: 'series', z: new Complex(0, 50) } as const;
    const { seen, nodes, gain } = solveNodal({ arms: [series], strayB: 0.02 }, fifty, fifty, 2);
    expect(seen.sub(fifty).abs()).toBeLessThan(1e-12);
    expect(gain).toBeCloseTo(1, 13);
    for (const node of nodes) expect(node.abs()).toBeCloseTo(Math.sqrt(200), 12);
  });
});
