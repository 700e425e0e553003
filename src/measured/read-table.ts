import { Complex } from 'complex.js';
import { normalise, readQuantity } from '../quantity/read-quantity.ts';
import { lineProblem } from './line-problem.ts';
import type { Measured } from './measured.ts';

const headerUnits: Readonly<Record<string, string>> = { hz: '', khz: 'k', mhz: 'M', ghz: 'G', thz: 'T' };

/** Longest table and longest line of one, in characters: beyond them it is no table of measurements. */
const longestTable = 5_000_000;
const longestLine = 1000;

/**
 * Reads a pasted table of frequency, R and X, one sample a line: separated by blanks, tabs, semicolons, or commas where
 * they aren't decimal ones. A first line of words may name the unit of frequency ("f/MHz R X"); otherwise frequencies
 * are in hertz or carry their own prefix.
 *
 * @throws InputError with the number of the line that can't be used
 */
export function readTable(text: string): Measured {
  const referenceOhm = 50;
  const frequencyHz: number[] = [];
  const re: number[] = [];
  const im: number[] = [];
  let prefix = '';
  if (text.length > longestTable) {
    throw lineProblem(0, 'more than 5 million characters', 'give a table of fewer lines, or a Touchstone file');
  }
  const lines = text.split(/\r\n|\r|\n/u);
  for (const [index, raw] of lines.entries()) {
    if (raw === '') continue;
    const line = index + 1;
    if (raw.length > longestLine) {
      throw lineProblem(line, `${String(raw.length)} characters are too many`, 'give frequency, R and X', raw);
    }
    // "# f/MHz R X" is a heading too, though it stands in a comment.
    const content = normalise(
      raw.replace(/^\s*[!#]\s*(?=f(?:req|[^a-z])|[kmgt]?hz(?![a-z]))/iu, '').replace(/[!#].*$/u, ''),
    );
    if (content === '') continue;
    if (frequencyHz.length === 0 && /^["'([]?\p{L}/u.test(content)) {
      const unit = /(?<!\p{L})(\p{L}?Hz)(?!\p{L})/iu.exec(content)?.[1]?.toLowerCase();
      if (unit !== undefined) {
        const named = headerUnits[unit];
        if (named === undefined)
          throw lineProblem(line, 'this unit is unknown', 'give Hz, kHz, MHz, GHz or THz', content);
        prefix = named;
      }
      continue;
    }
    const cells = cellsOf(content);
    if (cells.length !== 3) {
      throw lineProblem(line, `${String(cells.length)} columns where 3 belong`, 'give frequency, R and X', content);
    }
    const [f, r, x] = [
      readQuantity(withPrefix(cells[0]!, prefix), 'Hz'),
      readQuantity(cells[1]!, 'Ω'),
      readQuantity(cells[2]!, 'Ω'),
    ];
    for (const [k, reading] of [f, r, x].entries()) {
      if (!reading.ok) throw lineProblem(line, reading.why, 'give frequency, R and X', cells[k]!);
    }
    if (!f.ok || !r.ok || !x.ok) continue;
    const previous = frequencyHz[frequencyHz.length - 1];
    if (f.value <= 0) throw lineProblem(line, 'the frequency must be above zero', 'give hertz, or a prefix', cells[0]!);
    if (previous !== undefined && f.value <= previous) {
      throw lineProblem(
        line,
        'the frequency is not above the one before',
        'give each frequency once, ascending',
        cells[0]!,
      );
    }
    if (r.value <= 0) throw lineProblem(line, 'the resistance must be above zero', 'give R > 0', cells[1]!);
    const z = new Complex(r.value, x.value);
    const gamma = z.sub(referenceOhm).div(z.add(referenceOhm));
    if (!(gamma.abs() < 1)) {
      throw lineProblem(line, 'it reflects all power', 'give an impedance that takes some', content);
    }
    frequencyHz.push(f.value);
    re.push(gamma.re);
    im.push(gamma.im);
  }
  if (frequencyHz.length < 2) {
    throw lineProblem(0, `${String(frequencyHz.length)} samples are too few to interpolate`, 'give two lines or more');
  }
  return {
    frequencyHz: Float64Array.from(frequencyHz),
    re: Float64Array.from(re),
    im: Float64Array.from(im),
    referenceOhm,
  };
}

function cellsOf(content: string): string[] {
  if (/[;\t]/u.test(content)) return content.split(/[;\t]/u).map((cell) => cell.trim());
  const byComma = content.split(',').map((cell) => cell.trim());
  if (byComma.length === 3 && (byComma.every((cell) => !/\s/u.test(cell)) || !/,\S/u.test(content))) return byComma;
  return content.split(/\s+/u);
}

const withPrefix = (cell: string, prefix: string): string =>
  /[a-z]/iu.test(cell.replace(/\d[eE][+-]?\d/u, '')) ? cell : cell + prefix;
