import { lineProblem } from './line-problem.ts';

/** The option line of a Touchstone file. */
export interface TouchstoneOptions {
  /** Hz in one unit of the frequency column. */
  readonly unitHz: number;
  readonly parameter: 'S' | 'Z' | 'Y';
  readonly format: 'MA' | 'DB' | 'RI';
  /** Ω; of every port where the file says nothing else. */
  readonly referenceOhm: number;
}

const unitsHz: Readonly<Record<string, number>> = { HZ: 1, KHZ: 1e3, MHZ: 1e6, GHZ: 1e9 };

/** What the specification says where the option line doesn't. */
const touchstoneDefaults: TouchstoneOptions = { unitHz: 1e9, parameter: 'S', format: 'MA', referenceOhm: 50 };

/**
 * Reads `# MHz S MA R 50`: any order, any case, any of them left out.
 *
 * @throws InputError with the line's number
 */
export function readOptionLine(text: string, line: number): TouchstoneOptions {
  const words = text.replace(/^\s*#/u, '').trim().toUpperCase().split(/\s+/u);
  let options = touchstoneDefaults;
  for (let k = 0; k < words.length; k += 1) {
    const word = words[k]!;
    if (word === '') continue;
    const unitHz = unitsHz[word];
    if (unitHz !== undefined) options = { ...options, unitHz };
    else if (word === 'S' || word === 'Z' || word === 'Y') options = { ...options, parameter: word };
    else if (word === 'MA' || word === 'DB' || word === 'RI') options = { ...options, format: word };
    else if (word === 'G' || word === 'H') {
      throw lineProblem(
        line,
        `${word} parameters have no reflection of one port`,
        'save it as S, Z or Y parameters',
        word,
      );
    } else if (word === 'R' || /^R[\d.]/u.test(word)) {
      const given = word === 'R' ? (words[(k += 1)] ?? '') : word.slice(1);
      const referenceOhm = Number(given);
      if (given === '' || !Number.isFinite(referenceOhm) || referenceOhm <= 0) {
        throw lineProblem(line, 'the reference is not a resistance', 'write it as R 50', given);
      }
      options = { ...options, referenceOhm };
    } else {
      throw lineProblem(line, 'this word of the option line is unknown', 'write it as # MHz S MA R 50', word);
    }
  }
  return options;
}
