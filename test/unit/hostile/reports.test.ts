import { fork } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';
import type { ReportRefusal } from './refuse-report.ts';
import { hostileReports } from './reports.ts';

const folder = mkdtempSync(join(tmpdir(), 'ferrule-hostile-'));
afterAll(() => rmSync(folder, { recursive: true }));

const program = fileURLToPath(new URL('refuse-report.ts', import.meta.url));

function refusalOf(path: string): Promise<ReportRefusal> {
  const child = fork(program, { execArgv: [] });
  return new Promise<ReportRefusal>((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code, signal) => reject(new Error(`it ended with ${String(code ?? signal)}`)));
    child.once('message', resolve);
    child.send(path);
  }).finally(() => child.kill());
}

describe('a hostile report is refused in one line, in a second and 200 MB', () => {
  it.each(hostileReports.map((report) => [report.name, report.what, report.bytes] as const))(
    '%s: %s',
    async (name, _, bytes) => {
      const path = join(folder, name);
      writeFileSync(path, await bytes());
      const { lines, thrown, milliseconds, megabytes } = await refusalOf(path);
      expect(thrown).toBe('');
      expect(lines).toHaveLength(1);
      expect(lines![0]).toMatch(/^[^\p{Cc}\p{Cs}\p{Zl}\p{Zp}]+$/u);
      expect(lines![0]).toMatch(/^.+: .+; .+$/u);
      expect(lines![0]!.length).toBeLessThanOrEqual(450);
      expect(milliseconds).toBeLessThan(1000);
      expect(megabytes).toBeLessThan(200);
    },
  );
});
