import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { readArguments } from '../../../src/cli/read-arguments.ts';
import { formatProblem, InputError } from '../../../src/quantity/problem.ts';
import { demoText } from '../record/demos.ts';

const folder = mkdtempSync(join(tmpdir(), 'ferrule-arguments-'));
afterAll(() => rmSync(folder, { recursive: true }));

const file = (name: string, content: string | Uint8Array): string => {
  const path = join(folder, name);
  writeFileSync(path, content);
  return path;
};

const linesOf = (args: readonly string[]): string[] => {
  try {
    readArguments(args);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return error.problems.map(formatProblem);
  }
  return [];
};

const sound = ['--frequency', '151.25M', '--source', '50', '--load', '9.4-j61'];

describe('readArguments(args)', () => {
  it('reads the fields as options, dated today', () => {
    const { record } = readArguments([
      ...sound,
      '--band',
      '150.5M..152M',
      '--return-loss',
      '14',
      '--aim=reflectionless',
    ]);
    expect(record).toMatchObject({
      method: 'two-element',
      aim: 'reflectionless',
      source: { r: 50, x: 0 },
      loads: [{ termination: { r: 9.4, x: -61 } }],
      requirement: { frequencyHz: 151.25e6, bandHz: { low: 150.5e6, high: 152e6 }, returnLossDb: 14 },
    });
    expect(record.identity.date).toMatch(/^\d{4}-\d{2}-\d{2}$/);
  });

  it('takes --behaviour for both ends, and an end on its own over it', () => {
    const { record } = readArguments([...sound, '--behaviour', 'constant', '--load-behaviour', 'parallel']);
    expect(record.source).toMatchObject({ behaviour: 'constant' });
    expect(record.loads[0]!.termination).toMatchObject({ behaviour: 'parallel' });
  });

  it('takes every --load as a state of the load', () => {
    const { record } = readArguments([
      '--frequency=151.25M',
      '--source=50',
      '--load=free=9.4-j61',
      '--load',
      'iced=8-j70',
    ]);
    expect(record.loads).toMatchObject([
      { name: 'free', termination: { r: 9.4, x: -61 } },
      { name: 'iced', termination: { r: 8, x: -70 } },
    ]);
  });

  it('takes --sections for a cascade', () => {
    expect(readArguments([...sound, '--sections', '3']).record).toMatchObject({ method: 'cascade', sections: 3 });
  });

  it('takes --block-dc on its own for yes', () => {
    for (const [args, blocked] of [
      [['--block-dc'], true],
      [['--block-dc', '--aim', 'conjugate'], true],
      [['--block-dc', 'no'], false],
      [['--block-dc=yes'], true],
      [[], false],
    ] as const) {
      expect(readArguments([...sound, ...args]).record.requirement.blockDc).toBe(blocked);
    }
  });

  it('reads a record file', () => {
    const text = demoText('tide-gauge');
    expect(readArguments([file('sound.json', text)]).record).toEqual(JSON.parse(text));
  });

  it("gives the command's own options apart", () => {
    const { options, record } = readArguments([...sound, '--out', 'report.pdf'], ['out', 'paper']);
    expect(options).toEqual({ out: 'report.pdf' });
    expect(record.loads[0]!.termination).toMatchObject({ r: 9.4 });
  });

  it.each<[string, readonly string[], string]>([
    ['nothing', [], 'command line: nothing is asked; give --frequency, --source and --load, or a record file'],
    [
      'no load',
      ['--frequency', '1M', '--source', '50'],
      '--load: nothing is given; write it as 50, 9.4-j61 or 50∠-30°',
    ],
    ['an option without its value', ['--load'], 'command line "--load": no value follows; give one after it'],
    [
      'an option in place of a value',
      ['--load', '--aim', 'conjugate'],
      'command line "--load": no value follows; give one after it',
    ],
    [
      'an unknown option',
      ['--loss', '3'],
      'command line "--loss": this option is unknown; give --frequency, --source, --load or another that README.md lists',
    ],
    [
      'an option given twice',
      [...sound, '--source=75'],
      'command line "--source": this option is given twice; keep the one that is meant',
    ],
    ['two records', ['a.json', 'b.json'], 'command line "b.json": more than one record is named; give one file'],
    [
      'a record and options',
      ['a.json', '--load', '5'],
      'command line "--load": a record holds all of its fields; give a record or options, not both',
    ],
    [
      'a negative resistance',
      [...sound.slice(0, 4), '--load', '-5'],
      '--load "-5": the load\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      'text',
      [...sound.slice(0, 4), '--load', 'whip'],
      '--load "whip": not an impedance; write it as 50, 9.4-j61 or 50∠-30°',
    ],
    [
      'a band upside down',
      [...sound, '--band', '152M..150M'],
      '--band "152M..150M": the band is upside down; give the lower end first',
    ],
    [
      'a file that is not there',
      [join(folder, 'none.json')],
      expect.stringMatching(/^file ".*": no such file; give the path of a file$/) as string,
    ],
    ['a folder', [folder], expect.stringMatching(/^file ".*": this is a folder; give the path of a file$/) as string],
  ])('refuses %s', (_, args, line) => {
    expect(linesOf(args)).toEqual([line]);
  });

  it('refuses files that hold no record', () => {
    const bytes = Uint8Array.from({ length: 4096 }, (_, k) => (k * 197) % 256);
    expect(linesOf([file('picture.png', bytes)])).toEqual([expect.stringMatching(/^record ".*": not JSON; give/)]);
    expect(linesOf([file('empty.json', '')])).toEqual([expect.stringMatching(/^record: not JSON; give/)]);
    expect(linesOf([file('huge.json', ' '.repeat(9_000_000))])).toEqual([
      expect.stringMatching(/9\.0 million characters/),
    ]);
  });
});
