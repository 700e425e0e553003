import { beforeAll, describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import type { Dossier } from '../../../src/dossier.ts';
import { readFile } from '../../../src/recheck/read-file.ts';
import { facts, recheckText, verdictWords } from '../../../src/recheck/recheck-words.ts';
import { recheck, type Recheck } from '../../../src/recheck/recheck.ts';
import { report } from '../../../src/report/report.ts';
import { demoText } from '../record/demos.ts';
import { dossierOf, fonts } from '../report/records.ts';
import schema1 from '../record/schema-1/tide-gauge.json' with { type: 'json' };
import { container } from './container.ts';
import { figuresFile, recordFile } from '../../../src/report/attachments.ts';
import { printedFigures } from '../../../src/design/printed-figures.ts';

const dossier = dossierOf('tide-gauge');
let bytes: Uint8Array;
beforeAll(async () => {
  bytes = await report(dossier, { paper: 'letter', fonts });
});

const recheckOf = async (file: Uint8Array, today: (printed: Dossier) => Dossier = (as) => as): Promise<Recheck> => {
  const found = await readFile('report.pdf', file);
  return recheck(found, today(design(found.record)), fonts);
};

/** As another version would compute it: the worst return loss of every option 1 dB better. */
const better = (printed: Dossier): Dossier => ({
  ...printed,
  options: printed.options.map((option) => ({ ...option, worstReturnLossDb: option.worstReturnLossDb! + 1 })),
});

describe('recheck(found, dossier, fonts)', { timeout: 30_000 }, () => {
  it('says same of a report, and that this version writes the same bytes', async () => {
    const outcome = await recheckOf(bytes);
    expect(outcome.verdict).toBe('same');
    expect(outcome.report).toMatchObject({ writtenBy: dossier.version, file: 'same', added: null });
    expect(outcome.digest).toBe(dossier.digest);
    expect(outcome.report!.figures.length).toBeGreaterThan(50);
    expect(verdictWords(outcome)).toBe('Same: every figure is what was printed.');
  });

  it('says which figures differ, then and now', async () => {
    const outcome = await recheckOf(bytes, better);
    expect(outcome.verdict).toBe('differs');
    expect(outcome.report!.file).toBeNull();
    const other = outcome.report!.figures.filter((figure) => figure.outcome !== 'same');
    expect(other.map(({ name }) => name)).toEqual(dossier.options.map(({ id }) => `${id}: worst return loss`));
    const lines = recheckText(outcome).split('\n');
    expect(lines.filter((line) => line.startsWith('differs: '))).toHaveLength(dossier.options.length);
    expect(lines[0]).toMatch(/^Differs: 4 of \d+ figures are not what was printed\.$/u);
  });

  it('says within rounding where last digits differ', async () => {
    const nudged = (printed: Dossier): Dossier => ({
      ...printed,
      options: printed.options.map((option) => ({ ...option, transducerGain: option.transducerGain * (1 - 1e-12) })),
    });
    expect((await recheckOf(bytes, nudged)).verdict).toBe('within rounding');
  });

  it('does not compare the bytes of another version, and says so', async () => {
    const files = [recordFile(dossier.record), figuresFile({ ...dossier, version: '0.0.1' }, printedFigures(dossier))];
    const outcome = await recheckOf(await container(files, dossier.digest));
    expect([outcome.verdict, outcome.report!.writtenBy, outcome.report!.file]).toEqual(['same', '0.0.1', null]);
    expect(new Map(facts(outcome)).get('File')).toContain('another version wrote it');
  });

  it('says differs where pages are not those of the record, though every figure is the same', async () => {
    const files = [recordFile(dossier.record), figuresFile(dossier, printedFigures(dossier))];
    const outcome = await recheckOf(await container(files, dossier.digest));
    expect([outcome.verdict, outcome.report!.file]).toEqual(['differs', 'other pages']);
    expect(verdictWords(outcome)).toContain('its pages may have been changed');
  });

  it('says same where another engine rounds the last digits of attached tables otherwise', async () => {
    const elsewhere: Dossier = {
      ...dossier,
      responses: dossier.responses.map((response) => ({
        ...response,
        returnLossDb: response.returnLossDb.map((value) => value * (1 + 1e-15)),
      })),
    };
    const outcome = await recheckOf(await report(elsewhere, { paper: 'a4', fonts }));
    expect([outcome.verdict, outcome.report!.file]).toEqual(['same', 'same pages']);
    expect(new Map(facts(outcome)).get('File')).toContain('attached tables differ in last digits');
  });

  it('computes a record alone, and says that there is nothing to compare with', async () => {
    const outcome = await recheckOf(new TextEncoder().encode(demoText('crystal-filter')));
    expect([outcome.verdict, outcome.report]).toEqual(['recomputed', null]);
    expect(recheckText(outcome)).toMatch(/^Computed: a record alone .*\n.*\nRechecked by: .*\nDigest: [0-9a-f]{64}\n/u);
  });

  it('takes the digest of an earlier record as it was written', async () => {
    const outcome = await recheckOf(new TextEncoder().encode(JSON.stringify(schema1)));
    expect(outcome.schema).toBe('ferrule-record/1');
    expect(outcome.digest).not.toBe(outcome.dossier.digest);
    expect(new Map(facts(outcome)).get('Record')).toBe('ferrule-record/1, read as ferrule-record/2');
  });

  it('tells who signed', async () => {
    const signed = dossierOf('tide-gauge', ({ signOff }) => ({
      signOff: {
        ...signOff,
        state: 'for review',
        prepared: { ...signOff.prepared, name: 'A. Wren', date: '2026-11-30' },
      },
    }));
    const outcome = await recheckOf(await report(signed, { paper: 'a4', fonts }));
    expect(new Map(facts(outcome)).get('Sign-off')).toBe('for review; prepared by A. Wren, 2026-11-30');
  });
});
