import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { lineProblem } from './line-problem.ts';
import type { Measured, MeasuredData } from './measured.ts';
import { readTable } from './read-table.ts';
import { readTouchstone } from './read-touchstone.ts';
import { interpolate, slopesOf } from './shape-preserving.ts';

/** Samples that a record carries; a longer sweep is thinned, and how well the rest stands for it is told. */
const mostKept = 2001;

/**
 * What no table has: the option line of a Touchstone file, or the keyword that begins one of version 2. Blanks within one
 * line alone: over line ends, a text of nothing else would be gone through again from each of them.
 */
const optionLine =
  /^[ \t]*(?:#(?:[ \t]*(?:[kmg]?hz|[syzgh]|ma|db|ri|r[ \t]*[\d.]+)(?=\s|$))+[ \t]*(?:!.*)?$|\[version\])/imu;

/**
 * A termination from the text of a Touchstone file (by its ending) or of a table of frequency, R and X.
 *
 * @param port of a two-port file
 * @throws InputError with the number of the line that can't be used
 */
export function measuredTermination(text: string, name: string, port: 1 | 2 = 1): { readonly measured: MeasuredData } {
  const touchstone = /\.s\d+p$/iu.test(name) || optionLine.test(text);
  const measured = touchstone ? readTouchstone(text, name, port) : readTable(text);
  if (measured.frequencyHz.length < 2) {
    throw lineProblem(0, 'one sample is too few to interpolate', 'give two frequencies or more');
  }
  const { kept, error } = thin(measured);
  const pick = (values: Float64Array): number[] => kept.map((k) => values[k]!);
  return {
    measured: {
      name: port === 2 ? `${name} (port 2)` : name,
      sha256: bytesToHex(sha256(utf8ToBytes(text))),
      samples: measured.frequencyHz.length,
      thinningError: error,
      referenceOhm: measured.referenceOhm,
      frequencyHz: pick(measured.frequencyHz),
      re: pick(measured.re),
      im: pick(measured.im),
    },
  };
}

/** Evenly chosen samples, first and last among them, and the largest |ΔΓ| of those left out. */
function thin({ frequencyHz, re, im }: Measured): { readonly kept: readonly number[]; readonly error: number } {
  const n = frequencyHz.length;
  if (n <= mostKept) return { kept: Array.from({ length: n }, (_, k) => k), error: 0 };
  const kept = Array.from({ length: mostKept }, (_, k) => Math.round((k * (n - 1)) / (mostKept - 1)));
  const f = Float64Array.from(kept, (k) => frequencyHz[k]!);
  const keptRe = Float64Array.from(kept, (k) => re[k]!);
  const keptIm = Float64Array.from(kept, (k) => im[k]!);
  const slopesRe = slopesOf(f, keptRe);
  const slopesIm = slopesOf(f, keptIm);
  let error = 0;
  let interval = 0;
  for (let k = 0; k < n; k += 1) {
    while (interval < mostKept - 2 && f[interval + 1]! <= frequencyHz[k]!) interval += 1;
    const dRe = interpolate(f, keptRe, slopesRe, interval, frequencyHz[k]!) - re[k]!;
    const dIm = interpolate(f, keptIm, slopesIm, interval, frequencyHz[k]!) - im[k]!;
    error = Math.max(error, Math.hypot(dRe, dIm));
  }
  return { kept, error };
}
