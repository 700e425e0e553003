import type { Objects } from './objects.ts';
import { isDictionary, typeOf, type Dictionary, type IndirectObject, type Value } from './value.ts';

/**
 * What isn't drawn: attached files, whose last digits another processor or another engine may round otherwise; the seal
 * and the places of objects, which follow from those.
 */
const undrawn = new Set(['EmbeddedFile', 'Metadata', 'ObjStm', 'XRef']);

/** Whether two reports show the same on every page: all objects alike, number by number, but for attached files. */
export function sameDrawing(a: Objects, b: Objects): boolean {
  return [...new Set([...a.byNumber.keys(), ...b.byNumber.keys()])].every((number) => {
    const [one, other] = [a.byNumber.get(number), b.byNumber.get(number)];
    return isDrawn(one) || isDrawn(other) ? alike(one, other) : true;
  });
}

const isDrawn = (object: IndirectObject | undefined): boolean =>
  object !== undefined && !undrawn.has(typeOf(object.value));

const alike = (a: IndirectObject | undefined, b: IndirectObject | undefined): boolean =>
  a !== undefined && b !== undefined && plain(a.value) === plain(b.value) && sameBytes(a.stream, b.stream);

export const sameBytes = (a: Uint8Array | null, b: Uint8Array | null): boolean =>
  a === null || b === null ? a === b : a.length === b.length && a.every((byte, k) => byte === b[k]);

/** A value as a text that is the same for the same value, in whatever order its entries stand. */
export const plain = (value: Value | undefined, number: (value: number) => number = (exact) => exact): string =>
  JSON.stringify(value ?? null, (_, part: unknown) => {
    if (isDictionary(part as Value)) return [...(part as Dictionary)].sort(([x], [y]) => (x < y ? -1 : 1));
    return typeof part === 'number' ? number(part) : part;
  });
