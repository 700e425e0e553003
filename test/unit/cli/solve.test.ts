import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';
import { flatOptions } from '../../../src/cli/flat-options.ts';
import { design } from '../../../src/design.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { demoText } from '../record/demos.ts';
import { recordOf } from '../record-of.ts';

const program = fileURLToPath(new URL('../../../src/cli/solve.ts', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'ferrule-solve-'));
afterAll(() => rmSync(folder, { recursive: true }));

interface Ended {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

const solve = (...args: string[]): Promise<Ended> =>
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

/** Everything as it comes out of JSON. */
const asJson = (value: unknown): unknown => JSON.parse(JSON.stringify(value)) as unknown;

describe.concurrent('solve', { timeout: 30_000 }, () => {
  it('prints the dossier of a record file named from where one stands, and nothing else', async ({ expect }) => {
    const text = demoText('crystal-filter');
    const { code, out, err } = await solve(named('crystal-filter.json', text));
    expect([code, err]).toEqual([0, '']);
    expect(JSON.parse(out)).toEqual(asJson(flatOptions(design(readRecord(text)))));
  });

  it('prints the dossier of options, in the form that is promised', async ({ expect }) => {
    const { code, out, err } = await solve('--frequency', '151.25M', '--source', '50', '--load', '9.4-j61');
    expect([code, err]).toEqual([0, '']);
    const dossier = JSON.parse(out);
    expect(dossier.schema).toBe('ferrule-dossier/1');
    expect(dossier.options).toHaveLength(4);
    for (const option of dossier.options) {
      expect(option).toMatchObject({
        id: expect.any(String) as unknown,
        seen: { r: expect.closeTo(50, 8) as unknown, x: expect.closeTo(0, 8) as unknown },
        transducerGain: expect.closeTo(1, 9) as unknown,
        reflection: expect.closeTo(0, 9) as unknown,
        loadedQ: expect.any(Number) as unknown,
        worstReturnLossDb: null,
        meets: true,
      });
      expect(option.arms[0]).toEqual({
        arm: expect.stringMatching(/^(series|shunt)$/) as unknown,
        part: expect.stringMatching(/^(inductor|capacitor)$/) as unknown,
        value: expect.any(Number) as unknown,
      });
      expect(Object.keys(option.halfPower)).toEqual(expect.arrayContaining(['lowHz', 'highHz']));
    }
    const { record } = dossier;
    expect(record).toEqual(
      recordOf({ frequency: '151.25M', source: '50', load: '9.4-j61', date: record.identity.date }),
    );
  });

  it('computes a load equal to the source: no part, no NaN', async ({ expect }) => {
    const { code, out } = await solve('--frequency', '1M', '--source', '50', '--load', '50', '--band', '0.9M..1.1M');
    expect(code).toBe(0);
    expect(out).not.toMatch(/NaN|Infinity|undefined/);
    expect(JSON.parse(out).options).toMatchObject([{ id: 'direct', arms: [], loadedQ: null, meets: true }]);
  });

  it('computes an extreme ratio, 1 mΩ to 1 MΩ', async ({ expect }) => {
    const { code, out } = await solve('--frequency', '1M', '--source', '1m', '--load', '1M', '--return-loss', '10');
    expect(code).toBe(0);
    expect(out).not.toMatch(/NaN|Infinity|undefined/);
    expect(JSON.parse(out).options).toHaveLength(2);
  });

  it('prints of each option the parts on sale, their figures and their yield', async ({ expect }) => {
    const asked = '--frequency 151.25M --source 50 --load 9.4-j61 --band 150.5M..152M --return-loss 14 --power 2';
    const real = '--series-inductor E24 --series-capacitor E24 --tolerance 5% --q-inductor 40 --samples 200 --seed 3';
    const { code, out } = await solve(...`${asked} ${real}`.split(' '));
    expect(code).toBe(0);
    for (const option of JSON.parse(out).options) {
      expect(option.parts).toHaveLength(2);
      expect(option.parts[0]).toMatchObject({ from: 'E24', tolerance: { kind: 'relative', value: 0.05 } });
      expect(option.worstReturnLossDb).toBe(option.built.worstReturnLossDb);
      expect(option.exact.worstReturnLossDb).toBeGreaterThan(option.worstReturnLossDb);
      expect(option.yield).toMatchObject({ samples: 200, seed: 3, passed: option.yield.value * 200 });
      expect(Object.keys(option.stress[0])).toEqual(expect.arrayContaining(['voltsPeak', 'ampsRms', 'watts']));
      expect(option.sensitivity).toHaveLength(2);
    }
  });

  it('prints a summary for a change ticket instead', async ({ expect }) => {
    const { code, out } = await solve(named('tide-gauge.json', demoText('tide-gauge')), '--ticket');
    expect([code, out.split('\n')[0]]).toEqual([0, 'Tide-gauge telemetry: transmitter to stub whip']);
  });

  it.each<[string, () => string[], RegExp]>([
    ['zero resistance', () => ['--frequency', '1M', '--source', '0', '--load', '5'], /^--source "0": .*above zero/],
    [
      'more than one fault',
      () => ['--frequency', '1e400', '--source', '50', '--load', 'NaN'],
      /^--frequency "1e400": .* \(and 1 more\)$/,
    ],
    [
      'a choice that is not there',
      () => ['--frequency', '1M', '--source', '50', '--load', '5', '--choice', 'pi'],
      /^choice "pi": no such network.*choose one of shunt-source-plus, shunt-source-minus$/,
    ],
    [
      'a tolerance of real parts that nobody asked for',
      () => ['--frequency', '1M', '--source', '50', '--load', '5', '--tolerance', '5%'],
      /^--tolerance "5%": it tells of real parts and none are asked for; give --series-inductor/,
    ],
    [
      'a tolerance of all there is',
      () => ['--frequency', '1M', '--source', '50', '--load', '5', '--series-inductor', 'E24', '--tolerance', '120%'],
      /^--tolerance "120%": at 100 % or more a part could be nothing at all; write it as/,
    ],
    [
      'no samples',
      () => ['--frequency', '1M', '--source', '50', '--load', '5', '--series-inductor', 'E24', '--samples', '0'],
      /^--samples "0": the number of networks drawn is out of range; give a whole number from 1 to/,
    ],
    ['a deeply nested file', () => [named('deep.json', '['.repeat(100_000))], /^record "\[+…": not JSON/],
    [
      'an unknown field with a line in its name',
      () => [named('odd.json', demoText('tide-gauge').replace('{', '{"two\\nlines":1,'))],
      /^two lines.*unknown/,
    ],
  ])('exits 2 with one line on standard error for %s', async (_, args, line) => {
    const { code, out, err } = await solve(...args());
    expect([code, out]).toEqual([2, '']);
    expect(err.endsWith('\n')).toBe(true);
    expect(err.slice(0, -1)).toMatch(line);
    expect(err.slice(0, -1)).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u);
  });
});
