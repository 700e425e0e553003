import type { Choice } from '../base/choice.ts';

export const sizes: readonly Choice[] = [
  { value: 'auto', words: 'every number, 2 to 8' },
  ...['2', '3', '4', '5', '6', '7', '8'].map((value) => ({ value, words: value })),
];

export const forms: readonly Choice[] = [
  { value: 'any', words: 'any' },
  { value: 'low-pass', words: 'low-pass' },
  { value: 'high-pass', words: 'high-pass' },
];

export const shuntInductors: readonly Choice[] = [
  { value: 'yes', words: 'allowed' },
  { value: 'no', words: 'none' },
];

/** Number of sections; of an equal-ripple ladder every number, as of a cascade, is computed anyway. */
export const numbers = (method: 'cascade' | 'equal-ripple'): readonly Choice[] => [
  { value: 'auto', words: method === 'cascade' ? 'the smallest that holds the band' : 'every number' },
  ...['1', '2', '3', '4', '5', '6'].map((value) => ({ value, words: value })),
];
