import { log10 } from '../quantity/elementary.ts';

/** Largest return loss or attenuation written, dB: beyond it rounding rules, and a perfect match has no number. */
export const highestDb = 200;
/** Largest VSWR written; a total reflection has no number. */
export const highestVswr = 1e6;

/** Return loss, dB (0 to 200), of a squared reflection magnitude (0 to 1). −10·log10 |Γ|². */
export const returnLossDb = (gammaSquared: number): number => attenuationDb(Math.min(1, gammaSquared));

/** −10·log10 of a power ratio, dB, at most 200. */
export const attenuationDb = (powerRatio: number): number =>
  Math.min(highestDb, -10 * log10(Math.max(powerRatio, 1e-20))) + 0;

/** Voltage standing wave ratio (1 to 1e6) of |Γ|. */
export function vswr(gamma: number): number {
  return gamma >= 1 ? highestVswr : Math.min(highestVswr, (1 + gamma) / (1 - gamma));
}

/** Mismatch loss, dB (0 to 200), of |Γ|²: −10·log10(1 − |Γ|²). */
export const mismatchLossDb = (gammaSquared: number): number => attenuationDb(1 - Math.min(1, gammaSquared));

/** Rounding in a return loss that doesn't make it fall short, dB. */
const slackDb = 1e-9;

/** Whether a return loss is at least the one asked for, dB. */
export const holds = (foundDb: number, askedDb: number): boolean => foundDb >= askedDb - slackDb;
