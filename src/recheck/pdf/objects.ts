import { notAsWritten } from '../refusal.ts';
import type { Inflater } from './inflate.ts';
import { isDictionary, nameIn, typeOf, type Dictionary, type IndirectObject, type Value } from './value.ts';
import { Allowance, ValueReader } from './value-reader.ts';

/** Ten times what a long report has. */
const mostObjects = 50_000;

/** The objects of a report as it was written. */
export interface Objects {
  readonly byNumber: ReadonlyMap<number, IndirectObject>;
  /** Where Root, Info and ID stand (ISO 32000-1, 7.5.8). */
  readonly trailer: Dictionary;
}

/**
 * Every object of a report, in the order in which they stand: one after the other from the head of the file to its
 * cross-reference stream, those that are packed into object streams (ISO 32000-1, 7.5.7) after that. Nothing is looked up
 * by a place that the file tells, so that none leads astray or round in a circle.
 *
 * @param bytes of the report alone, without what was added to it
 * @throws InputError when a report isn't written so
 */
export async function objectsOf(bytes: Uint8Array, inflater: Inflater): Promise<Objects> {
  const allowance = new Allowance();
  const byNumber = new Map<number, IndirectObject>();
  const add = (number: number, object: IndirectObject): void => {
    if (byNumber.has(number)) throw notAsWritten('an object stands in it twice');
    if (byNumber.size >= mostObjects) throw notAsWritten('it holds more objects than a report has');
    byNumber.set(number, object);
  };
  let trailer: Dictionary | null = null;
  const packed: IndirectObject[] = [];
  const reader = new ValueReader(bytes, allowance);
  while (trailer === null) {
    const number = reader.value();
    if (typeof number !== 'number') throw notAsWritten('its objects have no numbers');
    const object = objectAt(reader, bytes);
    add(number, object);
    const type = typeOf(object.value);
    if (type === 'ObjStm') packed.push(object);
    if (type === 'XRef') trailer = object.value as Dictionary;
  }
  for (const object of packed) {
    for (const [number, value] of await unpacked(object, inflater, allowance)) add(number, { value, stream: null });
  }
  return { byNumber, trailer };
}

/** What follows an object's number: "0 obj", a value, a stream where there is one, "endobj". */
export function objectAt(reader: ValueReader, bytes: Uint8Array): IndirectObject {
  reader.value();
  reader.expect('obj');
  const value = reader.value();
  reader.skipSpace();
  const word = reader.word();
  if (word === 'endobj') return { value, stream: null };
  const length = isDictionary(value) ? value.get('Length') : undefined;
  if (word !== 'stream' || typeof length !== 'number') throw notAsWritten('an object in it has no end');
  const start = reader.at + (bytes[reader.at] === 13 ? 2 : 1);
  const end = start + length;
  if (end > bytes.length) throw notAsWritten('a stream in it goes beyond its end');
  reader.at = end;
  reader.expect('endstream');
  reader.expect('endobj');
  return { value, stream: bytes.subarray(start, end) };
}

/** The objects in an object stream, with their numbers. */
export async function unpacked(
  object: IndirectObject,
  inflater: Inflater,
  allowance: Allowance,
): Promise<readonly (readonly [number, Value])[]> {
  const { value } = object;
  const [count, first] = isDictionary(value) ? [value.get('N'), value.get('First')] : [];
  if (typeof count !== 'number' || typeof first !== 'number') throw notAsWritten('an object stream in it is damaged');
  const bytes = await contentOf(object, inflater);
  const head = new ValueReader(bytes, allowance);
  const out: (readonly [number, Value])[] = [];
  for (let k = 0; k < count; k += 1) {
    const [number, offset] = [head.value(), head.value()];
    if (typeof number !== 'number' || typeof offset !== 'number') {
      throw notAsWritten('an object stream in it is damaged');
    }
    out.push([number, new ValueReader(bytes, allowance, first + offset).value()]);
  }
  return out;
}

/** A stream's content. */
export async function contentOf({ value, stream }: IndirectObject, inflater: Inflater): Promise<Uint8Array> {
  const filter = isDictionary(value) ? value.get('Filter') : undefined;
  const plain = isDictionary(value) && !value.has('DecodeParms');
  if (stream === null || !plain || nameIn(filter) !== 'FlateDecode') {
    throw notAsWritten('a stream in it is packed in a way that reports are not');
  }
  return inflater.inflate(stream);
}
