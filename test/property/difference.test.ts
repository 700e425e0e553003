import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonical } from '../../src/record/canonical.ts';
import type { Build, DesignRecord } from '../../src/record/design-record.ts';
import { recordDifference } from '../../src/record/difference.ts';
import type { Termination } from '../../src/network/termination.ts';
import { plainRecord } from '../unit/record/plain-record.ts';
import { anyRecord } from './records.ts';

const hex = 'ab'.repeat(32);
const measured = {
  name: 'whip.s1p',
  sha256: hex,
  samples: 5,
  thinningError: 1e-5,
  referenceOhm: 50,
  frequencyHz: [1e6, 2e6],
  re: [0.1, 0.2],
  im: [-0.1, -0.2],
};
const part = {
  name: 'IND-082',
  kind: 'inductor',
  value: 82e-9,
  tolerance: { kind: 'relative', value: 0.05 },
  q: 40,
  qAtHz: 1e8,
  selfResonanceHz: 9e8,
  eslH: null,
  ratedVolts: 50,
  ratedAmps: 0.5,
} as const;
const stock = {
  name: 'shelf.csv',
  sha256: hex,
  parts: [part, { ...part, name: 'CAP-8', kind: 'capacitor' as const, value: 8.2e-12, eslH: 5e-10, q: null }],
};
const build: Build = {
  inductor: { origin: 'stock', tolerance: { kind: 'relative', value: 0.05 }, qSlope: 0.5 },
  capacitor: { origin: 'E24', tolerance: { kind: 'absolute', value: 2.5e-13 }, qSlope: 0 },
  stock,
  pairs: true,
  selfResonanceHz: 1e9,
  eslH: 5e-10,
  strayF: 1e-13,
  leadH: 1e-9,
  distribution: 'uniform',
  sourceSpread: 0.05,
  loadSpread: 0.1,
  samples: 1000,
  seed: 1,
  leastYield: 0.9,
  vswr: 3,
  derating: 0.8,
  ratedVolts: 50,
  ratedAmps: 1,
  ratedWatts: 0.5,
  winding: { wireM: 1e-3, formM: 6e-3, gapM: 5e-4 },
};
const asBuilt = { measured: { ...measured, name: 'board.s1p' }, state: 'in hand', note: 'board 3' };
const model: Termination = { model: 'rc-series', values: [12, 8.2e-12] };

/** Any record, and every branch of what it may hold grown on it. */
const grown = anyRecord().map((record): DesignRecord => ({
  ...record,
  loads: [
    ...record.loads.map((state) => ({ ...state, name: 'free space' })),
    { name: 'in hand', termination: model },
    { name: 'measured', termination: { measured } },
  ],
  build: record.build === null ? null : { ...record.build, stock },
  deviations: [
    { subject: 'return loss', reason: 'accepted for the pilot run' },
    { subject: 'yield', reason: 'every board is tuned' },
  ],
  history: [
    { revision: 'A', date: '2026-01-31', change: '', digest: hex },
    { revision: 'B', date: '2026-02-28', change: 'wider band', digest: 'cd'.repeat(32) },
  ],
  previous: plainRecord,
  asBuilt,
}));

/** What may stand where nothing stood; a number anywhere else. */
const instead: Readonly<Record<string, unknown>> = {
  bandHz: { low: 1, high: 2 },
  sweepHz: { low: 1, high: 2 },
  build,
  stock,
  previous: plainRecord,
  asBuilt,
  option: 'lowpass',
};

type Path = readonly string[];

/** Every value that isn't made of others, and every list. */
const places = (value: unknown, path: Path = []): readonly Path[] =>
  typeof value === 'object' && value !== null
    ? [
        ...(Array.isArray(value) && value.length > 0 ? [path] : []),
        ...Object.entries(value).flatMap(([name, inner]) => places(inner, [...path, name])),
      ]
    : [path];

function alter(value: unknown, path: Path, change: (value: unknown) => unknown): unknown {
  const [name, ...rest] = path;
  if (name === undefined) return change(value);
  if (Array.isArray(value)) return value.map((each, k) => (String(k) === name ? alter(each, rest, change) : each));
  const object = value as Record<string, unknown>;
  return { ...object, [name]: alter(object[name], rest, change) };
}

function otherwise(value: unknown, path: Path): unknown {
  if (Array.isArray(value)) return value.slice(0, -1);
  if (typeof value === 'number') return value === 0 ? 1 : value * (1 + 2 * Number.EPSILON);
  if (typeof value === 'boolean') return !value;
  if (path.at(-1) === 'model') return 'rl-series';
  if (value === 'relative' || value === 'absolute') return value === 'relative' ? 'absolute' : 'relative';
  return value === null ? (instead[path.at(-1)!] ?? 1) : `${value as string}x`;
}

const oneLine = (text: string): string => text.replace(/\s+/gu, ' ').trim();

describe('recordDifference(before, after)', () => {
  it('is empty between a record and itself, read again', () => {
    fc.assert(
      fc.property(grown, (record) => {
        expect(recordDifference(record, JSON.parse(JSON.stringify(record)))).toEqual([]);
      }),
      { numRuns: 50 },
    );
  });

  it('shows a change of any value and of any list, to the last bit and letter, both ways', () => {
    fc.assert(
      fc.property(grown, (record) => {
        const all = places(record).filter(([first]) => first !== 'schema');
        expect(all.length).toBeGreaterThan(90);
        for (const path of all) {
          const other = alter(record, path, (value) => otherwise(value, path)) as DesignRecord;
          const changes = recordDifference(record, other);
          expect([path.join('.'), changes.length > 0]).toEqual([path.join('.'), true]);
          for (const { what, before, after } of changes) {
            expect(what).not.toBe('');
            expect(oneLine(after)).not.toBe(oneLine(before));
          }
          expect(recordDifference(other, record).length).toBe(changes.length);
        }
      }),
      { numRuns: 4 },
    );
  });

  it('shows another order of load states, deviations, revisions and stock lines', () => {
    fc.assert(
      fc.property(grown, (record) => {
        for (const path of [
          ['loads'],
          ['deviations'],
          ['history'],
          ...(record.build === null ? [] : [['build', 'stock', 'parts']]),
        ]) {
          const turned = alter(record, path, (list) => (list as readonly unknown[]).toReversed()) as DesignRecord;
          expect(recordDifference(record, turned).map(({ what }) => what.split(' ').slice(0, 2).join(' '))).toEqual([
            'Order of',
          ]);
        }
      }),
      { numRuns: 20 },
    );
  });

  it('says all of any two records in words, and nothing only where they are the same', () => {
    fc.assert(
      fc.property(fc.oneof(anyRecord(), grown), fc.oneof(anyRecord(), grown), (a, b) => {
        const changes = recordDifference(a, b);
        expect(changes.length === 0).toBe(canonical(a) === canonical(b));
        const written = changes.map(({ what, before, after }) => `${what}: ${before} -> ${after}`).join('\n');
        const own = JSON.stringify([a, b]);
        for (const slip of ['undefined', 'NaN', 'Infinity', '[object', 'null']) {
          expect([slip, written.includes(slip) && !own.includes(`${slip}"`)]).toEqual([slip, false]);
        }
      }),
      { numRuns: 50 },
    );
  });
});
