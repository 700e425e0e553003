import type { HalfPower, Response } from '../../../src/dossier.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';

export const requirement: DesignRecord['requirement'] = {
  frequencyHz: 151.25e6,
  bandHz: { low: 150.5e6, high: 152e6 },
  returnLossDb: 14,
  blockDc: true,
  keepDc: 'none',
  inductorH: { low: 1e-9, high: 10e-6 },
  capacitorF: { low: 1e-12, high: 100e-9 },
  powerW: 2,
};

export const halfPower: HalfPower = {
  lowHz: 139.2e6,
  highHz: 164.4e6,
  bandwidthHz: 25.2e6,
  peakHz: 151.25e6,
  peakGain: 1,
  words: '139.2 MHz to 164.4 MHz',
};

/** A single resonance of loaded Q 6 between equal resistances: Γ = jv/(2 + jv), v = 12·(f/f0 − f0/f). */
export function resonance(lowHz: number, highHz: number, extra: readonly number[] = []): Response {
  const f0 = requirement.frequencyHz;
  const even = Array.from({ length: 201 }, (_, k) => lowHz + ((highHz - lowHz) * k) / 200);
  const frequencyHz = [...new Set([...even, ...extra])].sort((a, b) => a - b);
  const v = frequencyHz.map((hertz) => 12 * (hertz / f0 - f0 / hertz));
  const squared = v.map((value) => value ** 2 / (4 + value ** 2));
  return {
    state: '',
    spanHz: { low: lowHz, high: highHz },
    frequencyHz,
    returnLossDb: squared.map((value) => Math.min(200, -10 * Math.log10(Math.max(value, 1e-20)))),
    vswr: squared.map((value) => Math.min(1e6, (1 + Math.sqrt(value)) / (1 - Math.sqrt(value)))),
    mismatchLossDb: squared.map((value) => -10 * Math.log10(1 - value)),
    transducerGainDb: squared.map((value) => 10 * Math.log10(1 - value)),
    gammaRe: v.map((value) => value ** 2 / (4 + value ** 2)),
    gammaIm: v.map((value) => (2 * value) / (4 + value ** 2)),
  };
}
