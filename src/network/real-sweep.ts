import { block, kernelOf, together, type VariedEnds } from './real-kernel.ts';
import type { PreparedReal } from './real-steps.ts';

export { prepareReal, type PreparedReal } from './real-steps.ts';

/** Many networks of one ladder, each with part values and ends of its own; arrays of `count`. */
export interface Draws {
  readonly count: number;
  /** One an arm, source side first: its value over the nominal one, > 0. */
  readonly scale: readonly Float64Array[];
  /** R becomes R·(1 + deviation), X becomes X + deviation·|Z|, the same at every frequency; null: as stated. */
  readonly loadR: Float64Array | null;
  readonly loadX: Float64Array | null;
  readonly sourceR: Float64Array | null;
  readonly sourceX: Float64Array | null;
}

/** Addresses: one frequency's numbers, the networks' columns, their worst, and where the worst ends. */
type Run = (numbers: number, columns: number, worst: number, end: number) => void;

const bytes = 8;
const page = 65_536;
/** All kernels work in one memory, filled anew for each call. */
const memory = new WebAssembly.Memory({ initial: 1 });
/** One for each kind of ladder met. */
const kernels = new Map<string, Run>();

/**
 * Raises `worst` to the largest |Γ|² that each network has at any of the prepared frequencies; what it holds already
 * counts too, so that several load states can share it.
 *
 * @param worst as many as the draws; 0 to begin with
 */
export function worstInto(prepared: PreparedReal, draws: Draws, worst: Float64Array): void {
  raise(prepared, 0, prepared.frequencyHz.length, draws, worst);
}

/** |Γ|² of every network at the prepared frequency `k`, into `out`. */
export function reflectionAt(prepared: PreparedReal, k: number, draws: Draws, out: Float64Array): void {
  out.fill(0);
  raise(prepared, k, k + 1, draws, out);
}

function raise(prepared: PreparedReal, first: number, last: number, draws: Draws, worst: Float64Array): void {
  const { numbers, frequencyHz } = prepared;
  const varied = {
    load: draws.loadR !== null || draws.loadX !== null,
    source: draws.sourceR !== null || draws.sourceX !== null,
  };
  const run = runOf(prepared, varied);
  const width = numbers.length / frequencyHz.length;
  const columns = columnsOf(prepared, draws);
  // In memory: a block of the worst, a block of each column, the numbers.
  const columnsAt = block * bytes;
  const numbersAt = columnsAt + columns.length * block * bytes;
  const size = numbersAt + numbers.length * bytes;
  if (size > memory.buffer.byteLength) memory.grow(Math.ceil((size - memory.buffer.byteLength) / page));
  const view = new Float64Array(memory.buffer);
  view.set(numbers, numbersAt / bytes);
  for (let from = 0; from < draws.count; from += block) {
    const length = Math.min(draws.count - from, block);
    view.fill(0, 0, block);
    view.set(worst.subarray(from, from + length));
    columns.forEach((column, k) => column(view, (k + 1) * block, from, length));
    for (let k = first; k < last; k += 1) run(numbersAt + k * width * bytes, columnsAt, 0, length * bytes);
    worst.set(view.subarray(0, length), from);
  }
}

/** Puts a stretch of one column into memory. */
type Column = (view: Float64Array, at: number, from: number, length: number) => void;

function columnsOf({ inverse }: PreparedReal, { scale, loadR, loadX, sourceR, sourceX }: Draws): Column[] {
  const scales = inverse.map((inverted, arm): Column => {
    const factors = scale[arm]!;
    return (view, at, from, length) => {
      for (let d = 0; d < length; d += 1) view[at + d] = inverted ? 1 / factors[from + d]! : factors[from + d]!;
      // A round that isn't full is filled up with any network.
      view.fill(view[at]!, at + length, at + Math.ceil(length / together) * together);
    };
  });
  const deviations = [loadR, loadX, sourceR, sourceX].map((values): Column => (view, at, from, length) => {
    view.fill(0, at, at + block);
    if (values !== null) view.set(values.subarray(from, from + length), at);
  });
  return [...scales, ...deviations];
}

/** @throws WebAssembly.CompileError where the host allows no code of this kind, or knows no SIMD */
function runOf(prepared: PreparedReal, varied: VariedEnds): Run {
  const { steps, inverse, aim, reactiveSource } = prepared;
  const key = JSON.stringify([steps, inverse.length, aim, reactiveSource, varied]);
  let run = kernels.get(key);
  if (run === undefined) {
    const module = new WebAssembly.Module(kernelOf(prepared, varied));
    run = new WebAssembly.Instance(module, { host: { memory } }).exports['run'] as Run;
    kernels.set(key, run);
  }
  return run;
}
