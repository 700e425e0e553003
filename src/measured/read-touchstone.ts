import { lineProblem } from './line-problem.ts';
import type { Measured } from './measured.ts';
import { readHeader, type Header } from './touchstone-header.ts';
import { reflectionOf } from './touchstone-reflection.ts';

/** Most samples read. */
const mostSamples = 5_000_000;

/**
 * Reads a Touchstone file (IBIS Open Forum, versions 1.0, 1.1, 2.0 and 2.1) of one port, or one port of a two-port, the other
 * port closed with its reference.
 *
 * In version 1 the values of Z and Y files are normalised to the reference; in version 2 they are in Ω and S.
 *
 * @param given the whole file
 * @param name  its name: the ending .s1p or .s2p gives the ports in version 1
 * @param port  which port is the termination
 * @throws InputError with the number of the line that can't be used
 */
export function readTouchstone(given: string, name: string, port: 1 | 2 = 1): Measured {
  // Some instruments end their lines with a carriage return alone.
  const text = given.includes('\n') ? given : given.replaceAll('\r', '\n');
  const header = readHeader(text, name);
  if (port > header.ports) {
    throw lineProblem(0, `it has ${String(header.ports)} port`, 'choose port 1', `port ${String(port)}`);
  }
  const columns = 1 + 2 * (header.ports === 1 ? 1 : header.matrix === 'full' ? 4 : 3);
  const values = new Float64Array(columns);
  const frequencyHz: number[] = [];
  const re: number[] = [];
  const im: number[] = [];
  let line = header.line;
  for (let start = header.start; start < text.length;) {
    let end = text.indexOf('\n', start);
    if (end < 0) end = text.length;
    line += 1;
    const count = numbersOf(text, start, end, values, line);
    if (count === keyword) {
      checkEnd(text.slice(start, Math.min(end, start + 100)), header, line);
      break;
    }
    start = end + 1;
    if (count === 0) continue;
    const hz = values[0]! * header.options.unitHz;
    const previous = frequencyHz[frequencyHz.length - 1];
    if (header.ports === 2 && header.version === 1 && count === 5 && previous !== undefined && hz <= previous) break;
    if (count !== columns) {
      throw lineProblem(
        line,
        `${String(count)} numbers where ${String(columns)} belong`,
        'give a frequency and its values on each line',
      );
    }
    if (!(hz >= 0) || !Number.isFinite(hz)) throw lineProblem(line, 'the frequency is not one', 'give 0 or more');
    if (previous !== undefined && hz <= previous) {
      throw lineProblem(
        line,
        hz === previous ? 'the frequency repeats the one before' : 'the frequency is below the one before',
        'give each frequency once, ascending',
        String(values[0]),
      );
    }
    if (frequencyHz.length === header.frequencies) {
      throw lineProblem(
        line,
        `more than the ${String(header.frequencies)} frequencies that [Number of Frequencies] says`,
        'give their true number',
      );
    }
    const gamma = reflectionOf(values, header, port, line);
    if (Math.hypot(gamma.re, gamma.im) >= 1) {
      throw lineProblem(line, 'it reflects all power or more', 'give a passive termination', String(values[0]));
    }
    frequencyHz.push(hz);
    re.push(gamma.re);
    im.push(gamma.im);
    if (frequencyHz.length > mostSamples) throw lineProblem(line, 'more than 5 million samples', 'thin the sweep');
  }
  finish(header, frequencyHz.length, line);
  return {
    frequencyHz: Float64Array.from(frequencyHz),
    re: Float64Array.from(re),
    im: Float64Array.from(im),
    referenceOhm: header.references[port - 1]!,
  };
}

/** Version 2 ends its network data with one of two keywords; version 1 knows none. */
function checkEnd(content: string, { version }: Header, line: number): void {
  const word = content.replace(/!.*$/su, '').trim();
  if (version === 2 && /^\[(?:end|noise data)\]$/iu.test(word)) return;
  throw lineProblem(
    line,
    'this keyword does not belong among the data',
    version === 2 ? 'end them with [Noise Data] or [End]' : 'give the keywords of version 2 from [Version] on, or none',
    word,
  );
}

function finish(header: Header, count: number, line: number): void {
  if (count === 0) throw lineProblem(line, 'no data line', 'give a Touchstone file with data');
  if (header.frequencies !== null && count < header.frequencies) {
    throw lineProblem(
      line,
      `${String(count)} frequencies where [Number of Frequencies] says ${String(header.frequencies)}`,
      'give the whole file',
    );
  }
}

/** What `numbersOf` returns for a line that begins a keyword, which ends the network data. */
const keyword = -1;

/** Numbers of one line into `into`; how many there were, those past its length counted but not kept. */
function numbersOf(text: string, start: number, end: number, into: Float64Array, line: number): number {
  let count = 0;
  let at = start;
  while (at < end) {
    let code = text.charCodeAt(at);
    if (code <= 32) {
      at += 1;
      continue;
    }
    if (code === bang) break;
    // A second option line is ignored, as the specification says.
    if (code === hash && count === 0) return 0;
    if (code === bracket && count === 0) return keyword;
    const from = at;
    while (at < end && code > 32 && code !== bang) {
      at += 1;
      code = at < end ? text.charCodeAt(at) : 0;
    }
    const token = text.slice(from, at);
    const value = Number(token);
    // Number reads "0x10", "0b1" and "Infinity" too; a number here is digits, point, sign and exponent.
    if (!Number.isFinite(value) || (text.charCodeAt(from + 1) > digitNine && /[^\deE.+-]/u.test(token))) {
      throw lineProblem(line, 'not a number', 'give a frequency and its values on each line', token);
    }
    if (count < into.length) into[count] = value;
    count += 1;
  }
  return count;
}

const bang = '!'.charCodeAt(0);
const hash = '#'.charCodeAt(0);
const bracket = '['.charCodeAt(0);
const digitNine = '9'.charCodeAt(0);
