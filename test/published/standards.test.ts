import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { describe, expect, it } from 'vitest';
import { readQuantity } from '../../src/quantity/read-quantity.ts';
import type { Unit } from '../../src/quantity/unit.ts';
import { canonical } from '../../src/record/canonical.ts';

describe('RFC 8785 (2020), JSON Canonicalization Scheme, exact', () => {
  it('section 3.2.2, the sample object (quoted from memory)', () => {
    const input = String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`;
    expect(canonical(JSON.parse(input) as object)).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],` +
        String.raw`"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
  });

  it('section 3.2.3, names sorted by UTF-16 code units (quoted from memory)', () => {
    const input = String.raw`{
      "\u20ac": "Euro Sign",
      "\r": "Carriage Return",
      "\ufb33": "Hebrew Letter Dalet With Dagesh",
      "1": "One",
      "\ud83d\ude00": "Emoji: Grinning Face",
      "\u0080": "Control",
      "\u00f6": "Latin Small Letter O With Diaeresis"
    }`;
    // Read from the text itself: an object made of it would put the integer-like "1" first.
    const names = [...canonical(JSON.parse(input) as object).matchAll(/:"([^"]+)"/g)].map(([, name]) => name);
    expect(names).toEqual([
      'Carriage Return',
      'One',
      'Control',
      'Latin Small Letter O With Diaeresis',
      'Euro Sign',
      'Emoji: Grinning Face',
      'Hebrew Letter Dalet With Dagesh',
    ]);
  });

  // IEEE 754 bits and their text (quoted from memory).
  it.each([
    ['0000000000000000', '0'],
    ['8000000000000000', '0'],
    ['0000000000000001', '5e-324'],
    ['7fefffffffffffff', '1.7976931348623157e+308'],
    ['4340000000000000', '9007199254740992'],
    ['4430000000000000', '295147905179352830000'],
    ['44b52d02c7e14af5', '9.999999999999997e+22'],
    ['44b52d02c7e14af6', '1e+23'],
    ['444b1ae4d6e2ef4e', '999999999999999700000'],
    ['444b1ae4d6e2ef50', '1e+21'],
    ['3eb0c6f7a0b5ed8d', '0.000001'],
    ['41b3de4355555553', '333333333.3333332'],
    ['43143ff3c1cb0959', '1424953923781206.2'],
  ])('appendix B, the number of bits %s is written %s', (bits, text) => {
    const view = new DataView(new ArrayBuffer(8));
    view.setBigUint64(0, BigInt(`0x${bits}`));
    expect(canonical([view.getFloat64(0)])).toBe(`[${text}]`);
  });
});

describe('FIPS 180-4, SHA-256 as the digest of a record uses it, exact', () => {
  it.each([
    ['abc', 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'],
    // The two below are quoted from memory.
    ['', 'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855'],
    [
      'abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq',
      '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
    ],
  ])('SHA-256("%s")', (text, digest) => {
    expect(bytesToHex(sha256(utf8ToBytes(text)))).toBe(digest);
  });
});

describe('IEC 60062:2016, letter for the decimal point (examples quoted from memory), exact', () => {
  it.each<[string, Unit, number]>([
    ['R10', 'Ω', 0.1],
    ['R332', 'Ω', 0.332],
    ['1R0', 'Ω', 1],
    ['3R32', 'Ω', 3.32],
    ['33R2', 'Ω', 33.2],
    ['1K0', 'Ω', 1000],
    ['1K5', 'Ω', 1500],
    ['33K2', 'Ω', 33200],
    ['332K', 'Ω', 332000],
    ['1M0', 'Ω', 1e6],
    ['3M32', 'Ω', 3.32e6],
    ['1G0', 'Ω', 1e9],
    ['p10', 'F', 0.1e-12],
    ['3p32', 'F', 3.32e-12],
    ['33p2', 'F', 33.2e-12],
    ['1n0', 'F', 1e-9],
    ['33n2', 'F', 33.2e-9],
    ['1µ0', 'F', 1e-6],
    ['3µ32', 'F', 3.32e-6],
    ['4n7', 'H', 4.7e-9],
  ])('%s in %s is %s', (text, unit, value) => {
    expect(readQuantity(text, unit)).toEqual({ ok: true, value });
  });
});
