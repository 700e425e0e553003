import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, it } from 'vitest';
import { printedFigures } from '../../../src/design/printed-figures.ts';
import { figuresFile, recordFile } from '../../../src/report/attachments.ts';
import { report } from '../../../src/report/report.ts';
import { demoText } from '../record/demos.ts';
import { container } from '../recheck/container.ts';
import { dossierOf, fonts } from '../report/records.ts';

const program = fileURLToPath(new URL('../../../src/cli/recheck.ts', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'ferrule-recheck-'));
afterAll(() => rmSync(folder, { recursive: true }));

const recheck = (...args: string[]): Promise<{ readonly code: number; readonly out: string; readonly err: string }> =>
  new Promise((done) => {
    const env = { ...process.env, INIT_CWD: folder };
    execFile(process.execPath, [program, ...args], { env, maxBuffer: 1e8 }, (error, out, err) => {
      done({ code: error === null ? 0 : Number(error.code), out, err });
    });
  });

const named = (name: string, content: string | Uint8Array): string => {
  writeFileSync(join(folder, name), content);
  return name;
};

const dossier = dossierOf('crystal-filter');
const figures = printedFigures(dossier);

describe.concurrent('recheck FILE', { timeout: 30_000 }, () => {
  it('ends with 0 for a report whose figures are the same', async ({ expect }) => {
    const file = named('same.pdf', await report(dossier, { paper: 'a4', fonts }));
    const { code, out, err } = await recheck(file);
    expect([code, err]).toEqual([0, '']);
    expect(out).toMatch(/^Same: every figure is what was printed\.\n/u);
    expect(out).toContain(`Digest: true, ${dossier.digest}\n`);
    expect(out).toContain(`Figures: ${figures.length} compared: ${figures.length} the same, `);
  });

  it('ends with 1 where figures differ, one line for each: its name, then, now', async ({ expect }) => {
    const other = figures.map((figure) => (figure.name === 'networks considered' ? { ...figure, value: 99 } : figure));
    const files = [recordFile(dossier.record), figuresFile({ ...dossier, version: '0.0.1' }, other)];
    const file = named('differs.pdf', await container(files, dossier.digest));
    const { code, out, err } = await recheck(file);
    expect([code, err]).toEqual([1, '']);
    expect(out).toContain('Written by: Ferrule 0.0.1\n');
    expect(out).toMatch(/^differs: networks considered: 99 then, \d+ now$/mu);
    expect(out.match(/^differs: /gmu)).toHaveLength(1);

    const asJson = await recheck('--json', file);
    expect(asJson.code).toBe(1);
    expect(JSON.parse(asJson.out)).toMatchObject({
      verdict: 'differs',
      digest: dossier.digest,
      report: { writtenBy: '0.0.1', compared: figures.length, other: [{ name: 'networks considered', then: 99 }] },
    });
  });

  it('ends with 0 for a record alone, and says that there was nothing to compare', async ({ expect }) => {
    const { code, out, err } = await recheck(named('record.json', demoText('crystal-filter')));
    expect([code, err]).toEqual([0, '']);
    expect(out).toMatch(/^Computed: a record alone holds no printed figure to compare with\.\n/u);
    expect(out).toContain(`Digest: ${dossier.digest}\n`);
  });

  it.for<readonly [readonly string[], string]>([
    [['missing.pdf'], 'file "missing.pdf": no such file'],
    [['.'], 'file ".": this is a folder'],
    [[], 'one file is rechecked at a time'],
    [['a.pdf', 'b.pdf'], 'command line "a.pdf b.pdf": one file is rechecked at a time'],
    [['--paper', 'a.pdf'], 'command line "--paper": this option is unknown'],
    [[named('other.pdf', '%PDF-1.4\nnot ours')], 'file "other.pdf": this PDF is no report of Ferrule\'s'],
    [[named('words.txt', 'hello')], 'file "words.txt": neither a report (PDF) nor a record (JSON)'],
    [[named('large.pdf', new Uint8Array(20_000_001))], 'file "large.pdf": over 20 MB'],
  ])('ends with 2 and one line: %j', async ([args, line], { expect }) => {
    const { code, out, err } = await recheck(...args);
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain(line);
    expect(err.trimEnd().split('\n')).toHaveLength(1);
  });
});
