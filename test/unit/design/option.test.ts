import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import type { Fields } from '../../../src/record/fields.ts';
import { recordOf } from '../record-of.ts';

const optionsOf = (fields: Fields) => design(recordOf(fields)).options;

describe('options: half-power bandwidth both ways', () => {
  it('takes QL = Q/2 of the section and f0/QL', () => {
    // 10 Ω to 1010 Ω: Q = 10, QL = 5.
    for (const { loadedQ, bandwidthFromQHz } of optionsOf({ frequency: '100M', source: '10', load: '1010' })) {
      expect(loadedQ).toBeCloseTo(5, 12);
      expect(bandwidthFromQHz).toBeCloseTo(20e6, 3);
    }
  });

  it('says that the estimate holds where Q is high and the ends are resistive', () => {
    // Q = √999: the sweep must come within 10 % of f0/QL, since edges are at about f0(1 ± 1/Q).
    for (const { bandwidthNote, halfPower, bandwidthFromQHz } of optionsOf({
      frequency: '100M',
      source: '1',
      load: '1000',
    })) {
      expect(Math.abs(bandwidthFromQHz! / halfPower.bandwidthHz! - 1)).toBeLessThan(0.1);
      expect(bandwidthNote).toMatch(/within 10 % of the sweep \([+−]?\d %\)/);
    }
  });

  it('says that it does not hold, and why: low Q, reactive ends, several sections', () => {
    const lowQ = optionsOf({ frequency: '100M', source: '50', load: '500' });
    expect(lowQ.map(({ bandwidthNote }) => bandwidthNote).join()).toMatch(/does not hold .*this Q is low/);
    for (const { bandwidthNote } of optionsOf({ frequency: '151.25M', source: '50', load: '9.4-j61' })) {
      expect(bandwidthNote).toMatch(/does not hold \(\+\d+ % against the sweep\): .*terminations' reactance/);
    }
    const several = optionsOf({ frequency: '100M', source: '1', load: '1000', method: 'cascade', sections: '2' });
    for (const { bandwidthNote, halfPower } of several) {
      if (halfPower.bandwidthHz !== null) expect(bandwidthNote).toMatch(/one section alone/);
    }
  });

  it('says that it does not compare where an edge is absent, and which', () => {
    const [low, high] = optionsOf({ frequency: '100M', source: '12.5', load: '50' });
    expect(low!.halfPower.words).toMatch(/^none below \(low-pass\); up to 152\.8 MHz$/);
    expect(high!.halfPower.words).toMatch(/^from 65\.47 MHz; none above \(high-pass\)$/);
    for (const { bandwidthNote } of [low!, high!]) expect(bandwidthNote).toMatch(/finds none on one side/);
  });

  it('has none of either where no part is needed', () => {
    const [direct] = optionsOf({ frequency: '100M', source: '50', load: '50' });
    expect(direct).toMatchObject({ loadedQ: null, bandwidthFromQHz: null, form: 'all-pass', sections: 0 });
    expect(direct!.halfPower).toMatchObject({
      lowHz: null,
      highHz: null,
      bandwidthHz: null,
      peakHz: 100e6,
      peakGain: 1,
    });
    expect(direct!.halfPower.words).toMatch(/no edge on either side/);
  });

  it('writes edges with digits enough to show a narrow band', () => {
    // 1 mΩ to 1 MΩ: Q = 31623, a band of about 63 ppm; four digits would show no width.
    for (const { halfPower } of optionsOf({ frequency: '100M', source: '1m', load: '1M' })) {
      const [low, high] = halfPower.words.split(' to ');
      expect(low).not.toBe(high);
      expect(halfPower.bandwidthHz! / 100e6).toBeCloseTo(2 / Math.sqrt(1e9), 8);
    }
  });
});

describe('options: harmonics', () => {
  it('attenuates what a low-pass should: a high-pass does it less', () => {
    const [low, high] = optionsOf({ frequency: '100M', source: '50', load: '500' });
    // 4n/[(n + 1 − Q²u²)² + 4Q²u²] with n = 10, Q² = 9; the high-pass at 1/u.
    const db = (u: number): number => -10 * Math.log10(40 / ((11 - 9 * u * u) ** 2 + 36 * u * u));
    expect(low!.harmonicDb).toEqual([
      { order: 2, attenuationDb: expect.closeTo(db(2), 9) },
      { order: 3, attenuationDb: expect.closeTo(db(3), 9) },
    ]);
    expect(high!.harmonicDb).toEqual([
      { order: 2, attenuationDb: expect.closeTo(db(1 / 2), 9) },
      { order: 3, attenuationDb: expect.closeTo(db(1 / 3), 9) },
    ]);
  });

  it('is negative where a harmonic passes better than f0', () => {
    // Reflectionless at f0 delivers RS²/|ZS|² only; where the source's reactance cancels, more passes.
    const options = optionsOf({ frequency: '100M', source: '10-j30', load: '10', aim: 'reflectionless' });
    const least = Math.min(
      ...options.flatMap(({ harmonicDb }) => harmonicDb.map(({ attenuationDb }) => attenuationDb!)),
    );
    expect(least).toBeLessThan(0);
  });
});

describe('options: direct current', () => {
  it('tells each path in words', () => {
    const words = (fields: Fields): Record<string, string> =>
      Object.fromEntries(optionsOf(fields).map(({ title, dc }) => [title, dc.words]));
    expect(words({ frequency: '100M', source: '10', load: '50' })).toEqual({
      'Series L, shunt C': 'series path open to DC; no short to ground',
      'Series C, shunt L': 'series path blocked; shorted to ground at the load',
    });
    expect(words({ frequency: '151.25M', source: '50', load: '9.4-j61' })).toMatchObject({
      'Series L, shunt L': 'series path open to DC; shorted to ground at the source and the load',
    });
  });
});
