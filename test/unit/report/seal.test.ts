import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { emptySeal, sealed, sealOf } from '../../../src/report/pdf/seal.ts';

const bytesOf = (text: string): Uint8Array => new TextEncoder().encode(text);
const textOf = (bytes: Uint8Array): string => new TextDecoder().decode(bytes);

const file = bytesOf(`head\n${emptySeal}\ntail\n`);

describe('sealed(bytes)', () => {
  it('writes length and SHA-256 of the bytes with the digest as zeros', () => {
    const length = String(file.length).padStart(10, '0');
    const zeros = '0'.repeat(64);
    const hashed = createHash('sha256').update(`head\n<ferrule:seal>${length} ${zeros}</ferrule:seal>\ntail\n`);
    expect(textOf(sealed(file))).toBe(`head\n<ferrule:seal>${length} ${hashed.digest('hex')}</ferrule:seal>\ntail\n`);
  });

  it('leaves its input alone, and refuses one without room', () => {
    const given = file.slice();
    sealed(given);
    expect(given).toEqual(file);
    expect(() => sealed(bytesOf('no room'))).toThrow('no room for a seal');
  });
});

describe('sealOf(bytes)', () => {
  it('holds of what was sealed, whatever follows', () => {
    const bytes = sealed(file);
    expect(sealOf(bytes)).toEqual({ length: file.length, holds: true });
    expect(sealOf(new Uint8Array([...bytes, 1, 2, 3]))).toEqual({ length: file.length, holds: true });
  });

  it('does not hold where a byte has changed or lacks', () => {
    const bytes = sealed(file);
    for (let at = 0; at < bytes.length; at += 1) {
      const changed = bytes.slice();
      changed[at]! ^= 1;
      expect([at, sealOf(changed)?.holds ?? false]).toEqual([at, false]);
    }
    expect(sealOf(bytes.slice(0, -1))).toEqual({ length: file.length, holds: false });
  });

  it('is null where there is none, or none that was written', () => {
    expect(sealOf(bytesOf('nothing'))).toBeNull();
    expect(sealOf(bytesOf('<ferrule:seal>'))).toBeNull();
    expect(sealOf(new Uint8Array())).toBeNull();
    expect(sealOf(file)?.holds).toBe(false);
  });
});
