import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { twoElement } from '../../../src/synthesis/two-element.ts';

const hz = 1e6;
const omega = 2 * Math.PI * hz;
const z = (r: number, x = 0): Complex => new Complex(r, x);

/** Arms with their reactance in series or susceptance across, Ω or S: "series 25" is +j25 Ω. */
const written = (arms: ReturnType<typeof twoElement>['candidates'][number]['arms']): [string, number][] =>
  arms.map(({ arm, part, value }) => {
    const grows = (arm === 'series') === (part === 'inductor');
    return [arm, grows ? omega * value : -1 / (omega * value)];
  });

function expectNetworks(
  target: Complex,
  load: Complex,
  wanted: Readonly<Record<string, readonly [string, number][]>>,
): void {
  const { candidates } = twoElement(target, load, hz);
  expect(candidates.map(({ id }) => id)).toEqual(Object.keys(wanted));
  for (const { id, arms } of candidates) {
    const found = written(arms);
    expect(found.map(([arm]) => arm)).toEqual(wanted[id]!.map(([arm]) => arm));
    found.forEach(([, value], k) => expect(value).toBeCloseTo(wanted[id]![k]![1], 12));
  }
}

describe('twoElement(target, load, frequency)', () => {
  it('matches 50 Ω to 10 Ω with Q = 2: B = ±Q/50, X = ±Q·10', () => {
    expectNetworks(z(50), z(10), {
      'shunt-source-plus': [
        ['shunt', 0.04],
        ['series', 20],
      ],
      'shunt-source-minus': [
        ['shunt', -0.04],
        ['series', -20],
      ],
    });
  });

  it('matches 10 Ω to 50 Ω with the same parts, mirrored', () => {
    expectNetworks(z(10), z(50), {
      'shunt-load-plus': [
        ['series', 20],
        ['shunt', 0.04],
      ],
      'shunt-load-minus': [
        ['series', -20],
        ['shunt', -0.04],
      ],
    });
  });

  it('has four networks where both inequalities hold: 50 Ω to 10 + j30 Ω', () => {
    // Load: 1/GL = 10 + 90 = 100 Ω, BL = −0.03 S. At the load: Q = 1, B = 0.03 ± 0.01, X = ±50.
    // At the source: Q = 2, X = −30 ± 20, B = ±0.04.
    expectNetworks(z(50), z(10, 30), {
      'shunt-load-plus': [
        ['series', 50],
        ['shunt', 0.04],
      ],
      'shunt-load-minus': [
        ['series', -50],
        ['shunt', 0.02],
      ],
      'shunt-source-plus': [
        ['shunt', 0.04],
        ['series', -10],
      ],
      'shunt-source-minus': [
        ['shunt', -0.04],
        ['series', -50],
      ],
    });
  });

  it('absorbs the reactance of a complex target: 10 − j5 Ω seen from 50 Ω', () => {
    expectNetworks(z(10, -5), z(50), {
      'shunt-load-plus': [
        ['series', 15],
        ['shunt', 0.04],
      ],
      'shunt-load-minus': [
        ['series', -25],
        ['shunt', -0.04],
      ],
    });
  });

  it('needs no part for a load that is the target, and lists that once', () => {
    const { candidates, absent } = twoElement(z(50), z(50), hz);
    expect(candidates).toEqual([
      { id: 'direct', title: 'No network needed', arms: [], sections: 0, sectionQ: expect.any(Number) },
    ]);
    expect(absent).toEqual([]);
  });

  // 50 + jX seen from 50 + jX is direct; the other roots are real too: a series arm of 2X resonates what a shunt arm turns.
  it.each([40, 1, 0.1, 1e-3, 1e-6])(
    'needs no part for 50 + jX Ω, X = %s Ω, which is what is sought, and says so first',
    (x) => {
      const { candidates } = twoElement(z(50, x), z(50, x), hz);
      expect(candidates.map(({ id }) => id)).toEqual(['direct', 'shunt-load-plus', 'shunt-source-minus']);
    },
  );

  it('leaves out an arm that comes out as nothing: a series L alone for 75 Ω to 75 − j40 Ω', () => {
    const { candidates } = twoElement(z(75), z(75, -40), hz);
    const [single] = candidates.filter(({ arms }) => arms.length === 1);
    expect(written(single!.arms)).toEqual([['series', expect.closeTo(40, 10)]]);
    expect(single!.title).toBe('Series L');
    expect(candidates).toHaveLength(2);
  });

  it('leaves out an arm that comes out as nothing: a shunt C alone for 50 Ω to 10 + j20 Ω', () => {
    // 1/(10 + j20) = 0.02 − j0.04 S. Both forms have it; the other root is X = −40, B = −0.04.
    expectNetworks(z(50), z(10, 20), {
      'shunt-load-plus': [['shunt', 0.04]],
      'shunt-source-minus': [
        ['shunt', -0.04],
        ['series', -40],
      ],
    });
  });

  it('counts a double root once', () => {
    // RT = 1/GL = 50 Ω: Q = 0, so the series arm has one root only.
    const { candidates } = twoElement(z(50, 30), z(10, 20), hz);
    const atLoad = candidates.filter(({ id }) => id.startsWith('shunt-load'));
    expect(atLoad.map(({ arms }) => written(arms))).toEqual([
      [
        ['series', expect.closeTo(30, 10)],
        ['shunt', expect.closeTo(0.04, 12)],
      ],
    ]);
  });

  it('tells the inequality that fails, with its numbers', () => {
    expect(twoElement(z(50), z(10), hz).absent).toEqual([
      {
        form: 'series arm, then shunt arm at the load',
        why: expect.stringMatching(/RT ≤ 1\/GL.*here 50\.00 Ω > 10\.00 Ω \(ratio 5\.000\)/),
      },
    ]);
    expect(twoElement(z(10), z(50), hz).absent).toEqual([
      {
        form: 'shunt arm at the source, then series arm',
        why: expect.stringMatching(/RL ≤ 1\/GT.*here 50\.00 Ω > 10\.00 Ω \(ratio 5\.000\)/),
      },
    ]);
  });

  it('matches 1 mΩ to 1 MΩ: Q² + 1 = 10⁹', () => {
    const { candidates } = twoElement(z(1e-3), z(1e6), hz);
    expect(candidates).toHaveLength(2);
    for (const { sectionQ } of candidates) expect(sectionQ ** 2 + 1).toBeCloseTo(1e9, 3);
  });
});
