import type { Response } from '../dossier.ts';
import { returnLossDb } from '../network/figures-of-merit.ts';

/** A step between samples that a straight line would show wrongly, dB. */
const steep = 1;
const parts = 16;

/**
 * The return loss with points put in where it is steep. Between samples it is Γ that runs smoothly, through zero at a
 * match; its logarithm doesn't, and straight lines up to a match's peak would draw the curve too wide.
 *
 * @returns frequencies, Hz, and return losses, dB, of equal length
 */
export function smoothReturnLoss({
  frequencyHz,
  returnLossDb: sampled,
  gammaRe,
  gammaIm,
}: Pick<Response, 'frequencyHz' | 'returnLossDb' | 'gammaRe' | 'gammaIm'>): {
  readonly hertz: readonly number[];
  readonly decibels: readonly number[];
} {
  const hertz: number[] = [];
  const decibels: number[] = [];
  frequencyHz.forEach((frequency, k) => {
    if (k > 0 && Math.abs(sampled[k]! - sampled[k - 1]!) > steep) {
      for (let part = 1; part < parts; part += 1) {
        const between = (values: readonly number[]): number =>
          values[k - 1]! + ((values[k]! - values[k - 1]!) * part) / parts;
        hertz.push(between(frequencyHz));
        decibels.push(returnLossDb(between(gammaRe) ** 2 + between(gammaIm) ** 2));
      }
    }
    hertz.push(frequency);
    decibels.push(sampled[k]!);
  });
  return { hertz, decibels };
}
