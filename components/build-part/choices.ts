import { distributions } from '../../src/evidence/distribution.ts';
import { origins, type Origin } from '../../src/parts/origin.ts';
import type { Choice } from '../base/choice.ts';

const words: Partial<Record<Origin, string>> = {
  exact: 'exact values',
  stock: 'the stock list',
  wound: 'wound by hand',
};

const choiceOf = (value: Origin): Choice => ({ value, words: words[value] ?? `series ${value}` });

/** What each kind of part can be taken from; only coils are wound by hand. */
export const originChoices = {
  inductor: origins.map(choiceOf),
  capacitor: origins.filter((origin) => origin !== 'wound').map(choiceOf),
};

const distributionWords = {
  uniform: 'uniform within the tolerance',
  triangular: 'triangular within the tolerance',
  normal: 'normal, tolerance at 3σ, cut off there',
} as const;

export const distributionChoices: readonly Choice[] = distributions.map((value) => ({
  value,
  words: distributionWords[value],
}));

export const pairChoices: readonly Choice[] = [
  { value: 'no', words: 'one part for each arm' },
  { value: 'yes', words: 'two where one can’t reach it' },
];
