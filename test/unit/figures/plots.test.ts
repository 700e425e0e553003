import { describe, expect, it } from 'vitest';
import type { Percentiles, Response } from '../../../src/dossier.ts';
import type { Size } from '../../../src/figures/chart-frame.ts';
import type { Figure } from '../../../src/figures/figure.ts';
import { gainPlot } from '../../../src/figures/gain-plot.ts';
import { reflectionPlane } from '../../../src/figures/reflection-plane.ts';
import { returnLossPlot } from '../../../src/figures/return-loss-plot.ts';
import { halfPower, requirement, resonance } from './fixture.ts';
import { outside, overlaps, textsOf } from './overlap.ts';

const words = (figure: Figure): readonly string[] => textsOf(figure).map(({ text }) => text);
const paths = (figure: Figure) => figure.shapes.filter((shape) => shape.kind === 'path');
const coordinates = (d: string): readonly number[] => (d.match(/-?\d+(\.\d+)?/gu) ?? []).map(Number);
const marks = [151.25e6, 150.5e6, 152e6];
const alone = resonance(100e6, 200e6, marks);
const swept = [alone];
/** States of the same load, each resonance a little aside of the one before; the names are as long as a record allows. */
const states = (count: number): readonly Response[] =>
  Array.from({ length: count }, (_, k) => ({
    ...alone,
    state: `${'W'.repeat(38)}${k}`,
    returnLossDb: alone.returnLossDb.map((db, j) => Math.max(0, alone.returnLossDb[j + 5 * k] ?? db)),
    transducerGainDb: alone.transducerGainDb.map((db) => db - k),
    gammaRe: alone.gammaRe.map((re) => re + 0.05 * k),
  }));

describe('returnLossPlot(responses, requirement)', () => {
  it('says which way is better, where it cuts, and what is required', () => {
    expect(words(returnLossPlot(swept, requirement))).toEqual(
      expect.arrayContaining([
        'Return loss, dB (larger is better; above 40 dB not drawn)',
        'required: at least 14 dB',
        'f₀ 151.25 MHz',
        'Frequency, MHz',
      ]),
    );
  });

  it('draws no requirement where none is', () => {
    const figure = returnLossPlot(swept, { ...requirement, returnLossDb: null });
    expect(words(figure).join()).not.toContain('required');
    expect(paths(figure).every(({ stroke }) => stroke !== 'limit')).toBe(true);
  });

  describe('with real parts', () => {
    const near = resonance(140e6, 165e6, marks);
    const shifted = (db: number) => near.returnLossDb.map((value) => Math.max(0, Math.min(30, value + db)));
    const percentiles: Percentiles = {
      fractions: [0.05, 0.5, 0.95],
      states: [
        {
          state: '',
          frequencyHz: near.frequencyHz,
          nominalDb: shifted(-2),
          curvesDb: [shifted(-5), shifted(-2), shifted(1)],
        },
      ],
    };
    const figure = returnLossPlot([near], requirement, undefined, percentiles);

    it('draws the band that most networks stay in, its edges lettered, and the nominal curve dashed', () => {
      expect(words(figure)).toEqual(expect.arrayContaining(['5 %', '95 %', 'exact values']));
      expect(words(figure)).toContain('real parts: nominal, and 5 % to 95 % of networks');
      const shaded = paths(figure).filter(({ fill, d }) => fill === 'muted' && d.length > 1000);
      expect(shaded).toHaveLength(1);
      // Key and curve.
      expect(paths(figure).filter(({ dash }) => dash?.join() === '4,2')).toHaveLength(2);
      expect(figure.description).toMatch(/Real parts: nominal between .* dB; 5 % of networks lie below a curve/u);
    });

    it('is as high while they are awaited, and says so', () => {
      const awaited = returnLossPlot([near], requirement, undefined, 'awaited');
      expect(awaited.height).toBe(figure.height);
      expect(words(awaited)).toContain('real parts: being worked out');
    });

    it('keeps the letters of the edges off the curves, the requirement and the design frequency', () => {
      const letters = textsOf(figure).filter(({ text }) => text === '5 %' || text === '95 %');
      const f0 = textsOf(figure).find(({ text }) => text.startsWith('f₀'))!;
      const middle = (f0.left + f0.right) / 2;
      for (const { left, right } of letters) expect(left > middle || right < middle).toBe(true);
      expect(overlaps(figure)).toEqual([]);
    });
  });

  it('leaves room over a requirement that the network does not reach', () => {
    const figure = returnLossPlot(swept, { ...requirement, returnLossDb: 55 });
    const limit = paths(figure).filter(({ stroke }) => stroke === 'limit');
    expect(Math.min(...limit.flatMap(({ d }) => coordinates(d)))).toBeGreaterThan(0);
    expect(words(figure)).toContain('60');
  });

  it.each([
    [480, 160],
    [320, 200],
    [280, 150],
  ])('keeps its lettering apart at %d by %d pt, over any span', (width, height) => {
    for (const span of [
      [100e6, 200e6],
      [151e6, 151.5e6],
      [1e6, 10e9],
      [140e6, 151.25e6],
    ] as const) {
      const figure = returnLossPlot([resonance(span[0], span[1])], requirement, { width, height });
      expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
    }
  });
});

describe('gainPlot(responses, requirement, halfPower)', () => {
  it('draws the edges that lie in the span and names the band', () => {
    const figure = gainPlot(swept, requirement, halfPower);
    expect(words(figure)).toContain('half power: 139.2 MHz to 164.4 MHz');
    const discs = (given: Figure) => paths(given).filter(({ fill }) => fill === 'ink').length;
    // One disc in the key, one for each edge.
    expect(discs(figure)).toBe(3);
    expect(discs(gainPlot([resonance(145e6, 200e6)], requirement, halfPower))).toBe(2);
    expect(discs(gainPlot(swept, requirement, { ...halfPower, lowHz: null, highHz: null }))).toBe(1);
  });

  it('stays within its frame for a network that passes next to nothing', () => {
    const faint = { ...alone, transducerGainDb: alone.transducerGainDb.map((db) => db - 90) };
    const figure = gainPlot([faint], requirement, { ...halfPower, peakGain: 1e-9 });
    const all = paths(figure).flatMap(({ d }) => coordinates(d));
    expect(Math.max(...all)).toBeLessThanOrEqual(480);
    expect(Math.min(...all)).toBeGreaterThanOrEqual(0);
    expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
  });
});

describe('reflectionPlane(responses, requirement)', () => {
  it('names the reflection at the marks', () => {
    // At f0 nothing is reflected; 14 dB is |Γ| = 10^(-14/20) = 0.1995.
    const figure = reflectionPlane(swept, requirement);
    expect(words(figure)).toEqual(
      expect.arrayContaining(['151.25 MHz: Γ = 0.000', 'required: |Γ| ≤ 0.200 (14 dB)', '|Γ| ≤ 0.5']),
    );
    expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
  });

  it('marks no frequency between samples', () => {
    const figure = reflectionPlane([resonance(100e6, 200e6)], requirement);
    expect(words(figure).join()).not.toContain('151.25 MHz');
  });

  it('cuts what lies beyond the unit circle', () => {
    const large = { ...alone, gammaRe: alone.gammaRe.map((re) => 5 * re), gammaIm: alone.gammaIm.map((im) => 5 * im) };
    const traces = paths(reflectionPlane([large], requirement)).filter(({ stroke }) => stroke === 'accent');
    for (const value of traces.flatMap(({ d }) => coordinates(d))) expect(value >= 0 && value <= 480).toBe(true);
  });
});

describe('several load states', () => {
  const named = [
    { ...alone, state: 'in hand' },
    { ...states(2)[1]!, state: 'free space' },
  ];
  const plots: readonly (readonly [string, (given: readonly Response[], size?: Size) => Figure])[] = [
    ['returnLossPlot', (given, size) => returnLossPlot(given, requirement, size)],
    ['gainPlot', (given, size) => gainPlot(given, requirement, halfPower, size)],
    ['reflectionPlane', (given) => reflectionPlane(given, requirement)],
  ];

  it.each(plots)('%s names each, the governing one first, and numbers its curve', (_, draw) => {
    const said = words(draw(named));
    expect(said).toEqual(expect.arrayContaining(['1 in hand (governs)', '2 free space']));
    expect(said.filter((text) => text === '1' || text === '2').length).toBeGreaterThanOrEqual(2);
    expect(words(draw(swept)).join()).not.toContain('governs');
  });

  it.each(plots)('%s tells eight apart without colour: the governing one solid and heaviest', (_, draw) => {
    const figure = draw(states(8));
    const solid = paths(figure).filter(({ stroke, dash }) => stroke === 'accent' && dash === undefined);
    const keys = paths(figure).filter(
      ({ stroke, dash, width }) => stroke === 'ink' && dash !== undefined && width === 0.9,
    );
    expect(new Set(keys.map(({ dash }) => dash!.join())).size).toBe(7);
    for (const { width } of solid) expect(width!).toBeGreaterThan(0.9);
  });

  it.each(plots)('%s keeps the lettering of eight apart', (_, draw) => {
    for (const size of [undefined, { width: 290, height: 190 }]) {
      const figure = draw(states(8), size);
      expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
    }
  });

  it('grows by the rows that the names take, and leaves the curves their room', () => {
    expect(returnLossPlot(states(8), requirement).height).toBeGreaterThan(returnLossPlot(swept, requirement).height);
  });
});
