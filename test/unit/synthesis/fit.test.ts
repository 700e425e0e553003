import { describe, expect, it, vi } from 'vitest';
import { design, designSteps } from '../../../src/design.ts';
import type { FitStep } from '../../../src/design/fitted.ts';
import type { Dossier, Option } from '../../../src/dossier.ts';
import type { Arm } from '../../../src/network/arm.ts';
import { dcPath } from '../../../src/network/dc-path.ts';
import { prepareLadder } from '../../../src/network/ladder.ts';
import { endsOver, sweep } from '../../../src/network/sweep.ts';
import { logGrid } from '../../../src/network/worst-in-band.ts';
import type { Fields } from '../../../src/record/fields.ts';
import { recordOf } from '../record-of.ts';

// Seconds on a quiet machine; several jobs at once take their share.
vi.setConfig({ testTimeout: 60_000 });

/** Limits that bind nothing. */
const unlimited = { inductors: '1f..1', capacitors: '1a..1m' } as const;

/** Band of a fractional width about its geometric centre. */
function band(f0: number, w: number): string {
  const half = Math.asinh(w / 2);
  return `${String(f0 * Math.exp(-half))}..${String(f0 * Math.exp(half))}`;
}

const fitOf = (fields: Fields): Dossier =>
  design(recordOf({ method: 'fitted', source: '50', frequency: '100M', ...fields }));
const best = ({ options }: Dossier): Option =>
  options.toSorted((a, b) => b.worstReturnLossDb! - a.worstReturnLossDb!)[0]!;

describe('fit(problem) between two resistances', () => {
  const pairs = [
    [4, 0.3, 1],
    [4, 0.3, 2],
    [30, 0.5, 2],
    [10, 0.6, 3],
    [6, 0.3, 4],
  ] as const;

  it.each(pairs)(
    '50 Ω to %i × 50 Ω, width %f: 2 × %i low-pass elements reach the equal-ripple optimum within 0.05 dB, and do not pass it',
    (ratio, w, n) => {
      const given = { load: String(50 * ratio), band: band(100e6, w) };
      const { options } = design(
        recordOf({ ...given, method: 'equal-ripple', frequency: '100M', source: '50', sections: String(n) }),
      );
      const found = best(fitOf({ ...given, ...unlimited, elements: String(2 * n), 'fit-form': 'low-pass' }));
      expect(found.worstReturnLossDb! - options[0]!.worstReturnLossDb!).toBeGreaterThan(-0.05);
      expect(found.worstReturnLossDb! - options[0]!.worstReturnLossDb!).toBeLessThan(1e-6);
      expect(found.form).toBe('low-pass');
    },
  );

  it.each(pairs.slice(0, 4))(
    '50 Ω to %i × 50 Ω, width %f: with any form, 2 × %i elements do no worse',
    (ratio, w, n) => {
      const given = { load: String(50 * ratio), band: band(100e6, w) };
      const { options } = design(
        recordOf({ ...given, method: 'equal-ripple', frequency: '100M', source: '50', sections: String(n) }),
      );
      const found = best(fitOf({ ...given, ...unlimited, elements: String(2 * n) }));
      expect(found.worstReturnLossDb! - options[0]!.worstReturnLossDb!).toBeGreaterThan(-0.05);
    },
  );
});

describe("fit(problem) of one reactance into 50 Ω, against Fano's optimum of n resonators", () => {
  const omega = 2 * Math.PI * 100e6;
  /** The load, its Q at 100 MHz and the band's width. Q·w = 0.8: 18.20 dB for n = 2, 22.94 dB for n = 3. */
  const cases = [
    { load: `rc-series 14 ${String(1 / (omega * 8 * 14))}`, q: 8, w: 0.1, two: 18.2, three: 22.94 },
    { load: `rc-parallel 200 ${String(40 / (omega * 200))}`, q: 40, w: 0.02, two: 18.2, three: 22.94 },
    // tanh(2a)/cosh a = tanh(2b)/cosh b, sinh a − sinh b = √2/(Q·w): Q·w = 1 gives |Γ| = 0.17157 and 0.11101 (SciPy).
    { load: `rl-series 30 ${String((4 * 30) / omega)}`, q: 4, w: 0.25, two: 15.311, three: 19.093 },
  ] as const;

  it.each(cases)('Q $q, width $w: 5 elements reach $two dB within 0.15 dB', ({ load, q, w, two }) => {
    const dossier = fitOf({ ...unlimited, load, band: band(100e6, w), elements: '5' });
    expect(dossier.ceiling!.q).toBeCloseTo(q, 9);
    expect(best(dossier).worstReturnLossDb).toBeGreaterThan(two - 0.15);
    for (const { worstReturnLossDb, ceilingGapDb } of dossier.options) {
      expect(ceilingGapDb).toBeGreaterThan(0);
      const ceilingDb = (20 / Math.LN10) * (Math.PI / (q * w));
      expect(worstReturnLossDb! + ceilingGapDb!).toBeCloseTo(ceilingDb, 6);
    }
  });

  it.each(cases)('Q $q, width $w: 7 elements reach $three dB within 0.3 dB', ({ load, w, three }) => {
    const dossier = fitOf({ ...unlimited, load, band: band(100e6, w), elements: '7' });
    expect(best(dossier).worstReturnLossDb).toBeGreaterThan(three - 0.3);
  });

  it('never beats the ceiling with any number of elements (24 loads)', () => {
    for (let k = 0; k < 24; k += 1) {
      const w = 0.02 * 1.25 ** (k % 12);
      const q = 0.5 * 1.3 ** ((7 * k) % 24);
      const r = 3 * 1.3 ** ((5 * k) % 24);
      const load =
        k % 2 === 0
          ? `rc-series ${String(r)} ${String(1 / (omega * q * r))}`
          : `rl-parallel ${String(r)} ${String(r / (omega * q))}`;
      const { options } = fitOf({ ...unlimited, load, band: band(100e6, w), elements: String(2 + (k % 2)) });
      for (const { ceilingGapDb } of options) expect(ceilingGapDb).toBeGreaterThan(0);
    }
  });
});

describe('fit(problem) and what the engineer asks', () => {
  const antenna: Fields = { load: 'antenna 20 100M 6', band: '95M..105M', elements: '4' };

  it('gives the same networks for the same seed, and as good ones for another', () => {
    const [a, b, c] = ['1', '1', '2'].map((seed) => fitOf({ ...antenna, 'fit-seed': seed }));
    expect(a!.options).toEqual(b!.options);
    expect(a!.digest).not.toBe(c!.digest);
    expect(Math.abs(best(a!).worstReturnLossDb! - best(c!).worstReturnLossDb!)).toBeLessThan(0.1);
  });

  it('keeps every value inside its limits, also where the optimum lies outside', () => {
    const limits = { inductors: '20n..60n', capacitors: '10p..40p' } as const;
    const { options } = fitOf({ ...antenna, ...limits });
    expect(options.length).toBeGreaterThan(0);
    for (const { arms, meets } of options) {
      expect(meets).toBe(true);
      for (const { part, value } of arms) {
        const [low, high] = part === 'inductor' ? [20e-9, 60e-9] : [10e-12, 40e-12];
        expect(value).toBeGreaterThanOrEqual(low * (1 - 1e-12));
        expect(value).toBeLessThanOrEqual(high * (1 + 1e-12));
      }
    }
  });

  it.each([
    ['low-pass', { 'fit-form': 'low-pass' }],
    ['high-pass', { 'fit-form': 'high-pass' }],
  ] as const)('%s: every network has that form', (form, rule) => {
    const { options } = fitOf({ ...antenna, ...rule });
    expect(options.length).toBeGreaterThan(0);
    for (const option of options) expect(option.form).toBe(form);
  });

  it.each([
    ['a DC block', { 'block-dc': 'yes' }],
    ['no shunt inductor', { 'shunt-inductor': 'no' }],
    ['DC kept at the source', { 'keep-dc': 'source' }],
    ['DC kept at the load', { 'keep-dc': 'load' }],
    ['DC kept at both ends and blocked between', { 'keep-dc': 'both', 'block-dc': 'yes' }],
  ] as const)('%s: every network keeps to it and meets it', (_, rule: Fields) => {
    const { options } = fitOf({ ...antenna, ...rule });
    expect(options.length).toBeGreaterThan(0);
    for (const { arms, meets } of options) {
      expect(meets).toBe(true);
      expect(arms).toHaveLength(4);
      const dc = dcPath(arms);
      if (rule['block-dc'] === 'yes') expect(dc.blocked).toBe(true);
      if (rule['keep-dc'] === 'source' || rule['keep-dc'] === 'both') expect(dc.sourceShorted).toBe(false);
      if (rule['keep-dc'] === 'load' || rule['keep-dc'] === 'both') expect(dc.loadShorted).toBe(false);
      if (rule['shunt-inductor'] === 'no') {
        expect(arms.some(({ arm, part }) => arm === 'shunt' && part === 'inductor')).toBe(false);
      }
    }
  });

  it('finds nothing, and says so, where the rules leave no form: a low-pass ladder has no DC block', () => {
    const dossier = fitOf({ ...antenna, 'fit-form': 'low-pass', 'block-dc': 'yes' });
    expect(dossier.options).toEqual([]);
    expect(dossier.chosen).toBeNull();
    expect(dossier.minimum).toBe('No network was found.');
    expect(dossier.responses).toEqual([]);
  });

  it('holds every load state at once: better in its worst state than networks fitted to either alone are in theirs', () => {
    const states = ['antenna 20 97M 6', 'antenna 20 103M 6'];
    const both = recordOf({ ...antenna, frequency: '100M', source: '50', load: states.join('\n') });
    const worst = (arms: readonly Arm[]): number => {
      const db = both.loads.flatMap(({ termination }) => {
        const ends = endsOver(both.source, termination, 100e6, logGrid(95e6, 105e6, 201));
        const { gammaRe, gammaIm } = sweep(prepareLadder(arms), ends, 'conjugate');
        return Array.from(gammaRe, (re, k) => -20 * Math.log10(Math.hypot(re, gammaIm[k]!)));
      });
      return Math.min(...db);
    };
    const found = best(fitOf({ ...antenna, load: states.join('\n') }));
    expect(found.states).toHaveLength(2);
    expect(worst(found.arms)).toBeCloseTo(found.worstReturnLossDb!, 2);
    for (const load of states) {
      expect(found.worstReturnLossDb).toBeGreaterThan(worst(best(fitOf({ ...antenna, load })).arms));
    }
  });
});

describe('designSteps(record, control)', () => {
  const record = recordOf({
    method: 'fitted',
    source: '50',
    frequency: '100M',
    load: 'antenna 20 100M 6',
    band: '95M..105M',
    elements: '5',
  });

  /** Every step told, with a stop after the one of a given number. */
  function run(stopAfter: number, given = record): { readonly steps: readonly FitStep[]; readonly dossier: Dossier } {
    const control = { stopped: false };
    const steps: FitStep[] = [];
    const search = designSteps(given, control);
    for (;;) {
      const step = search.next();
      if (step.done === true) return { steps, dossier: step.value };
      if (step.value.kind === 'fit') steps.push(step.value.step);
      control.stopped = steps.length >= stopAfter;
    }
  }

  const whole = run(Infinity);

  it('tells of work that goes forward to the end, of a best that only gets better', () => {
    expect(whole.steps.length).toBeGreaterThan(5);
    whole.steps.forEach(({ done, steps, elements, bestDb }, k) => {
      expect(steps).toBe(k + 1);
      expect(elements).toBe(5);
      expect(done).toBeGreaterThan(0);
      expect(done).toBeLessThanOrEqual(1 + 1e-12);
      const before = whole.steps[k - 1];
      if (before === undefined) return;
      expect(done).toBeGreaterThanOrEqual(before.done);
      expect(bestDb).toBeGreaterThanOrEqual(before.bestDb!);
    });
    expect(whole.steps.at(-1)!.done).toBeCloseTo(1, 12);
  });

  it.each([1, 3, 10])(
    'a stop after step %i keeps the best so far; a record with that number gives the same',
    (after) => {
      const stopped = run(after);
      expect(stopped.steps).toHaveLength(after);
      expect(stopped.dossier.options).toHaveLength(1);
      const told = stopped.steps.at(-1)!.bestDb!;
      // What is told is of the search's own samples; the dossier's sweep is finer.
      expect(Math.abs(stopped.dossier.options[0]!.worstReturnLossDb! - told)).toBeLessThan(0.3);
      const again = run(Infinity, { ...record, fit: { ...record.fit, steps: after } });
      expect(again.dossier.options).toEqual(stopped.dossier.options);
      expect(again.dossier.chosen).toBe(stopped.dossier.chosen);
    },
  );

  it('without a stop is design(record), and does no worse than any stop', () => {
    expect(whole.dossier).toEqual(design(record));
    const early = run(3).dossier.options[0]!.worstReturnLossDb!;
    expect(best(whole.dossier).worstReturnLossDb).toBeGreaterThan(early - 0.05);
  });
});
