import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import canonicalize from 'canonicalize';
import type { StockList } from '../parts/stock.ts';
import type { DesignRecord } from './design-record.ts';

/** The record in its RFC 8785 form. */
export function canonical(value: object): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('canonical: nothing to write; give a record');
  return text;
}

/** SHA-256 (FIPS 180-4) over the RFC 8785 form of plain data; 64 hex digits. */
export const sha256Of = (value: object): string => hexOf(canonical(value));

const hexOf = (text: string): string => bytesToHex(sha256(utf8ToBytes(text)));

/**
 * SHA-256 (FIPS 180-4) over the RFC 8785 form of the record without its sign-off and without the revision before it,
 * whose own digest stands in the history; 64 hex digits.
 */
export function digestOf({ signOff: _, previous: __, ...record }: DesignRecord): string {
  const { build } = record;
  if (typeof build?.stock !== 'object' || build.stock === null) return sha256Of(record);
  // A list of thousands of lines is written out once, not at every keystroke: the form of a part doesn't depend on where it stands.
  const text = canonical({ ...record, build: { ...build, stock: null } });
  return hexOf(text.replace('"stock":null', () => `"stock":${stockText(build.stock!)}`));
}

const known = new WeakMap<StockList, string>();

function stockText(list: StockList): string {
  const text = known.get(list) ?? canonical(list);
  known.set(list, text);
  return text;
}
