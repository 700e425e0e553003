import { describe, expect, it } from 'vitest';
import { ceilingOf } from '../../../src/design/ceiling.ts';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { modelImpedance } from '../../model-impedance.ts';
import type { Fields } from '../../../src/record/fields.ts';
import { recordOf } from '../record-of.ts';

const omega = 2 * Math.PI * 100e6;
/** 100 MHz is the geometric centre: 80·125 = 100². w = 0.45. */
const base: Fields = { frequency: '100M', source: '50', band: '80M..125M' };
const of = (fields: Fields) => ceilingOf(recordOf({ ...base, ...fields }));
const series = (r: number, q: number): string => `rc-series ${String(r)} ${String(1 / (omega * q * r))}`;
const db = (q: number): number => (20 / Math.LN10) * (Math.PI / (q * 0.45));

describe('ceilingOf(record)', () => {
  it('is exp(−π/(Q·w)) of the load at the geometric centre of the band', () => {
    const { ceiling, noCeiling } = of({ load: series(14, 4) });
    expect(noCeiling).toBe('');
    expect(ceiling!.q).toBeCloseTo(4, 10);
    expect(ceiling!.fractionalWidth).toBeCloseTo(0.45, 12);
    expect(ceiling!.bestReflection).toBeCloseTo(Math.exp(-Math.PI / 1.8), 10);
    expect(ceiling!.perResonators).toHaveLength(6);
    expect(ceiling).toMatchObject({
      governs: 'load',
      state: '',
      estimate: false,
      needs: null,
      verdict: 'not assessed',
    });
    expect(ceiling!.words).toBe(`No lossless network holds more than ${db(4).toFixed(2)} dB over the band.`);
  });

  it.each([
    ['an impedance with a part in series', { load: '14-j56', 'load-behaviour': 'series' }, 4],
    // 20 + j40 Ω is 100 Ω across 50 Ω of reactance: Q = 2.
    ['an impedance with a part in parallel', { load: '20+j40', 'load-behaviour': 'parallel' }, 2],
    ['the larger of two reactances', { load: `rlc-series 10 ${String(60 / omega)} ${String(1 / (omega * 25))}` }, 6],
    ['the smaller part in parallel', { load: `rlc-parallel 100 ${String(50 / omega)} ${String(1 / (omega * 80))}` }, 2],
    ['an antenna', { load: 'antenna 36 100M 7' }, 7],
  ] as const)('Q of %s', (_, fields, q) => {
    const { ceiling } = of(fields);
    expect(ceiling!.q).toBeCloseTo(q, 9);
    expect(ceiling!.estimate).toBe(false);
  });

  it('is governed by the source where its Q is the higher, by the worst load state where that is', () => {
    expect(of({ source: series(14, 5), load: series(30, 4) }).ceiling).toMatchObject({ governs: 'source', state: '' });
    const { ceiling } = of({ source: series(14, 5), load: `free = ${series(30, 4)}\niced = ${series(9, 6)}` });
    expect(ceiling).toMatchObject({ governs: 'load', state: 'iced' });
    expect(ceiling!.q).toBeCloseTo(6, 9);
  });

  it('sets the requirement against it: out of reach, so many resonators, room to spare', () => {
    // Q·w = 1.8: ceiling 15.16 dB; one resonator |Γ|² = (√(1 + 3.24) − 1)/(√(1 + 3.24) + 1), 4.60 dB.
    const asked = (returnLoss: string) => of({ load: series(14, 4), 'return-loss': returnLoss }).ceiling!;
    expect(asked('15.2')).toMatchObject({ verdict: 'out of reach', needs: null });
    expect(asked('15.2').words).toMatch(
      /^15\.20 dB can't be met by any lossless network: the ceiling is 15\.16 dB, 0\.04 dB less\.$/u,
    );
    expect(asked('4.5')).toMatchObject({ verdict: 'room to spare', needs: 1 });
    expect(asked('4.7')).toMatchObject({ verdict: 'within reach', needs: 2 });
    expect(asked('4.7').words).toMatch(/^4\.70 dB needs at least 2 resonators/u);
    expect(asked('15')).toMatchObject({ verdict: 'within reach', needs: null });
    expect(asked('15').words).toMatch(/needs more than 6 resonators/u);
  });

  it('has words for a load of next to no Q', () => {
    const { ceiling } = of({ load: series(50, 0.05) });
    expect(ceiling!.words).toBe('The ceiling is over 100 dB over the band, more than any network that can be built.');
  });

  it('is an estimate for measured data, from the one-resonance model, and tells how well that fits', () => {
    const rows = Array.from({ length: 101 }, (_, k) => {
      const hz = 75e6 + k * 0.6e6;
      const { re, im } = modelImpedance({ model: 'antenna', values: [36, 100e6, 5] }, hz);
      return `${String(hz)} ${String(re)} ${String(im)}`;
    });
    const measured = measuredTermination(rows.join('\n'), 'table');
    const record = recordOf({ ...base, load: '50' });
    const { ceiling } = ceilingOf({ ...record, loads: [{ name: '', termination: measured }] });
    expect(ceiling!.estimate).toBe(true);
    expect(ceiling!.q).toBeCloseTo(5, 2);
    expect(ceiling!.words).toMatch(/about/u);
    expect(ceiling!.basis).toMatch(
      /^one-resonance model \(series R 36\.\d+ Ω, Q 5\.\d+ at 100\.0 MHz\) fitted over the band, within 0\.00\d of Γ$/u,
    );
  });

  it('is an estimate for a reactance held constant, which none is', () => {
    const { ceiling } = of({ load: '14-j56', 'load-behaviour': 'constant' });
    expect(ceiling!.estimate).toBe(true);
    expect(ceiling!.basis).toMatch(/held constant/u);
  });

  it.each([
    ['no band', { load: series(14, 4), band: '' }, /belongs to a band; none is given/u],
    ['a band without width', { load: series(14, 4), band: '100M..100M' }, /belongs to a band/u],
    ['two resistances', { load: '200' }, /Between two resistances no ceiling exists/u],
    [
      'a reflectionless aim at a complex source',
      { source: '50+j20', load: series(14, 4), aim: 'reflectionless' },
      /no question of power/u,
    ],
  ])('has none with %s, and says why', (_, fields, why) => {
    const { ceiling, noCeiling } = of(fields);
    expect(ceiling).toBeNull();
    expect(noCeiling).toMatch(why);
  });
});
