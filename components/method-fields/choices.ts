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

const counted = ['1', '2', '3', '4', '5', '6'].map((value) => ({ value, words: value }));

/** Numbers of sections; of an equal-ripple ladder the smallest isn't looked for, every one is listed. */
export const numbers: Readonly<Record<'cascade' | 'equal-ripple', readonly Choice[]>> = {
  cascade: [{ value: 'auto', words: 'the smallest that holds the band' }, ...counted],
  'equal-ripple': [{ value: 'auto', words: 'every number' }, ...counted],
};
