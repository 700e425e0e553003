/** Direct objects of PDF (ISO 32000-1, 7.3), names and strings as their characters stand in the file. */
export type Value = null | boolean | number | Name | Text | Ref | List | Dictionary;
export interface Name {
  readonly name: string;
}
export interface Text {
  readonly text: string;
}
/** An indirect reference: the number of its object. */
export interface Ref {
  readonly ref: number;
}
export type List = readonly Value[];
/** By the names of its entries. */
export type Dictionary = ReadonlyMap<string, Value>;

export interface IndirectObject {
  readonly value: Value;
  /** A stream's bytes as they stand in the file; null: it isn't a stream. */
  readonly stream: Uint8Array | null;
}

export const isDictionary = (value: Value | undefined): value is Dictionary => value instanceof Map;
export const isList = (value: Value | undefined): value is List => Array.isArray(value);
export const isRef = (value: Value | undefined): value is Ref =>
  typeof value === 'object' && value !== null && 'ref' in value;

/** The name that a value is; '' where it is none. */
export const nameIn = (value: Value | undefined): string =>
  typeof value === 'object' && value !== null && 'name' in value ? value.name : '';

/** The text that a value is; '' where it is none. */
export const textIn = (value: Value | undefined): string =>
  typeof value === 'object' && value !== null && 'text' in value ? value.text : '';

/** A dictionary's Type; '' where it has none. */
export const typeOf = (value: Value | undefined): string => (isDictionary(value) ? nameIn(value.get('Type')) : '');
