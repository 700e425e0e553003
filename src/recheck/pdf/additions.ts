import { notAsWritten, refusal } from '../refusal.ts';
import { Inflater } from './inflate.ts';
import { objectAt, unpacked, type Objects } from './objects.ts';
import { plain } from './same-drawing.ts';
import { isDictionary, isRef, nameIn, typeOf, type Dictionary, type Value } from './value.ts';
import { Allowance, ValueReader } from './value-reader.ts';

/** What was added to a report after it was written, as signing does (ISO 32000-1, 7.5.6). */
export interface Additions {
  readonly bytes: number;
  /** Digital signatures; whether they hold is for a PDF reader to say. */
  readonly signatures: number;
}

/**
 * What follows a report's own bytes; null where nothing does.
 *
 * @param length of the report as it was written
 * @throws InputError where it puts something else in the place of what was written, other than signing and remarks do
 */
export async function additionsTo(bytes: Uint8Array, length: number, written: Objects): Promise<Additions | null> {
  const added = bytes.subarray(length);
  if (added.every((byte) => byte <= 32)) return null;
  const text = new TextDecoder('latin1').decode(added);
  const put = await putInPlace(added, text);
  for (const [number, value] of put) {
    if (!mayReplace(number, value, written)) {
      throw refusal(
        'what was added to it puts other contents in the place of what was written',
        'give the report as Ferrule wrote it; signatures may be added to it',
      );
    }
  }
  return { bytes: added.length, signatures: text.match(/\/ByteRange\s{0,8}\[/gu)?.length ?? 0 };
}

/** Every object among added bytes, wherever one stands: more than are in force, never fewer. */
async function putInPlace(added: Uint8Array, text: string): Promise<readonly (readonly [number, Value])[]> {
  const allowance = new Allowance();
  const inflater = new Inflater();
  const out: (readonly [number, Value])[] = [];
  for (const { index, 1: number } of text.matchAll(/(?<![\d.])(\d{1,10})\s{1,8}\d{1,5}\s{1,8}obj(?![a-z])/gu)) {
    const reader = new ValueReader(added, allowance, index);
    reader.value();
    const start = reader.at;
    reader.value();
    reader.expect('obj');
    const value = reader.value();
    out.push([Number(number), value]);
    if (typeOf(value) !== 'ObjStm') continue;
    if (typeof (value as Dictionary).get('Length') !== 'number')
      throw notAsWritten("what was added to it can't be read");
    const whole = new ValueReader(added, allowance, start);
    out.push(...(await unpacked(objectAt(whole, added), inflater, allowance)));
  }
  return out;
}

/** Entries that signing and remarks may add or change, by what the object is. */
const changing: Readonly<Record<string, readonly string[]>> = {
  Catalog: ['AcroForm', 'DSS', 'Extensions', 'Metadata', 'Perms', 'Version'],
  Page: ['Annots', 'LastModified'],
  'signature field': ['AP', 'AS', 'F', 'Ff', 'Lock', 'M', 'MK', 'SV', 'V'],
};

function mayReplace(number: number, now: Value, { byNumber, trailer }: Objects): boolean {
  const before = byNumber.get(number);
  if (before === undefined) return true;
  const { value, stream } = before;
  if (typeOf(value) === 'Metadata') return typeOf(now) === 'Metadata';
  if (stream !== null || !isDictionary(value) || !isDictionary(now)) return false;
  const root = trailer.get('Root');
  const catalog = isRef(root) ? byNumber.get(root.ref)?.value : undefined;
  const form = isDictionary(catalog) ? catalog.get('AcroForm') : undefined;
  if ([trailer.get('Info'), form].some((ref) => isRef(ref) && ref.ref === number)) return true;
  const may = changing[nameIn(value.get('FT')) === 'Sig' ? 'signature field' : typeOf(value)];
  if (may === undefined) return false;
  const names = new Set([...value.keys(), ...now.keys()]);
  return [...names].every(
    (name) => may.includes(name) || plain(value.get(name), coarse) === plain(now.get(name), coarse),
  );
}

/** Of a number, what tells on paper: another program writes fewer digits. */
const coarse = (value: number): number => Math.round(value * 100);
