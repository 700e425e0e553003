import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import canonicalize from 'canonicalize';
import type { DesignRecord } from './design-record.ts';

/** The record in its RFC 8785 form. */
export function canonical(value: object): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('canonical: nothing to write; give a record');
  return text;
}

/** SHA-256 (FIPS 180-4) over the RFC 8785 form of plain data; 64 hex digits. */
export const sha256Of = (value: object): string => bytesToHex(sha256(utf8ToBytes(canonical(value))));

/** SHA-256 (FIPS 180-4) over the RFC 8785 form of the record without its sign-off; 64 hex digits. */
export const digestOf = ({ signOff: _, ...record }: DesignRecord): string => sha256Of(record);
