import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { drawsOf, type VariedPart } from '../../src/evidence/spread.ts';
import type { RealLadder } from '../../src/network/real-arm.ts';
import { prepareReal, worstInto, type PreparedReal } from '../../src/network/real-sweep.ts';
import { endsOver } from '../../src/network/sweep.ts';
import { logGrid } from '../../src/network/worst-in-band.ts';
import type { Figure } from './figure.ts';
import { median } from './timing.ts';

const networks = 100_000;
const points = 101;
const turns = 5;
const seed = 20_260_101;
const tolerance = 0.05;
/** Networks that NumPy has at a time: of 50 to 10 000, with those it is fastest. */
const chunk = 500;
const overC = 1.5;
const overNumpy = 10;
const noEnds = { source: 0, load: 0 };
const source = { r: 50, x: 0, behaviour: 'constant' } as const;
const load = { r: 9.4, x: -61, behaviour: 'constant' } as const;
const f0 = 151.25e6;

/** Three sections, inductors of Q 80 and capacitors of Q 300. */
function ladder(seriesH: number, strayF: number): RealLadder {
  const common = { qSlope: 0, parallelF: 0 } as const;
  const arms = [30e-12, 20e-12, 10e-12].flatMap((farad, k) => [
    { arm: 'shunt' as const, part: 'capacitor' as const, value: farad, q: 300, seriesH, ...common },
    { arm: 'series' as const, part: 'inductor' as const, value: (30 + 20 * k) * 1e-9, q: 80, seriesH: 0, ...common },
  ]);
  return { arms, strayF };
}

const cases = [
  { name: 'ideal but for Q', real: ladder(0, 0) },
  { name: 'with strays and leads', real: ladder(0.5e-9, 0.3e-12) },
];

/**
 * Time of 100 000 networks of six parts at 101 frequencies on one core, draws included, against the same loop in C (gcc
 * -O2, no vectorising) and against vectorised NumPy; taken in turns in one run, processor time, medians.
 */
export function benchMonteCarlo(): readonly Figure[] {
  const folder = mkdtempSync(join(tmpdir(), 'ferrule-bench-'));
  try {
    return cases.flatMap((each) => figuresOf(each.name, each.real, folder));
  } finally {
    rmSync(folder, { recursive: true });
  }
}

function figuresOf(name: string, real: RealLadder, folder: string): Figure[] {
  const ends = endsOver(source, load, f0, logGrid(140e6, 163e6, points));
  const prepared = prepareReal(real, ends, f0, 'conjugate');
  const parts = real.arms.map((_, armIndex): VariedPart => {
    return { designator: String(armIndex), armIndex, tolerance, weight: 1, adds: true };
  });
  const work = (worst: Float64Array): void => {
    for (let from = 0; from < worst.length; from += 4096) {
      const count = Math.min(4096, worst.length - from);
      const draws = drawsOf(parts, real.arms.length, noEnds, 'uniform', seed, from, count);
      worstInto(prepared, draws, worst.subarray(from, from + count));
    }
  };
  const ours = (worst: Float64Array): number => {
    // All warm up at each turn: after a turn of another the caches and the clock rate are not one's own.
    work(new Float64Array(networks / 5));
    const start = process.cpuUsage();
    work(worst);
    return process.cpuUsage(start).user / 1e6;
  };
  const inC = programInC(prepared, real, folder);
  const inNumpy = programInNumpy(real, ends.frequencyHz, folder);
  const found = new Float64Array(networks);
  ours(found);
  // In turns, so that what else the machine does is shared out evenly.
  const times = Array.from({ length: turns }, () => {
    return { here: ours(new Float64Array(networks)), c: inC?.(), numpy: inNumpy?.() };
  });
  const here = median(times.map((time) => time.here));
  const title = `${networks} networks, ${name}`;
  const against = (other: 'c' | 'numpy', what: string, missing: string, budget: string): Figure => {
    const pairs = times.flatMap((time) => (time[other] === undefined ? [] : [[time.here, time[other]] as const]));
    const named = { name: `${title}, against ${what}`, budget };
    if (pairs.length === 0) return { ...named, measured: missing, within: null };
    const theirs = median(pairs.map(([, time]) => time));
    const ratio = median(pairs.map(([ours, time]) => (other === 'c' ? ours / time : time / ours)));
    const measured = `${ms(here)}, ${what} ${ms(theirs)}: ${ratio.toFixed(2)}`;
    return { ...named, measured, within: other === 'c' ? ratio <= overC : ratio >= overNumpy };
  };
  if (inC !== null) assertSame(found, resultOf(folder, 'c'), 1e-11);
  if (inNumpy !== null) assertAlike(found, resultOf(folder, 'numpy'));
  return [
    against('c', 'C', 'no gcc on this machine', `ratio ≤ ${overC}`),
    against('numpy', 'NumPy', 'no NumPy on this machine', `ratio ≥ ${overNumpy}`),
  ];
}

const ms = (seconds: number): string => `${(seconds * 1000).toFixed(0)} ms`;

/** Its processor time, s; null without a compiler. */
function programInC(
  { steps, inverse, numbers }: PreparedReal,
  real: RealLadder,
  folder: string,
): (() => number) | null {
  if (spawnSync('gcc', ['--version']).status !== 0) return null;
  const program = join(folder, 'monte-carlo');
  const text = new URL('monte-carlo.c', import.meta.url).pathname;
  execFileSync('gcc', ['-O2', '-fno-tree-vectorize', '-o', program, text]);
  const head = Int32Array.of(networks, points, inverse.length, steps.length, seed, 0);
  const kinds = steps.flatMap(({ arm, form, real, slot }) => {
    const kind = form === 'reciprocal' ? 4 : real ? 0 : 2;
    return [kind + (arm === 'series' ? 0 : 1), slot ?? inverse.length];
  });
  const doubles = [real.arms.map(() => tolerance), inverse.map(Number), kinds].map((row) => Float64Array.from(row));
  const file = join(folder, 'c-case');
  writeFileSync(file, Buffer.concat([head, ...doubles, numbers].map((a) => Buffer.from(a.buffer))));
  return () => Number(execFileSync(program, [file, join(folder, 'c-result')]).toString());
}

/** Its processor time, s; null without Python or NumPy. */
function programInNumpy(real: RealLadder, frequencyHz: Float64Array, folder: string): (() => number) | null {
  if (spawnSync('python3', ['-c', 'import numpy']).status !== 0) return null;
  const file = join(folder, 'numpy-case');
  const content = {
    ...{ networks, chunk, seed, frequencyHz: [...frequencyHz], strayF: real.strayF },
    ...{ source: [source.r, source.x], load: [load.r, load.x] },
    arms: real.arms.map((arm) => ({ ...arm, tolerance })),
  };
  writeFileSync(file, JSON.stringify(content));
  const program = new URL('monte-carlo.py', import.meta.url).pathname;
  return () => Number(execFileSync('python3', [program, file, join(folder, 'numpy-result')]).toString());
}

function resultOf(folder: string, of: 'c' | 'numpy'): Float64Array {
  const bytes = readFileSync(join(folder, `${of}-result`));
  return new Float64Array(bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength));
}

/** Both must have done the same work. */
function assertSame(ours: Float64Array, theirs: Float64Array, within: number): void {
  const differs = ours.findIndex((value, k) => !(Math.abs(value - theirs[k]!) <= within));
  if (differs >= 0) throw new Error(`networks: ${ours[differs]!} here and ${theirs[differs]!} there at ${differs}`);
}

/** NumPy draws other networks; of so many the mean and the largest are alike. */
function assertAlike(ours: Float64Array, theirs: Float64Array): void {
  const mean = (values: Float64Array): number => values.reduce((sum, value) => sum + value, 0) / values.length;
  const [here, there] = [mean(ours), mean(theirs)];
  if (!(Math.abs(here / there - 1) < 0.01)) throw new Error(`networks: a mean of ${here} here and ${there} in NumPy`);
}
