import { describe, expect, it } from 'vitest';
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
const swept = resonance(100e6, 200e6, marks);

describe('returnLossPlot(response, requirement)', () => {
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
      const figure = returnLossPlot(resonance(span[0], span[1]), requirement, { width, height });
      expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
    }
  });
});

describe('gainPlot(response, requirement, halfPower)', () => {
  it('draws the edges that lie in the span and names the band', () => {
    const figure = gainPlot(swept, requirement, halfPower);
    expect(words(figure)).toContain('half power: 139.2 MHz to 164.4 MHz');
    const discs = (given: Figure) => paths(given).filter(({ fill }) => fill === 'ink').length;
    // One disc in the key, one for each edge.
    expect(discs(figure)).toBe(3);
    expect(discs(gainPlot(resonance(145e6, 200e6), requirement, halfPower))).toBe(2);
    expect(discs(gainPlot(swept, requirement, { ...halfPower, lowHz: null, highHz: null }))).toBe(1);
  });

  it('stays within its frame for a network that passes next to nothing', () => {
    const faint = { ...swept, transducerGainDb: swept.transducerGainDb.map((db) => db - 90) };
    const figure = gainPlot(faint, requirement, { ...halfPower, peakGain: 1e-9 });
    const all = paths(figure).flatMap(({ d }) => coordinates(d));
    expect(Math.max(...all)).toBeLessThanOrEqual(480);
    expect(Math.min(...all)).toBeGreaterThanOrEqual(0);
    expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
  });
});

describe('reflectionPlane(response, requirement)', () => {
  it('names the reflection at the marks', () => {
    // At f0 nothing is reflected; 14 dB is |Γ| = 10^(-14/20) = 0.1995.
    const figure = reflectionPlane(swept, requirement);
    expect(words(figure)).toEqual(
      expect.arrayContaining(['151.25 MHz: Γ = 0.000', 'required: |Γ| ≤ 0.200 (14 dB)', '|Γ| ≤ 0.5']),
    );
    expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
  });

  it('marks no frequency between samples', () => {
    const figure = reflectionPlane(resonance(100e6, 200e6), requirement);
    expect(words(figure).join()).not.toContain('151.25 MHz');
  });

  it('cuts what lies beyond the unit circle', () => {
    const large = { ...swept, gammaRe: swept.gammaRe.map((re) => 5 * re), gammaIm: swept.gammaIm.map((im) => 5 * im) };
    const traces = paths(reflectionPlane(large, requirement)).filter(({ stroke }) => stroke === 'accent');
    for (const value of traces.flatMap(({ d }) => coordinates(d))) expect(value >= 0 && value <= 480).toBe(true);
  });
});
