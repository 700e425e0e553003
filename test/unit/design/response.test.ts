import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import { sweepSpan } from '../../../src/design/response.ts';
import type { Fields } from '../../../src/record/fields.ts';
import { recordOf } from '../record-of.ts';

const plain: Fields = { frequency: '100M', source: '12.5', load: '50' };

describe('sweepSpan(record)', () => {
  it.each<[string, Fields, number, number]>([
    ['half an octave to either side of f0', {}, 100e6 / Math.SQRT2, 100e6 * Math.SQRT2],
    ['the band with half an octave to either side', { band: '90M..110M' }, 90e6 / Math.SQRT2, 110e6 * Math.SQRT2],
    ['a wide band with as much again to either side', { band: '50M..200M' }, 12.5e6, 800e6],
    ['what is asked for', { sweep: '10M..1G' }, 10e6, 1e9],
  ])('is %s', (_, fields, low, high) => {
    const span = sweepSpan(recordOf({ ...plain, ...fields }), null);
    expect(span.low / low).toBeCloseTo(1, 12);
    expect(span.high / high).toBeCloseTo(1, 12);
  });

  it('stays within a thousand times f0', () => {
    const { low, high } = sweepSpan(recordOf({ ...plain, band: '0.2M..50G' }), null);
    expect([low, high]).toEqual([0.1e6, 100e9]);
  });
});

describe('the response of the chosen network', () => {
  const { responses } = design(recordOf({ ...plain, band: '93M..107M', sweep: '10M..1G' }));
  const { frequencyHz, transducerGainDb, returnLossDb, vswr, mismatchLossDb, gammaRe, gammaIm } = responses[0]!;
  const at = (hz: number): number => frequencyHz.indexOf(hz);

  it('has f0, the edges of the band and the ends of the sweep among its frequencies', () => {
    for (const hz of [10e6, 93e6, 100e6, 107e6, 1e9]) expect(at(hz)).toBeGreaterThanOrEqual(0);
    expect(frequencyHz.length).toBeGreaterThan(200);
  });

  it('is the closed form 16/(25 − 18u² + 9u⁴) everywhere, and its figures follow from that', () => {
    frequencyHz.forEach((hz, k) => {
      const u = hz / 100e6;
      const gain = 16 / (25 - 18 * u ** 2 + 9 * u ** 4);
      expect(transducerGainDb[k]).toBeCloseTo(10 * Math.log10(gain), 9);
      expect(mismatchLossDb[k]).toBeCloseTo(-10 * Math.log10(gain), 9);
      if (hz === 100e6) return;
      const gamma = Math.sqrt(1 - gain);
      expect(Math.hypot(gammaRe[k]!, gammaIm[k]!)).toBeCloseTo(gamma, 8);
      if (gamma < 1e-3) return;
      expect(returnLossDb[k]).toBeCloseTo(-20 * Math.log10(gamma), 5);
      expect(vswr[k]! / ((1 + gamma) / (1 - gamma))).toBeCloseTo(1, 5);
    });
  });

  it('is perfect at f0, within the limits of what is written', () => {
    const k = at(100e6);
    expect(returnLossDb[k]!).toBeGreaterThan(200 - 1);
    expect(vswr[k]).toBeCloseTo(1, 9);
    expect(transducerGainDb[k]).toBeCloseTo(0, 12);
  });
});

describe('responseOf(record, state, chosen, reach)', () => {
  it('shows a peak that is narrower than the even samples are apart', () => {
    // T of Q 200: a half-power band of about 1.5 MHz in a span of about 106 MHz, whose 201 samples lie 0.5 MHz apart.
    const { responses, options, chosen } = design(
      recordOf({ method: 'tee', frequency: '150M', source: '50', load: '70', q: '200' }),
    );
    const { lowHz, highHz } = options.find(({ id }) => id === chosen)!.halfPower;
    const { frequencyHz, transducerGainDb, returnLossDb } = responses[0]!;
    expect(frequencyHz.filter((hz) => lowHz! <= hz && hz <= highHz!).length).toBeGreaterThanOrEqual(10);
    frequencyHz.slice(1).forEach((hz, k) => expect(hz).toBeGreaterThan(frequencyHz[k]!));
    expect(transducerGainDb.length).toBe(frequencyHz.length);
    expect(returnLossDb.length).toBe(frequencyHz.length);
  });

  it('samples every load state at the same frequencies', () => {
    const { responses } = design(
      recordOf({ method: 'pi', frequency: '150M', source: '50', load: 'a = 70\nb = 65+j5', q: '100' }),
    );
    expect(responses).toHaveLength(2);
    expect(responses[1]!.frequencyHz).toEqual(responses[0]!.frequencyHz);
    expect(responses[0]!.frequencyHz.length).toBeGreaterThan(202);
  });
});
