/**
 * Circuit models of a termination. `values` in the order of `symbols`, SI units (Ω, H, F; `antenna`: Ω, Hz, 1):
 *
 * - `rc-series`, `rl-series`, `rlc-series`: the parts in series
 * - `rc-parallel`, `rl-parallel`, `rlc-parallel`: the parts in parallel
 * - `crystal`: R, L and C in series, with C0 across them
 * - `antenna`: near its resonance, R in series with the L and C that resonate at f0 with Q = ω0·L/R
 */
export const circuitModels = {
  'rc-series': { symbols: ['R', 'C'], units: ['Ω', 'F'] },
  'rl-series': { symbols: ['R', 'L'], units: ['Ω', 'H'] },
  'rlc-series': { symbols: ['R', 'L', 'C'], units: ['Ω', 'H', 'F'] },
  'rc-parallel': { symbols: ['R', 'C'], units: ['Ω', 'F'] },
  'rl-parallel': { symbols: ['R', 'L'], units: ['Ω', 'H'] },
  'rlc-parallel': { symbols: ['R', 'L', 'C'], units: ['Ω', 'H', 'F'] },
  crystal: { symbols: ['R', 'L', 'C', 'C0'], units: ['Ω', 'H', 'F', 'F'] },
  antenna: { symbols: ['R', 'f0', 'Q'], units: ['Ω', 'Hz', ''] },
} as const;

export type CircuitModelName = keyof typeof circuitModels;

export interface CircuitModel {
  readonly model: CircuitModelName;
  /** Each above zero. */
  readonly values: readonly number[];
}

/** The simple parts of a model: R with L and C (absent: null) in series or in parallel, and C0 across a series. */
export interface ModelParts {
  readonly arrangement: 'series' | 'parallel';
  readonly r: number;
  readonly l: number | null;
  readonly c: number | null;
  readonly c0: number | null;
}

export function partsOf({ model, values }: CircuitModel): ModelParts {
  const [a = 0, b = 0, c = 0, d = 0] = values;
  const arrangement = model.endsWith('parallel') ? 'parallel' : 'series';
  switch (model) {
    case 'rc-series':
    case 'rc-parallel':
      return { arrangement, r: a, l: null, c: b, c0: null };
    case 'rl-series':
    case 'rl-parallel':
      return { arrangement, r: a, l: b, c: null, c0: null };
    case 'rlc-series':
    case 'rlc-parallel':
      return { arrangement, r: a, l: b, c, c0: null };
    case 'crystal':
      return { arrangement, r: a, l: b, c, c0: d };
    case 'antenna': {
      const omega = 2 * Math.PI * b;
      const l = (c * a) / omega;
      return { arrangement, r: a, l, c: 1 / (omega * omega * l), c0: null };
    }
  }
}
