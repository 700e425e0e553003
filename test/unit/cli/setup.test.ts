import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root } from '../../../src/cli/project.ts';

let folder: string;
let program: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'ferrule-setup-'));
  program = join(folder, 'program.ts');
  const says = 'const said: unknown = { args: process.argv.slice(2), folder: process.cwd() };';
  writeFileSync(program, `${says} console.log(JSON.stringify(said)); process.exitCode = 2;`);
});
afterAll(() => rmSync(folder, { recursive: true }));

const setup = (...args: string[]) =>
  spawnSync(process.execPath, ['src/cli/setup.mjs', ...args], {
    cwd: root,
    env: { ...process.env, INIT_CWD: folder },
    encoding: 'utf8',
  });

describe('setup.mjs PROGRAM ...', () => {
  it('hands over the arguments, the folder it was called from and the exit code, and says nothing itself', () => {
    const { stdout, stderr, status } = setup(program, '--load', '9.4 - j61');
    expect(JSON.parse(stdout)).toEqual({ args: ['--load', '9.4 - j61'], folder });
    expect([stderr, status]).toEqual(['', 2]);
  });

  it('says what is missing when no program is named', () => {
    const { stdout, stderr, status } = setup();
    expect([stdout, status]).toEqual(['', 2]);
    expect(stderr).toMatch(/^Ferrule: no program named.*\n$/);
  });
});
