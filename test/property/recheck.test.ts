import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { canonical, digestOf } from '../../src/record/canonical.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { readFile } from '../../src/recheck/read-file.ts';
import { recheck } from '../../src/recheck/recheck.ts';
import { report } from '../../src/report/report.ts';
import { containerOf } from '../unit/recheck/container.ts';
import { demo, fonts } from '../unit/report/records.ts';
import { anyRecord } from './records.ts';

/** Real parts take seconds each; demonstrations have them, and are rechecked whole. */
const exactParts = anyRecord().map((record): DesignRecord => ({ ...record, build: null }));

describe('a record in a report', () => {
  it('comes out as it went in, and so does its digest', async () => {
    await fc.assert(
      fc.asyncProperty(anyRecord(), async (record) => {
        const found = await readFile('report.pdf', await containerOf(record));
        expect(found.record).toEqual(record);
        expect(found.digest).toBe(digestOf(record));
      }),
      { numRuns: 1000 },
    );
  });

  it('gives the same figures and the same bytes when it is computed anew', async () => {
    await fc.assert(
      fc.asyncProperty(exactParts, fc.constantFrom('a4' as const, 'letter' as const), async (record, paper) => {
        const bytes = await report(design(record), { paper, fonts });
        const found = await readFile('report.pdf', bytes);
        expect(found.record).toEqual(record);
        const { verdict, report: rechecked } = await recheck(found, design(found.record), fonts);
        expect([verdict, rechecked!.file]).toEqual(['same', 'same']);
      }),
      { numRuns: 20 },
    );
  });

  it('is refused with any of its bytes changed, in a file sealed anew', async () => {
    const record = demo('tide-gauge');
    const text = canonical(record);
    await fc.assert(
      fc.asyncProperty(fc.nat(text.length - 1), fc.integer({ min: 32, max: 126 }), async (at, code) => {
        const letter = String.fromCharCode(code);
        fc.pre(text[at] !== letter);
        const changed = `${text.slice(0, at)}${letter}${text.slice(at + 1)}`;
        await expect(containerOf(record, { text: changed }).then((bytes) => readFile('x.pdf', bytes))).rejects.toThrow(
          'the record in it is not the one that its figures were printed of',
        );
      }),
      { numRuns: 300 },
    );
  });

  it('is refused with any byte of the report changed', async () => {
    const bytes = await containerOf(demo('tide-gauge'));
    await fc.assert(
      fc.asyncProperty(fc.nat(bytes.length - 1), fc.integer({ min: 1, max: 255 }), async (at, flip) => {
        const changed = bytes.slice();
        changed[at]! ^= flip;
        await expect(readFile('x.pdf', changed)).rejects.toThrow(/^x\.pdf|file "x\.pdf": /u);
      }),
      { numRuns: 300 },
    );
  });
});
