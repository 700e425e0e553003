import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Arm } from '../../src/network/arm.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweepInto, type SweepResult } from '../../src/network/sweep.ts';
import { logGrid } from '../../src/network/worst-in-band.ts';
import type { Figure } from './figure.ts';
import { median } from './timing.ts';

const points = 1001;
const turns = 31;
const budget = 1.5;

/** Low-pass sections one after the other, with parts of finite Q so that no coefficient is left out. */
function arms(sections: number): readonly Arm[] {
  return Array.from({ length: sections }, (_, k): readonly Arm[] => [
    { arm: 'series', part: 'inductor', value: (40 + 5 * k) * 1e-9, q: 80 },
    { arm: 'shunt', part: 'capacitor', value: (12 + 2 * k) * 1e-12, q: 300 },
  ]).flat();
}

/**
 * Time per arm and frequency of the sweep against that of the same loop in C (gcc -O2, no vectorising), taken in turns
 * in one run; processor time, medians.
 */
export function benchSweep(): readonly Figure[] {
  if (spawnSync('gcc', ['--version']).status !== 0) {
    const measured = 'no gcc on this machine';
    return [{ name: 'sweep against C', measured, budget: `ratio ≤ ${budget}`, within: null }];
  }
  const folder = mkdtempSync(join(tmpdir(), 'ferrule-bench-'));
  try {
    const program = join(folder, 'sweep-loop');
    const source = new URL('sweep-loop.c', import.meta.url).pathname;
    execFileSync('gcc', ['-O2', '-fno-tree-vectorize', '-o', program, source]);
    return [1, 3, 6].map((sections) => against(program, folder, arms(sections)));
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function against(program: string, folder: string, network: readonly Arm[]): Figure {
  const source = { r: 50, x: 0, behaviour: 'constant' } as const;
  const load = { r: 9.4, x: -61, behaviour: 'series' } as const;
  const ladder = prepareLadder(network);
  const ends = endsOver(source, load, 151.25e6, logGrid(50e6, 500e6, points));
  const [caseFile, resultFile] = [join(folder, 'case'), join(folder, 'result')];
  const head = Int32Array.of(ladder.length, points, 1, 0);
  const { frequencyHz, rs, xs, rl, xl } = ends;
  const doubles = [Float64Array.from(ladder.shunt), ladder.coefficients, frequencyHz, rs, xs, rl, xl];
  writeFileSync(caseFile, Buffer.concat([head, ...doubles].map((a) => Buffer.from(a.buffer))));

  const result: SweepResult = {
    gain: new Float64Array(points),
    gammaRe: new Float64Array(points),
    gammaIm: new Float64Array(points),
  };
  const rounds = Math.round(4e6 / (points * ladder.length));
  const sweepRounds = (count: number): void => {
    for (let round = 0; round < count; round += 1) sweepInto(ladder, ends, 'conjugate', result);
  };
  const ours = (): number => {
    // Both warm up at each turn: after a turn of the other the caches and the clock rate are not one's own.
    sweepRounds(rounds / 2);
    const start = process.cpuUsage();
    sweepRounds(rounds);
    return (process.cpuUsage(start).user * 1000) / rounds;
  };
  const theirs = (): number => Number(execFileSync(program, [caseFile, resultFile, String(rounds)]).toString());

  ours();
  const times = Array.from({ length: turns }, () => [ours(), theirs()] as const);
  assertSame(result, readFileSync(resultFile));
  const perStep = (which: 0 | 1): number => median(times.map((pair) => pair[which])) / (points * ladder.length);
  const ratio = median(times.map(([here, inC]) => here / inC));
  return {
    name: `sweep of ${ladder.length} arms, per arm and frequency`,
    measured: `${perStep(0).toFixed(2)} ns, C ${perStep(1).toFixed(2)} ns: ${ratio.toFixed(2)}`,
    budget: `ratio ≤ ${budget}`,
    within: ratio <= budget,
  };
}

/** Both must have done the same work: results within a part in 10⁹. */
function assertSame({ gain, gammaRe, gammaIm }: SweepResult, bytes: Buffer): void {
  const theirs = new Float64Array(bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength));
  const ours = [...gain, ...gammaRe, ...gammaIm];
  const differs = ours.findIndex((value, k) => !(Math.abs(value - theirs[k]!) <= 1e-9));
  if (differs >= 0) throw new Error(`sweep: ${ours[differs]!} here and ${theirs[differs]!} in C at ${differs}`);
}
