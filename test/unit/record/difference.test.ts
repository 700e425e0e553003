import { describe, expect, it } from 'vitest';
import type { StockPart } from '../../../src/parts/stock.ts';
import type { Build, DesignRecord } from '../../../src/record/design-record.ts';
import { recordDifference } from '../../../src/record/difference.ts';
import { plainRecord } from './plain-record.ts';

const digest = '0123456789abcdef'.repeat(4);
const measured = (name: string, re = [0.1, 0.2]) => ({
  measured: {
    name,
    sha256: digest,
    samples: 2,
    thinningError: 0,
    referenceOhm: 50,
    frequencyHz: [100e6, 200e6],
    re,
    im: [0, 0],
  },
});
const policy = { origin: 'E24', tolerance: { kind: 'relative', value: 0.05 }, qSlope: 0 } as const;
const build: Build = {
  inductor: policy,
  capacitor: policy,
  stock: null,
  pairs: false,
  selfResonanceHz: null,
  eslH: 0,
  strayF: 1e-13,
  leadH: 0,
  distribution: 'uniform',
  sourceSpread: 0,
  loadSpread: 0.07,
  samples: 1000,
  seed: 1,
  leastYield: null,
  vswr: null,
  derating: 0.8,
  ratedVolts: null,
  ratedAmps: null,
  ratedWatts: null,
  winding: { wireM: 1e-3, formM: 6e-3, gapM: 5e-4 },
};
const stockPart = (name: string, value = 82e-9): StockPart => ({
  name,
  kind: 'inductor',
  value,
  tolerance: { kind: 'relative', value: 0.05 },
  q: 40,
  qAtHz: 100e6,
  selfResonanceHz: 900e6,
  eslH: null,
  ratedVolts: null,
  ratedAmps: 0.5,
});

/** Each change in a line. */
const told = (before: DesignRecord, after: DesignRecord): readonly string[] =>
  recordDifference(before, after).map(({ group, what, before: a, after: b }) => `${group} / ${what}: ${a} -> ${b}`);
const from = (change: Partial<DesignRecord>, before: Partial<DesignRecord> = {}): readonly string[] =>
  told({ ...plainRecord, ...before }, { ...plainRecord, ...change });

describe('recordDifference(before, after)', () => {
  it('tells the requirement in its own units, as it was read', () => {
    const requirement = { ...plainRecord.requirement, bandHz: { low: 150e6, high: 152.5e6 }, returnLossDb: null };
    expect(from({ requirement, build: null })).toEqual([
      'requirement / Band: 150.5 MHz to 152 MHz -> 150 MHz to 152.5 MHz',
      'requirement / Return loss, at least: 14 dB -> not required',
    ]);
  });

  it('tells a digit that words leave out', () => {
    const requirement = { ...plainRecord.requirement, frequencyHz: 151250000.00000003 };
    expect(from({ requirement })).toEqual(['requirement / Design frequency: 151250000 Hz -> 151250000.00000003 Hz']);
  });

  it('tells nothing given from nothing said', () => {
    expect(from({ identity: { ...plainRecord.identity, ticket: 'none' } })).toEqual([
      'identity / Change ticket: "" -> "none"',
    ]);
  });

  it('tells what an end is and what it does away from the design frequency', () => {
    expect(
      from({
        source: { model: 'rc-series', values: [12, 8.2e-12] },
        loads: [{ name: '', termination: { r: 9.4, x: -61, behaviour: 'constant' } }],
      }),
    ).toEqual([
      'terminations / Source: 50 Ω, the same at every frequency -> rc-series: R 12 Ω, C 8.2 pF',
      'terminations / Load: 9.4 − j61 Ω, varying as R and X in series -> 9.4 − j61 Ω, the same at every frequency',
    ]);
  });

  it('tells measured data by name, samples and digest, and other numbers of the same name too', () => {
    const words = 'whip.s1p, 2 samples, 100.0 MHz to 200.0 MHz, SHA-256 0123456789abcdef…';
    expect(from({ source: measured('whip.s1p') })).toEqual([
      `terminations / Source: 50 Ω, the same at every frequency -> ${words}`,
    ]);
    const [other] = from({ source: measured('whip.s1p', [0.1, 0.3]) }, { source: measured('whip.s1p') });
    expect(other).toMatch(/numbers used ([0-9a-f]{16})….* numbers used (?!\1)[0-9a-f]{16}…$/);
  });

  it('tells load states that were added, removed, renamed and put in another order', () => {
    const [a, b, c] = [10, 20, 30].map((r) => ({ r, x: 0, behaviour: 'series' as const }));
    const loads = [
      { name: 'free space', termination: a! },
      { name: 'in hand', termination: b! },
      { name: 'on metal', termination: c! },
    ];
    const now = [loads[1]!, loads[0]!, { name: 'in water', termination: { ...c!, r: 31 } }];
    expect(from({ loads: now }, { loads })).toEqual([
      'terminations / Load, on metal: 30 Ω, the same at every frequency -> removed',
      'terminations / Load, in water: none -> added: 31 Ω, the same at every frequency',
      'terminations / Order of the load states: Load, free space; Load, in hand -> Load, in hand; Load, free space',
    ]);
    expect(from({ loads: [loads[0]!, loads[1]!, { ...loads[2]!, name: 'on steel' }] }, { loads })).toEqual([
      'terminations / Name of a load state: on metal -> on steel',
    ]);
    expect(from({ loads: [{ name: 'whip', termination: a! }] })).toEqual([
      'terminations / Name of a load state: none -> whip',
      'terminations / Load, whip: 9.4 − j61 Ω, varying as R and X in series -> 10 Ω, the same at every frequency',
    ]);
  });

  it('tells deviations by their subject', () => {
    const deviations = [{ subject: 'yield', reason: 'tuned on the line' }] as const;
    expect(from({ deviations })).toEqual(['deviations / Deviation, yield: none -> added: tuned on the line']);
    expect(from({}, { deviations })).toEqual(['deviations / Deviation, yield: tuned on the line -> removed']);
    expect(from({ deviations: [{ subject: 'yield', reason: '' }] }, { deviations })).toEqual([
      'deviations / Deviation, yield: tuned on the line -> none',
    ]);
  });

  it('tells that real parts are asked for, and of what', () => {
    const changes = from({ build });
    expect(changes).toContain('parts / Parts: exact values, ideal parts -> real parts');
    expect(changes).toContain('parts / Inductors from: not given -> E24');
    expect(changes).toContain('parts / Spread of the load: not given -> 7 %');
    const more = { ...build, capacitor: { ...policy, tolerance: { kind: 'absolute', value: 2.5e-13 } as const } };
    expect(from({ build: { ...more, leastYield: 0.95, strayF: 2e-13 } }, { build })).toEqual([
      'requirement / Yield, at least: not required -> 95 %',
      'parts / Tolerance of capacitors: ±5 % -> ±0.25 pF',
      'parts / Stray capacitance of every node: 100 fF -> 200 fF',
    ]);
  });

  it('tells the lines of a stock list one by one while they are few', () => {
    const list = { name: 'shelf.csv', sha256: digest, parts: [stockPart('A'), stockPart('B')] };
    const now = { ...list, sha256: 'f'.repeat(64), parts: [stockPart('B', 100e-9), stockPart('C')] };
    expect(from({ build: { ...build, stock: now } }, { build: { ...build, stock: list } })).toEqual([
      'parts / Stock list: shelf.csv, 2 lines, SHA-256 0123456789abcdef… -> shelf.csv, 2 lines, SHA-256 ffffffffffffffff…',
      'parts / Stock line A: 82 nH ±5 %, Q 40 at 100 MHz, self-resonance 900 MHz, 500 mA -> removed',
      'parts / Stock line B: 82 nH ±5 %, Q 40 at 100 MHz, self-resonance 900 MHz, 500 mA -> 100 nH ±5 %, Q 40 at 100 MHz, self-resonance 900 MHz, 500 mA',
      'parts / Stock line C: none -> added: 82 nH ±5 %, Q 40 at 100 MHz, self-resonance 900 MHz, 500 mA',
    ]);
  });

  it('counts the lines of a stock list where they are many, and names ten', () => {
    const parts = Array.from({ length: 30 }, (_, k) => stockPart(`L${String(k)}`));
    const list = { name: 'shelf.csv', sha256: digest, parts };
    // Of L0 to L29: the first four go, the next nine change, two come.
    const now = {
      ...list,
      parts: [
        ...parts.slice(4).map((part, k) => (k < 9 ? { ...part, q: 41 } : part)),
        stockPart('M0'),
        stockPart('M1'),
      ],
    };
    const changes = from({ build: { ...build, stock: now } }, { build: { ...build, stock: list } });
    expect(changes[0]).toBe('parts / Stock lines: 30 -> 28: 2 added, 4 removed, 9 otherwise; 10 of them follow');
    expect(changes.length).toBe(11);
  });

  it('tells the history, the revision carried along, the measurement and the sign-off', () => {
    const signOff = { ...plainRecord.signOff, state: 'issued' as const };
    const history = [{ revision: 'A', date: '2026-01-31', change: 'first issue', digest }];
    const changes = from({
      history,
      previous: plainRecord,
      asBuilt: { ...measured('board.s1p'), state: null, note: '' },
      signOff,
    });
    expect(changes).toEqual([
      'identity / History, revision A: none -> added: 2026-01-31, first issue, SHA-256 0123456789abcdef…',
      expect.stringMatching(
        /^identity \/ Earlier revision carried along: none -> EX-014, revision A, SHA-256 [0-9a-f]{16}…$/,
      ),
      'as built / Measured on the board: none -> added: board.s1p, 2 samples, 100.0 MHz to 200.0 MHz, SHA-256 0123456789abcdef…',
      'sign-off / State: draft -> issued',
    ]);
  });
});
