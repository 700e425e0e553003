import { describe, expect, it } from 'vitest';
import type { AsBuiltFigures, Percentiles } from '../../../src/dossier.ts';
import { finishedBoardPlot } from '../../../src/figures/finished-board-plot.ts';
import { requirement, resonance } from './fixture.ts';
import { outside, overlaps, textsOf } from './overlap.ts';

const span = { low: 130e6, high: 175e6 };
const predicted = resonance(140e6, 165e6);
/** The board measures what was predicted five samples of 125 kHz lower. */
const later = <T>(values: readonly T[]): readonly T[] => values.map((value, k) => values[k + 5] ?? value);
const board: AsBuiltFigures = {
  name: 'board.s1p',
  sha256: '0'.repeat(64),
  referenceOhm: 50,
  samples: predicted.frequencyHz.length,
  measuredHz: { low: 140e6, high: 165e6 },
  attached: { state: 'in hand', by: 'engineer', distances: [] },
  overlay: {
    frequencyHz: predicted.frequencyHz,
    measuredRe: later(predicted.gammaRe),
    measuredIm: later(predicted.gammaIm),
    measuredDb: later(predicted.returnLossDb),
    predictedRe: predicted.gammaRe,
    predictedIm: predicted.gammaIm,
    predictedDb: predicted.returnLossDb,
  },
  verdict: {
    verdict: 'meets',
    requiredDb: 14,
    bandHz: { low: 150.5e6, high: 152e6 },
    coveredHz: null,
    worstReturnLossDb: null,
    worstAtHz: null,
    predictedDb: null,
  },
  outside: null,
  distance: 0.1,
  conclusion: 'unexplained',
  explanations: [],
  alike: 0,
  remedy: null,
};
const shifted = (db: number) => predicted.returnLossDb.map((value) => Math.max(0, Math.min(30, value + db)));
const state = (name: string) => ({
  state: name,
  frequencyHz: predicted.frequencyHz,
  nominalDb: shifted(-2),
  curvesDb: [shifted(-5), shifted(1)],
});
const real: Percentiles = { fractions: [0.05, 0.95], states: [state('free space'), state('in hand')] };

const words = (figure: ReturnType<typeof finishedBoardPlot>) => textsOf(figure).map(({ text }) => text);
const paths = (figure: ReturnType<typeof finishedBoardPlot>) => figure.shapes.filter(({ kind }) => kind === 'path');
const dashed = (figure: ReturnType<typeof finishedBoardPlot>) =>
  paths(figure).filter((shape) => 'dash' in shape && shape.dash.join() === '4,2');
/** Circles filled with ink; one of them in the key. */
const dots = (figure: ReturnType<typeof finishedBoardPlot>) =>
  paths(figure).filter((shape) => 'fill' in shape && shape.fill === 'ink');

describe('finishedBoardPlot(board, requirement, span, real)', () => {
  it('draws measured solid with dots, predicted dashed, in the band of the state attached', () => {
    const figure = finishedBoardPlot(board, requirement, span, real);
    expect(words(figure)).toEqual(
      expect.arrayContaining([
        'measured on the finished board',
        'predicted: nominal, and 5 % to 95 % of networks',
        'required: at least 14 dB',
        'f₀ 151.25 MHz',
      ]),
    );
    // Key and curve.
    expect(dashed(figure)).toHaveLength(2);
    expect(dots(figure).length).toBeGreaterThan(10);
    expect(paths(figure).filter((shape) => 'fillOpacity' in shape)).toHaveLength(2);
    expect(overlaps(figure)).toEqual([]);
    expect(outside(figure)).toEqual([]);
  });

  it('draws the prediction alone where no band of that state was worked out', () => {
    for (const none of [null, { ...real, states: [state('free space')] }]) {
      const figure = finishedBoardPlot(board, requirement, span, none);
      expect(words(figure)).toContain('predicted');
      expect(dashed(figure)).toHaveLength(2);
      expect(paths(figure).some((shape) => 'fillOpacity' in shape)).toBe(false);
    }
  });

  it('shows a single sample as a dot', () => {
    const { overlay } = board;
    const at = (values: readonly number[]) => values.slice(0, 1);
    const one = {
      frequencyHz: at(overlay.frequencyHz),
      measuredRe: at(overlay.measuredRe),
      measuredIm: at(overlay.measuredIm),
      measuredDb: at(overlay.measuredDb),
      predictedRe: at(overlay.predictedRe),
      predictedIm: at(overlay.predictedIm),
      predictedDb: at(overlay.predictedDb),
    };
    const figure = finishedBoardPlot({ ...board, overlay: one }, { ...requirement, returnLossDb: null }, span, null);
    expect(dots(figure)).toHaveLength(2);
    expect(figure.shapes.every((shape) => !/NaN|Infinity|undefined/u.test(JSON.stringify(shape)))).toBe(true);
    expect(figure.description).toContain('No return loss is required.');
  });

  it('says in words what is drawn', () => {
    expect(finishedBoardPlot(board, requirement, span, real).description).toMatch(
      /^Return loss of the finished board \(board\.s1p\) from 130\.0 MHz to 175\.0 MHz: measured between .* dB and .* dB; predicted at the same frequencies between .*\. Required: at least 14 dB from 150\.5 MHz to 152 MHz\.$/u,
    );
  });
});
