import { lineProblem } from './line-problem.ts';
import { readOptionLine, type TouchstoneOptions } from './touchstone-options.ts';

/** All that stands before the data of a Touchstone file. */
export interface Header {
  readonly version: 1 | 2;
  readonly ports: 1 | 2;
  readonly options: TouchstoneOptions;
  /** Ω, one a port. */
  readonly references: readonly number[];
  /** 21_12 is S11 S21 S12 S22, the order of version 1. */
  readonly order: '12_21' | '21_12';
  readonly matrix: 'full' | 'lower' | 'upper';
  /** Version 2 says how many. */
  readonly frequencies: number | null;
  /** Where the data begin in the text, and how many lines stand before. */
  readonly start: number;
  readonly line: number;
}

const longestHeader = 10_000;

/**
 * Reads up to the first data line (version 1) or [Network Data] (version 2).
 *
 * @throws InputError with the line's number
 */
export function readHeader(text: string, name: string): Header {
  if (text.slice(0, 4096).includes('\u0000')) throw lineProblem(1, 'this is not text', 'give a Touchstone file');
  let version: 1 | 2 = 1;
  let options: TouchstoneOptions | null = null;
  let ports: 1 | 2 | null = portsOf(name);
  let order: Header['order'] | null = null;
  let matrix: Header['matrix'] = 'full';
  let frequencies: number | null = null;
  let references: number[] = [];
  let awaited = 0;
  let inInformation = false;
  let start = 0;
  let line = 0;
  const done = (): Header => {
    if (ports === null) throw lineProblem(line, 'how many ports is not said', 'name the file .s1p or .s2p');
    if (version === 2 && frequencies === null) {
      throw lineProblem(line, '[Number of Frequencies] is missing', 'give it before [Network Data]');
    }
    if (version === 2 && ports === 2 && order === null) {
      throw lineProblem(line, '[Two-Port Data Order] is missing', 'give 12_21 or 21_12 before [Network Data]');
    }
    if (references.length !== 0 && references.length !== ports) {
      throw lineProblem(line, `${String(references.length)} references for ${String(ports)} ports`, 'give one a port');
    }
    if (options === null) throw lineProblem(line + 1, 'no option line before the data', 'give one, as # MHz S MA R 50');
    return {
      version,
      ports,
      options,
      references: references.length === 0 ? new Array<number>(ports).fill(options.referenceOhm) : references,
      order: order ?? '21_12',
      matrix: ports === 1 ? 'full' : matrix,
      frequencies,
      start,
      line,
    };
  };

  while (start < text.length) {
    let end = text.indexOf('\n', start);
    if (end < 0) end = text.length;
    const content = text
      .slice(start, Math.min(end, start + 4096))
      .replace(/!.*$/su, '')
      .replace(/^\uFEFF/u, '')
      .trim();
    const word = /^\[([^\]]*)\]\s*(.*)$/su.exec(content);
    if (content !== '' && word === null && !content.startsWith('#') && awaited === 0 && !inInformation) {
      if (version === 2) throw lineProblem(line + 1, 'data before [Network Data]', 'give the keyword first', content);
      return done();
    }
    line += 1;
    start = end + 1;
    if (line > longestHeader) throw lineProblem(line, 'no data in 10 000 lines', 'give a Touchstone file');
    if (content === '') continue;
    const key = word?.[1]?.trim().toLowerCase();
    const rest = word?.[2]?.trim() ?? '';
    if (inInformation) {
      if (key === 'end information') inInformation = false;
      continue;
    }
    if (content.startsWith('#')) {
      options ??= readOptionLine(content, line);
      continue;
    }
    if (key === undefined) {
      const more = referencesOf(content, line);
      references = [...references, ...more];
      awaited = Math.max(0, awaited - more.length);
      continue;
    }
    if (key !== 'reference' && awaited > 0) {
      throw lineProblem(line, 'references are missing', 'give one a port');
    }
    switch (key) {
      case 'version':
        if (!/^2\.[01]$/u.test(rest)) throw lineProblem(line, 'this version is unknown', 'give 2.0 or 2.1', rest);
        version = 2;
        break;
      case 'number of ports':
        if (rest !== '1' && rest !== '2') {
          throw lineProblem(line, 'a termination has one port, or is one of two', 'give a file of 1 or 2 ports', rest);
        }
        ports = rest === '1' ? 1 : 2;
        break;
      case 'two-port data order':
      case 'two-port order':
        if (rest !== '12_21' && rest !== '21_12')
          throw lineProblem(line, 'this order is unknown', 'give 12_21 or 21_12', rest);
        order = rest;
        break;
      case 'number of frequencies':
        if (!/^\d{1,9}$/u.test(rest) || Number(rest) === 0)
          throw lineProblem(line, 'not a count', 'give a whole number', rest);
        frequencies = Number(rest);
        break;
      case 'reference':
        references = referencesOf(rest, line);
        awaited = Math.max(0, (ports ?? 1) - references.length);
        break;
      case 'matrix format': {
        const wanted = rest.toLowerCase();
        if (wanted !== 'full' && wanted !== 'lower' && wanted !== 'upper') {
          throw lineProblem(line, 'this format is unknown', 'give Full, Lower or Upper', rest);
        }
        matrix = wanted;
        break;
      }
      case 'mixed-mode order':
        throw lineProblem(line, 'mixed-mode data have no single-ended port', 'save single-ended data');
      case 'begin information':
        inInformation = true;
        break;
      case 'network data':
        if (version === 1) throw lineProblem(line, '[Version] is missing', 'give [Version] 2.0 or 2.1 first');
        return done();
      case 'number of noise frequencies':
        break;
      default:
        throw lineProblem(line, 'this keyword is unknown', 'give a file of version 1.1, 2.0 or 2.1', `[${key}]`);
    }
  }
  throw lineProblem(line, 'no data', 'give a Touchstone file with data');
}

function portsOf(name: string): 1 | 2 | null {
  const ending = /\.s(\d+)p$/iu.exec(name)?.[1];
  if (ending === undefined) return null;
  if (ending === '1') return 1;
  if (ending === '2') return 2;
  throw lineProblem(
    0,
    `a termination has one port, or is one of two, not ${ending}`,
    'give an .s1p or .s2p file',
    name,
  );
}

function referencesOf(text: string, line: number): number[] {
  return text
    .split(/\s+/u)
    .filter((word) => word !== '')
    .map((word) => {
      const ohm = Number(word);
      if (!Number.isFinite(ohm) || ohm <= 0)
        throw lineProblem(line, 'not a resistance', 'give one above zero a port', word);
      return ohm;
    });
}
