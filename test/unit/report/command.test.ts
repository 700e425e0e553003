import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';
import { readPdf } from './read-pdf.ts';

const root = fileURLToPath(new URL('../../..', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'ferrule-report-'));
afterAll(() => rmSync(folder, { recursive: true }));

/** The command as npm runs it, typed in a folder of its own. */
function report(...args: readonly string[]) {
  const command = [join(root, 'src/cli/setup.mjs'), 'src/cli/report.ts', ...args];
  const { status, stdout, stderr } = spawnSync(process.execPath, command, {
    cwd: root,
    env: { ...process.env, INIT_CWD: folder },
    encoding: 'utf8',
  });
  return { status, stdout, stderr };
}

const record = join(root, 'public/demo/crystal-filter.json');

// A fresh process reads the whole core: on a busy machine that takes a while.
describe('report RECORD.json --out FILE.pdf', { timeout: 30_000 }, () => {
  it('writes the file where the command was typed', async () => {
    expect(report(record, '--out', 'filter.pdf')).toEqual({ status: 0, stdout: 'Wrote filter.pdf\n', stderr: '' });
    const { text } = await readPdf(new Uint8Array(readFileSync(join(folder, 'filter.pdf'))));
    expect(text).toContain('Tide-gauge receiver: crystal filter to IF amplifier');
  });

  it('takes the options of solve in place of a record, on the paper asked for', async () => {
    const given = ['--frequency', '151.25M', '--source', '50', '--load', '9.4-j61'];
    expect(report(...given, '--paper', 'Letter', '--out', 'whip.pdf').status).toBe(0);
    const bytes = readFileSync(join(folder, 'whip.pdf'));
    // A4 would be 595.28 by 841.89.
    expect((await readPdf(new Uint8Array(bytes))).pages[0]!.some(({ x, width }) => x + width > 560)).toBe(true);
  });

  it.each([
    [[record], '--out: no file is named'],
    [[record, '--out', 'x.pdf', '--paper', 'a5'], '--paper "a5": no such paper; give a4 or letter'],
    [[record, '--out', 'no-such-folder/x.pdf'], '--out "no-such-folder/x.pdf": there is no such folder'],
    [['missing.json', '--out', 'x.pdf'], 'file "missing.json": no such file'],
  ])('refuses bad input with one line (%#)', (args, line) => {
    const { status, stdout, stderr } = report(...args);
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).toContain(line);
    expect(stderr.trimEnd().split('\n')).toHaveLength(1);
  });
});
