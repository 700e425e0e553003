import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import type { Dossier } from '../../src/dossier.ts';
import { anyRecord } from './records.ts';

/** Where src/dossier.ts says that null may stand, besides inside the record. */
const mayBeNull = [
  /^\.(sections|proposed|chosen|ceiling|evidence|asBuilt|difference)$/,
  /^\.options\[\]\.built(\.(yield|percentiles|corners|stress))?$/,
  /^\.options\[\]\.built\.ladder\.arms\[\]\.q$/,
  /^\.options\[\]\.built\.parts\[\]\.(pair|selfResonanceHz|ratedVolts|ratedAmps)$/,
  /^\.options\[\]\.built\.(sets\[\]\.yield|corners\.meets|sensitivity\[\]\.yieldIfHalved)$/,
  /^\.options\[\]\.built\.stress\.(vswr|first|within|parts\[\]\.(mismatched|limitW|limitBy))$/,
  /^\.options\[\]\.built\.coils\[\]\.(selfCapacitanceF|selfResonanceHz)$/,
  /^\.options\[\]\.(states\[\]\.)?(worstReturnLossDb|worstAtHz|loadedQ|bandwidthFromQHz|ceilingGapDb)$/,
  /\.halfPower\.(lowHz|highHz|bandwidthHz)$/,
  /^\.sections\.(smallest|bestReturnLossDb)$/,
  /^\.sections\.rows\[\]\.(worstReturnLossDb|holds)$/,
  /^\.ceiling\.needs$/,
  /^\.evidence\.routes\[\]\.(seen|transducerGain)$/,
];

/** Every value of the dossier with its path; a list's index is written []. */
function walk(value: unknown, path: string, visit: (value: unknown, path: string) => void): void {
  visit(value, path);
  if (Array.isArray(value)) for (const inner of value) walk(inner, `${path}[]`, visit);
  else if (typeof value === 'object' && value !== null) {
    for (const [name, inner] of Object.entries(value)) walk(inner, `${path}.${name}`, visit);
  }
}

function soundness(dossier: Dossier): string[] {
  const found: string[] = [];
  walk(dossier, '', (value, path) => {
    if (path.startsWith('.record')) return;
    if (typeof value === 'number' && !Number.isFinite(value)) found.push(`${path} is ${String(value)}`);
    if (value === undefined) found.push(`${path} is undefined`);
    if (value === null && !mayBeNull.some((allowed) => allowed.test(path))) found.push(`${path} is null`);
    if (typeof value === 'string' && /NaN|Infinity|undefined|null|\[object/.test(value))
      found.push(`${path}: ${value}`);
  });
  return found;
}

describe('design(record) of any record', () => {
  it('holds no NaN, no infinity and no null but where a value may be absent; its JSON reads back as itself', () => {
    fc.assert(
      fc.property(anyRecord(1e4), (record) => {
        const dossier = design(record);
        expect(soundness(dossier)).toEqual([]);
        const text = JSON.stringify(dossier);
        expect(JSON.stringify(JSON.parse(text))).toBe(text);
      }),
      { numRuns: 80 },
    );
  });

  it('keeps every figure in its range', () => {
    fc.assert(
      fc.property(anyRecord(1e3), (record) => {
        const { options, responses, chosen, proposed, chosenBy } = design(record);
        expect(options.length).toBeGreaterThan(0);
        expect(new Set(options.map(({ id }) => id)).size).toBe(options.length);
        expect(options.map(({ id }) => id)).toContain(chosen);
        expect(chosenBy).toBe(proposed === null ? 'nearest' : 'proposal');
        for (const option of options) {
          expect(option.transducerGain).toBeGreaterThan(0);
          expect(option.transducerGain).toBeLessThanOrEqual(1);
          expect(option.reflection).toBeLessThanOrEqual(1e-9);
          expect(option.designators).toHaveLength(option.arms.length);
          expect(option.reasons.length).toBeGreaterThan(0);
          expect(option.meets).toBe(option.checks.every(({ verdict }) => verdict === 'meets'));
          const { lowHz, highHz, peakHz, bandwidthHz } = option.halfPower;
          if (lowHz !== null) expect(lowHz).toBeLessThan(peakHz);
          if (highHz !== null) expect(highHz).toBeGreaterThan(peakHz);
          expect(bandwidthHz).toBe(lowHz === null || highHz === null ? null : highHz - lowHz);
        }
        const { spanHz, frequencyHz, returnLossDb, vswr, mismatchLossDb, transducerGainDb, gammaRe, gammaIm } =
          responses[0]!;
        const { frequencyHz: f0, bandHz } = record.requirement;
        expect(frequencyHz[0]).toBe(spanHz.low);
        expect(frequencyHz.at(-1)).toBe(spanHz.high);
        expect(frequencyHz).toContain(f0);
        if (bandHz !== null && record.sweepHz === null)
          expect(frequencyHz).toEqual(expect.arrayContaining([bandHz.low, bandHz.high]));
        expect(frequencyHz.every((hz, k) => k === 0 || hz > frequencyHz[k - 1]!)).toBe(true);
        const within = (values: readonly number[], low: number, high: number): void =>
          expect(values.filter((value) => !(low <= value && value <= high))).toEqual([]);
        within(returnLossDb, 0, 200);
        within(vswr, 1, 1e6);
        within(mismatchLossDb, 0, 200);
        within(transducerGainDb, -200, 0);
        // Nothing passive between passive ends: |Γ| <= 1 for the conjugate aim, by at most a rounding.
        const most = record.aim === 'conjugate' ? 1 + 1e-12 : Infinity;
        within(
          gammaRe.map((re, k) => Math.hypot(re, gammaIm[k]!)),
          0,
          most,
        );
        for (const values of [returnLossDb, vswr, mismatchLossDb, transducerGainDb, gammaRe, gammaIm]) {
          expect(values).toHaveLength(frequencyHz.length);
        }
      }),
      { numRuns: 40 },
    );
  });
});
