import { describe, expect, it } from 'vitest';
import { asBuilt, type AsBuiltInput } from '../../../src/evidence/as-built.ts';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import type { RealLadder } from '../../../src/network/real-arm.ts';
import { boardImpedance, f0, grid, input, ladder, load, measure, part, type Built } from './as-built/fixture.ts';

const samples = grid(100e6, 220e6, 241);
const scaled = (at: number, factor: number): RealLadder => ({
  ...ladder,
  arms: ladder.arms.map((arm, k) => (k === at ? { ...arm, value: arm.value * factor } : arm)),
});
const built = (change: Partial<Built>): Built => ({ ladder, load, ...change });
const compared = (board: Built, change: Partial<AsBuiltInput> = {}) =>
  asBuilt({ ...input, measured: measure(board, f0, samples), ...change });
/** Return loss of a board against 50 Ω, dB. */
const lossOf = (board: Built, hz: number): number => {
  const z = boardImpedance(board, f0, hz);
  return -20 * Math.log10(z.sub(50).div(z.add(50)).abs());
};

describe('asBuilt(input) finds the single cause', () => {
  it.each<[string, Built, object, number]>([
    ['L1 12 % high', built({ ladder: scaled(1, 1.12) }), { kind: 'value', at: 1, designator: 'L1' }, 1.12],
    ['C2 15 % low', built({ ladder: scaled(2, 0.85) }), { kind: 'value', at: 2, designator: 'C2' }, 0.85],
    [
      'the Q of L1 at 15',
      built({ ladder: { ...ladder, arms: ladder.arms.map((arm, k) => (k === 1 ? { ...arm, q: 15 } : arm)) } }),
      { kind: 'quality', at: 1, designator: 'L1' },
      15,
    ],
    [
      '2 nH more in the leads of C2',
      built({ ladder: { ...ladder, arms: ladder.arms.map((arm, k) => (k === 2 ? { ...arm, seriesH: 3e-9 } : arm)) } }),
      { kind: 'lead', at: 2, designator: 'C2' },
      2e-9,
    ],
    ['4 pF at the source', built({ extraF: [4e-12, 0, 0] }), { kind: 'stray', at: 0, designator: null }, 4e-12],
    ['1.5 pF between L1 and L2', built({ extraF: [0, 1.5e-12, 0] }), { kind: 'stray', at: 1 }, 1.5e-12],
    ['1.5 pF across the load', built({ extraF: [0, 0, 1.5e-12] }), { kind: 'load capacitance' }, 1.5e-12],
    ['5 nH in series with the load', built({ seriesH: 5e-9 }), { kind: 'load inductance' }, 5e-9],
    ["40 % more of the load's resistance", built({ resistance: 1.4 }), { kind: 'load resistance' }, 1.4],
  ])('first, with its size: %s', (_, board, fault, size) => {
    const { explanations, conclusion, distance } = compared(board);
    expect(explanations[0]).toMatchObject(fault);
    expect(explanations[0]!.size / size).toBeCloseTo(1, 1.5);
    expect(explanations[0]!.residual).toBeLessThan(0.002);
    expect(distance).toBeGreaterThan(0.01);
    expect(['explained', 'alike']).toContain(conclusion);
    const residuals = explanations.map(({ residual }) => residual);
    expect(residuals).toEqual(residuals.toSorted((a, b) => a - b));
  });

  it('in a board of one shunt part at the source, seen by a reflectionless aim too', () => {
    const short = { arms: [part('series', 'inductor', 40e-9), part('shunt', 'capacitor', 30e-12)], strayF: 0 };
    const off = { ...short, arms: [short.arms[0]!, { ...short.arms[1]!, value: 36e-12 }] };
    const figures = compared(built({ ladder: off }), {
      ladder: short,
      designators: ['L1', 'C1'],
      tolerances: input.tolerances.slice(0, 2),
      candidates: [],
      aim: 'reflectionless',
      source: { r: 40, x: 15, behaviour: 'series' },
    });
    const causes = figures.explanations.slice(0, figures.alike);
    const value = causes.find(({ kind }) => kind === 'value')!;
    expect(value.designator).toBe('C1');
    expect(value.size).toBeCloseTo(1.2, 2);
    // Across the load stands the same 6 pF, but without the loss of C1.
    expect(causes.find(({ kind }) => kind === 'load capacitance')!.size / 6e-12).toBeCloseTo(1, 1);
  });
});

describe('asBuilt(input) says when it knows no single cause', () => {
  it('of two that fit alike: more inductance in L2, or as much in series with the load', () => {
    const figures = compared(built({ ladder: scaled(3, 1.05) }));
    expect(figures.conclusion).toBe('alike');
    expect(figures.alike).toBe(2);
    const [first, second] = figures.explanations;
    expect([first!.kind, second!.kind]).toEqual(['value', 'load inductance']);
    // 5 % of 56 nH
    expect(second!.size / 2.8e-9).toBeCloseTo(1, 1);
    expect([first!.withinTolerance, second!.withinTolerance]).toEqual([expect.any(Boolean), null]);
  });

  it('of a board as predicted', () => {
    const figures = compared(built({}));
    expect(figures.conclusion).toBe('as predicted');
    expect(figures.alike).toBe(0);
    expect(figures.distance).toBeLessThan(0.002);
  });

  it('of a board wrong in three places', () => {
    const wrong = {
      ...ladder,
      arms: ladder.arms.map((arm, k) => ({ ...arm, value: arm.value * [2, 1.5, 0.6, 1.1][k]! })),
    };
    const figures = compared(built({ ladder: wrong, resistance: 2 }));
    expect(figures.conclusion).toBe('unexplained');
    expect(figures.explanations[0]!.residual).toBeGreaterThan(figures.distance! / 2);
    expect(figures.remedy).toBeNull();
  });
});

describe('asBuilt(input) judges the band', () => {
  const board = built({ ladder: scaled(1, 1.12) });
  // The worst of a monotonous stretch is at one of its ends, and L1's error leaves it so.
  const worstDb = Math.min(lossOf(board, 148e6), lossOf(board, 152e6));

  it('by the worst measured sample', () => {
    const { verdict } = compared(board);
    expect(verdict.verdict).toBe('meets');
    expect(verdict.worstReturnLossDb).toBeCloseTo(worstDb, 1);
    expect(verdict.coveredHz).toEqual({ low: 148e6, high: 152e6 });
    expect(compared(board, { returnLossDb: worstDb + 1 }).verdict.verdict).toBe('falls short');
    expect(compared(board, { returnLossDb: null }).verdict.verdict).toBe('not assessed');
  });

  it('by the part that was measured: it can fall short there, but not meet', () => {
    const measured = measure(board, f0, grid(150e6, 220e6, 141));
    const half = asBuilt({ ...input, measured }).verdict;
    expect(half).toMatchObject({ verdict: 'not assessed', coveredHz: { low: 150e6, high: 152e6 } });
    expect(asBuilt({ ...input, measured, returnLossDb: 40 }).verdict.verdict).toBe('falls short');
  });

  it('not at all where nothing of it was measured', () => {
    const measured = measure(board, f0, grid(160e6, 180e6, 41));
    expect(asBuilt({ ...input, measured }).verdict).toMatchObject({
      verdict: 'not assessed',
      coveredHz: null,
      worstReturnLossDb: null,
    });
  });

  it('at the design frequency where no band is given, between samples too', () => {
    const measured = measure(board, f0, grid(140.3e6, 160.4e6, 101));
    const { verdict } = asBuilt({ ...input, measured, bandHz: null });
    expect(verdict).toMatchObject({ bandHz: { low: f0, high: f0 }, worstAtHz: f0 });
    expect(verdict.worstReturnLossDb).toBeCloseTo(lossOf(board, f0), 0.5);
  });

  it('and compares nothing where sweep and data have nothing in common', () => {
    const measured = measure(board, f0, grid(300e6, 400e6, 11));
    const figures = asBuilt({ ...input, measured });
    expect(figures).toMatchObject({ conclusion: 'not compared', distance: null, explanations: [], remedy: null });
    expect(figures.overlay.frequencyHz).toEqual([]);
    expect(JSON.stringify(figures)).not.toContain('null,null');
  });
});

describe('asBuilt(input) takes a load state', () => {
  const inHand = { r: 20, x: -30, behaviour: 'series' } as const;
  const loads = [
    { name: 'free space', termination: load },
    { name: 'in hand', termination: inHand },
  ];

  it('the nearest one, unless the engineer names another', () => {
    const board = built({ load: inHand });
    const nearest = compared(board, { loads }).attached;
    expect(nearest).toMatchObject({ state: 'in hand', by: 'nearest' });
    expect(nearest.distances.map(({ state }) => state)).toEqual(['free space', 'in hand']);
    expect(nearest.distances[0]!.distance).toBeGreaterThan(10 * nearest.distances[1]!.distance);
    const named = compared(board, { loads, attached: 'free space' });
    expect(named.attached).toMatchObject({ state: 'free space', by: 'engineer' });
    expect(named.distance).toBeGreaterThan(0.05);
  });

  it('and knows no other', () => {
    expect(() => compared(built({}), { loads, attached: 'in a drawer' })).toThrow(RangeError);
  });
});

describe('asBuilt(input) looks for one part on sale', () => {
  const values = (at: number, ...of: number[]) => of.map((value) => ({ ...ladder.arms[at]!, value }));
  const candidates = [
    values(0, 18e-12, 22e-12),
    values(1, 24e-9, 30e-9),
    values(2, 39e-12, 47e-12),
    values(3, 51e-9, 62e-9),
  ];

  it('that brings the return loss back with the cause in force', () => {
    // 1.15 times 56 nH is 64.4 nH; 1.15 times 51 nH, 58.7 nH, is the nearer to 56.
    const board = built({ ladder: scaled(3, 1.15) });
    const figures = compared(board, { candidates, returnLossDb: 12 });
    expect(figures.verdict.verdict).toBe('falls short');
    expect(figures.remedy).toMatchObject({ designator: 'L2', from: 56e-9, to: 51e-9, meets: true });
    // As much in series with the load fits alike, and then more is left: the worse of the two counts.
    const replaced = (henry: number) =>
      built({
        ladder: {
          ...ladder,
          arms: [...ladder.arms.slice(0, 3), part('series', 'inductor', henry, { parallelF: 0.1e-12 })],
        },
      });
    const worstDb = (of: Built): number => Math.min(lossOf(of, 148e6), lossOf(of, 152e6));
    const [byPart, byLoad] = [worstDb(replaced(1.15 * 51e-9)), worstDb(replaced(51e-9 + 0.15 * 56e-9))];
    expect(byLoad).toBeLessThan(byPart);
    expect(Math.abs(figures.remedy!.beforeDb - worstDb(board))).toBeLessThan(0.1);
    expect(Math.abs(figures.remedy!.afterDb - byLoad)).toBeLessThan(0.3);
  });

  it('only when the requirement is not met, and not when none on sale brings it closer', () => {
    const board = built({ ladder: scaled(3, 1.15) });
    expect(compared(board, { candidates, returnLossDb: 1 }).remedy).toBeNull();
    expect(compared(board, { candidates: [[], [], [], values(3, 62e-9)], returnLossDb: 12 }).remedy).toBeNull();
  });
});

describe('asBuilt(input) reads a file in any reference', () => {
  it('75 Ω, and gives the same figures as 50 Ω', () => {
    const board = built({ ladder: scaled(1, 1.12) });
    const fileIn = (ohm: number): string => {
      const rows = samples.map((hz) => {
        const z = boardImpedance(board, f0, hz);
        const gamma = z.sub(ohm).div(z.add(ohm));
        return `${String(hz)} ${String(gamma.re)} ${String(gamma.im)}`;
      });
      return `# Hz S RI R ${String(ohm)}\n${rows.join('\n')}\n`;
    };
    const of = (ohm: number) => asBuilt({ ...input, measured: measuredTermination(fileIn(ohm), 'board.s1p').measured });
    const [in75, in50] = [of(75), of(50)];
    expect(in75.referenceOhm).toBe(75);
    expect(in75.explanations[0]!.words).toBe('L1 is 12 % high (30.2 nH instead of 27.0 nH)');
    for (const [k, db] of in75.overlay.measuredDb.entries()) {
      expect(db).toBeCloseTo(in50.overlay.measuredDb[k]!, 8);
      expect(db).toBeCloseTo(lossOf(board, in75.overlay.frequencyHz[k]!), 8);
    }
  });
});

describe('asBuilt(input) is plain data', () => {
  it('without NaN or infinity, and the same after a journey through JSON', () => {
    for (const board of [built({}), built({ ladder: scaled(1, 1.12) })]) {
      const figures = compared(board);
      expect(JSON.parse(JSON.stringify(figures))).toEqual(figures);
      expect(JSON.stringify(figures)).not.toMatch(/NaN|Infinity/u);
    }
  });

  it('of a lossless network that resonates at a sample, too', () => {
    const lossless = {
      arms: [
        part('shunt', 'capacitor', 20e-12, { q: null, seriesH: 1 / ((2 * Math.PI * 140e6) ** 2 * 20e-12) }),
        part('series', 'inductor', 27e-9, { q: null, parallelF: 1 / ((2 * Math.PI * 160e6) ** 2 * 27e-9) }),
      ],
      strayF: 0,
    };
    const measured = measure(built({}), f0, samples);
    const figures = asBuilt({ ...input, ladder: lossless, designators: ['C1', 'L1'], candidates: [], measured });
    expect(JSON.parse(JSON.stringify(figures))).toEqual(figures);
    expect(figures.overlay.predictedDb.every((db) => db >= 0)).toBe(true);
  });
});
