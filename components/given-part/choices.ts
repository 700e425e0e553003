import type { Choice } from '../base/choice.ts';

export const behaviours: readonly Choice[] = [
  { value: 'series', words: 'R in series with L or C' },
  { value: 'parallel', words: 'R in parallel with L or C' },
  { value: 'constant', words: 'held constant' },
];

export const aims: readonly Choice[] = [
  { value: 'conjugate', words: 'its conjugate (most power)' },
  { value: 'reflectionless', words: 'its own impedance (no reflection)' },
];

export const blocks: readonly Choice[] = [
  { value: 'no', words: 'may pass' },
  { value: 'yes', words: 'must be blocked' },
];

export const keeps: readonly Choice[] = [
  { value: 'none', words: 'none' },
  { value: 'source', words: 'at the source: not to be shorted' },
  { value: 'load', words: 'at the load: not to be shorted' },
  { value: 'both', words: 'at both: not to be shorted' },
];
