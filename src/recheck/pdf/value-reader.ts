import { notAsWritten } from '../refusal.ts';
import type { Value } from './value.ts';

/** Ten times what a long report has. */
const mostValues = 300_000;
/** A file that is read more than once over is one made to be. */
const mostBytes = 64_000_000;
/** A report goes six deep. */
const deepest = 50;

const latin = new TextDecoder('latin1');

/** What is left to read of one file, however many readers go through it. */
export class Allowance {
  private values = mostValues;
  private bytes = mostBytes;

  value(): void {
    this.values -= 1;
    if (this.values < 0) throw notAsWritten('it holds more values than a report does');
  }

  read(bytes: number): void {
    this.bytes -= bytes;
    if (this.bytes < 0) throw notAsWritten('its objects lie over each other');
  }
}

/** Reads PDF syntax (ISO 32000-1, 7.2 and 7.3) from a place onwards. */
export class ValueReader {
  private readonly bytes: Uint8Array;
  private readonly allowance: Allowance;
  /** Where it stands. */
  at: number;

  constructor(bytes: Uint8Array, allowance: Allowance, at = 0) {
    this.bytes = bytes;
    this.allowance = allowance;
    this.at = at;
  }

  /** @throws InputError where none stands */
  value(): Value {
    const start = this.at;
    const value = this.within(0);
    this.allowance.read(this.at - start);
    return value;
  }

  private within(depth: number): Value {
    this.allowance.value();
    if (depth > deepest) throw notAsWritten('its values lie too deep within each other');
    this.skipSpace();
    switch (this.sign()) {
      case '/':
        this.at += 1;
        return { name: this.word() };
      case '(':
        return { text: this.literal() };
      case '[':
        this.at += 1;
        return this.list(depth);
      case '<':
        if (this.sign(1) !== '<') return { text: this.hexadecimal() };
        this.at += 2;
        return this.dictionary(depth);
      default:
        return this.numberOrKeyword();
    }
  }

  /** The regular characters that follow space; '' where a delimiter or nothing follows. */
  word(): string {
    const start = this.at;
    while (this.at < this.bytes.length && regular[this.bytes[this.at]!] === 1) this.at += 1;
    return latin.decode(this.bytes.subarray(start, this.at));
  }

  /** The next word after space, which must be this one. */
  expect(word: string): void {
    this.skipSpace();
    if (this.word() !== word) throw damaged();
  }

  skipSpace(): void {
    for (; this.at < this.bytes.length; this.at += 1) {
      const byte = this.bytes[this.at]!;
      if (byte === percent) {
        while (this.at < this.bytes.length && !isLineEnd(this.bytes[this.at]!)) this.at += 1;
      } else if (!isSpace(byte)) return;
    }
  }

  private sign(ahead = 0): string {
    return String.fromCharCode(this.bytes[this.at + ahead] ?? 0);
  }

  private list(depth: number): Value[] {
    const out: Value[] = [];
    for (;;) {
      this.skipSpace();
      if (this.sign() === ']') {
        this.at += 1;
        return out;
      }
      out.push(this.within(depth + 1));
    }
  }

  private dictionary(depth: number): ReadonlyMap<string, Value> {
    const out = new Map<string, Value>();
    for (;;) {
      this.skipSpace();
      if (this.sign() === '>' && this.sign(1) === '>') {
        this.at += 2;
        return out;
      }
      if (this.sign() !== '/') throw damaged();
      this.at += 1;
      out.set(this.word(), this.within(depth + 1));
    }
  }

  /** Between parentheses, which may hold pairs of them; a backslash takes the next character with it. */
  private literal(): string {
    const start = this.at + 1;
    let open = 0;
    for (; this.at < this.bytes.length; this.at += 1) {
      const sign = this.sign();
      if (sign === '\\') this.at += 1;
      else if (sign === '(') open += 1;
      else if (sign === ')') open -= 1;
      if (open === 0) {
        this.at += 1;
        return latin.decode(this.bytes.subarray(start, this.at - 1));
      }
    }
    throw damaged();
  }

  private hexadecimal(): string {
    const end = this.bytes.indexOf(greater, this.at);
    if (end === -1) throw damaged();
    const text = latin.decode(this.bytes.subarray(this.at + 1, end));
    this.at = end + 1;
    return text;
  }

  private numberOrKeyword(): Value {
    const word = this.word();
    if (word === 'null') return null;
    if (word === 'true' || word === 'false') return word === 'true';
    if (word.length > 40 || !/^[+-]?(?:\d+\.?\d*|\.\d+)$/u.test(word)) throw damaged();
    return this.reference(word) ?? Number(word);
  }

  /** "12 0 R" from its first number; null, and nothing more is read, where it isn't one. */
  private reference(word: string): Value {
    const back = this.at;
    if (/^\d+$/u.test(word)) {
      this.skipSpace();
      if (/^\d{1,5}$/u.test(this.word())) {
        this.skipSpace();
        if (this.word() === 'R') return { ref: Number(word) };
      }
    }
    this.at = back;
    return null;
  }
}

const damaged = () => notAsWritten('its syntax is damaged');

const percent = 0x25;
const greater = 0x3e;
const isLineEnd = (byte: number): boolean => byte === 10 || byte === 13;
const isSpace = (byte: number): boolean => byte === 32 || isLineEnd(byte) || byte === 9 || byte === 12 || byte === 0;
const regular = Uint8Array.from({ length: 256 }, (_, byte) =>
  isSpace(byte) || '()<>[]{}/%'.includes(String.fromCharCode(byte)) ? 0 : 1,
);
