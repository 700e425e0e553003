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
  writeFileSync(
    program,
    'const said: unknown = process.argv.slice(2); console.log(JSON.stringify(said)); process.exitCode = 2;',
  );
});
afterAll(() => rmSync(folder, { recursive: true }));

const setup = (...args: string[]) =>
  spawnSync(process.execPath, ['src/cli/setup.mjs', ...args], {
    cwd: root,
    encoding: 'utf8',
  });

describe('setup.mjs PROGRAM ...', () => {
  it('hands over the arguments and the exit code, and says nothing itself', () => {
    const { stdout, stderr, status } = setup(program, '--load', '9.4 - j61');
    expect(JSON.parse(stdout)).toEqual(['--load', '9.4 - j61']);
    expect([stderr, status]).toEqual(['', 2]);
  });

  it('says what is missing when no program is named', () => {
    const { stdout, stderr, status } = setup();
    expect([stdout, status]).toEqual(['', 2]);
    expect(stderr).toMatch(/^Ferrule: no program named.*\n$/);
  });
});
