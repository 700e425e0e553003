import type { Method } from '../../src/record/design-record.ts';
import type { Choice } from './choice.ts';

interface MethodWords {
  readonly words: string;
  /** Why one would want it, in a line. */
  readonly why: string;
}

/** What each method is called, and what it is for. */
export const methodWords: Record<Method, MethodWords> = {
  'two-element': { words: 'two elements', why: 'Fewest parts; the bandwidth follows from the terminations.' },
  'resistive-pair': { words: 'two elements, Q method', why: 'Fewest parts; Q follows from the two resistances.' },
  pi: {
    words: 'Pi, of a chosen Q',
    why: 'Three parts: a narrower band, more attenuation of harmonics, values that can be bought.',
  },
  tee: {
    words: 'T, of a chosen Q',
    why: 'Three parts: a narrower band, more attenuation of harmonics, values that can be bought.',
  },
  cascade: { words: 'sections in cascade', why: 'Sections of equal Q: each one more widens the band.' },
  'equal-ripple': {
    words: 'equal ripple',
    why: 'The best worst case over a band between two resistances, for its number of parts.',
  },
  fitted: {
    words: 'fitted to the band',
    why: 'Searches shape and values over the band and every load state. Takes seconds.',
  },
  all: {
    words: 'every method and size',
    why: 'To find the least that holds the requirement. Takes seconds.',
  },
};

/** Methods of each sheet, named after its first one. */
const methodsOf: Partial<Record<Method, readonly Method[]>> = {
  'two-element': ['two-element', 'pi', 'tee', 'fitted', 'all'],
  'resistive-pair': ['resistive-pair', 'pi', 'tee'],
  cascade: ['cascade', 'equal-ripple', 'fitted', 'all'],
};

/** Whether a sheet serves a method. */
export const serves = (sheet: Method, method: string | undefined): method is Method =>
  methodsOf[sheet]?.some((each) => each === method) ?? false;

const choicesOf = Object.fromEntries(
  Object.entries(methodsOf).map(([sheet, methods]) => [
    sheet,
    methods.map((value) => ({ value, words: methodWords[value].words })),
  ]),
);

/** The same array every time, so that nothing is drawn anew for it. */
export const methodChoices = (sheet: Method): readonly Choice[] => choicesOf[sheet] ?? [];
