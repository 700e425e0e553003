import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';

/**
 * The seal of a report: its length in bytes, ten digits, and the SHA-256 of its bytes with this digest written as zeros.
 * It stands in the XMP packet, which isn't compressed. Whoever knows this can seal a file of his own: it tells damage and
 * carelessness, where a signature tells malice.
 */
const before = '<ferrule:seal>';
const after = '</ferrule:seal>';
const lengthDigits = 10;
const digestDigits = 64;

/** Its room in a file that isn't sealed yet. */
export const emptySeal = `${before}${'0'.repeat(lengthDigits)} ${'0'.repeat(digestDigits)}${after}`;

export interface Seal {
  /** Bytes of the file as it was written; whatever follows was added since. */
  readonly length: number;
  /** The bytes are those that were sealed. */
  readonly holds: boolean;
}

/**
 * The same bytes, sealed.
 *
 * @throws RangeError where there is no room for the seal
 */
export function sealed(bytes: Uint8Array): Uint8Array {
  const at = find(bytes, emptySeal);
  if (at === -1) throw new RangeError('sealed: the file has no room for a seal; give one whose XMP packet does');
  const out = bytes.slice();
  const length = String(bytes.length).padStart(lengthDigits, '0');
  write(out, at + before.length, length);
  write(out, at + before.length + lengthDigits + 1, bytesToHex(sha256(out)));
  return out;
}

/** The seal of a file; null: it has none. */
export function sealOf(bytes: Uint8Array): Seal | null {
  const at = find(bytes, before);
  const text = new TextDecoder('latin1').decode(bytes.subarray(at, at + emptySeal.length));
  const match = /^<ferrule:seal>(\d{10}) ([0-9a-f]{64})<\/ferrule:seal>$/u.exec(text);
  if (at === -1 || match === null) return null;
  const [, digits, digest] = match;
  const length = Number(digits);
  if (length > bytes.length || length < at + emptySeal.length) return { length, holds: false };
  const written = bytes.slice(0, length);
  write(written, at + before.length + lengthDigits + 1, '0'.repeat(digestDigits));
  return { length, holds: bytesToHex(sha256(written)) === digest };
}

function write(bytes: Uint8Array, at: number, text: string): void {
  bytes.set(new TextEncoder().encode(text), at);
}

/** Where an ASCII text first stands; -1: nowhere. */
function find(bytes: Uint8Array, text: string): number {
  const sought = new TextEncoder().encode(text);
  for (let at = bytes.indexOf(sought[0]!); at !== -1; at = bytes.indexOf(sought[0]!, at + 1)) {
    if (sought.every((byte, k) => bytes[at + k] === byte)) return at;
  }
  return -1;
}
