import type { Option } from '../../src/dossier.ts';
import type { Method, Required } from '../../src/record/design-record.ts';
import { fieldNames, pathOf, type FieldName } from '../../src/record/fields.ts';
import { count } from '../base/words.ts';
import type { Verdict } from '../verdict-mark/verdict-mark.ts';
import type { Settled } from './settle.ts';

export interface Judged {
  readonly verdict: Verdict;
  /** What the verdict is, in a word or two. */
  readonly words: string;
}

/** A part of the document. Parts are numbered by their place in the list. */
export interface Part {
  readonly name:
    | 'Given'
    | 'Ceiling'
    | 'Options'
    | 'Network'
    | 'Response'
    | 'Evidence'
    | 'Build'
    | 'Finished board'
    | 'Record and report';
  /** Numbers in the basis of calculation. */
  readonly basis: (method: string | undefined) => readonly string[];
  readonly judge: (state: Settled) => Judged;
  /** Its fields; the first part has all those that no other has. */
  readonly fields: readonly FieldName[];
}

const chosenOf = ({ dossier }: Settled): Option | undefined => dossier?.options.find(({ id }) => id === dossier.chosen);
const always =
  (numbers: readonly string[]): Part['basis'] =>
  () =>
    numbers;
const optionsBasis: Readonly<Record<Method, readonly string[]>> = {
  'two-element': ['B3', 'B4', 'B5'],
  'resistive-pair': ['B6', 'B5'],
  pi: ['B22', 'B5'],
  tee: ['B22', 'B5'],
  cascade: ['B7', 'B5'],
  'equal-ripple': ['B23', 'B5'],
  fitted: ['B24', 'B5'],
  all: ['B3', 'B4', 'B7', 'B22', 'B23', 'B24', 'B5'],
};
const isMethod = (text: string | undefined): text is Method => text !== undefined && Object.hasOwn(optionsBasis, text);
const unassessed: Judged = { verdict: 'not assessed', words: 'not assessed' };
const judged = (good: boolean, exact = false): Judged => {
  const verdict = good ? 'meets' : 'falls short';
  return { verdict, words: exact ? `${verdict}, exact values` : verdict };
};

/** Real parts are asked for, and this network isn't worked out with them yet. */
const isExact = ({ dossier }: Settled, option: Option): boolean =>
  dossier !== null && dossier.record.build !== null && option.built === null;

const optionsFields: readonly FieldName[] = [
  'method',
  'sections',
  'q',
  'elements',
  'fit-form',
  'shunt-inductor',
  'fit-seed',
  'steps',
  'choice',
  'reason',
];
const responseFields: readonly FieldName[] = ['sweep'];
const buildFields: readonly FieldName[] = [
  ...fieldNames.filter((name) => pathOf[name].startsWith('build.')),
  'q-inductor',
  'q-capacitor',
  'set',
];
const recordFields = fieldNames.filter((name) => name === 'deviations' || /^(identity|signOff)\./u.test(pathOf[name]));
const elsewhere = [...optionsFields, ...responseFields, ...buildFields, ...recordFields];

/** What is asked of real parts. */
const ofParts: readonly Required[] = ['return loss', 'yield', 'stress'];

/** The verdict on a part: its own, unless a text in it can't be read or what it shows is of earlier texts. */
export function judge(part: Part, state: Settled): Judged {
  const wrong = part.fields.filter((name) => state.problems[name] !== undefined).length;
  if (wrong > 0) {
    return {
      verdict: 'falls short',
      words: wrong === 1 ? '1 entry to correct' : `${String(wrong)} entries to correct`,
    };
  }
  return state.stale && part.name !== 'Given' ? unassessed : part.judge(state);
}

export const parts: readonly Part[] = [
  {
    name: 'Given',
    basis: always(['B1', 'B2', 'B18', 'B19']),
    fields: fieldNames.filter((name) => !elsewhere.includes(name)),
    judge: () => ({ verdict: 'meets', words: 'can be read' }),
  },
  {
    name: 'Ceiling',
    basis: always(['B20', 'B21']),
    fields: [],
    judge: ({ dossier }) => {
      const ceiling = dossier?.ceiling;
      if (!ceiling) return unassessed;
      const { verdict, estimate } = ceiling;
      if (verdict === 'not assessed') return unassessed;
      return {
        verdict: verdict === 'out of reach' ? 'falls short' : 'meets',
        words: estimate ? `${verdict}, by estimate` : verdict,
      };
    },
  },
  {
    name: 'Options',
    basis: (method) => (isMethod(method) ? optionsBasis[method] : []),
    fields: optionsFields,
    judge: (state) => {
      const { dossier } = state;
      if (dossier === null || dossier.options.length === 0) return unassessed;
      const meeting = dossier.options.filter(({ meets }) => meets).length;
      const words = `${String(meeting)} of ${count(dossier.options.length, 'network')}`;
      const so = dossier.options.some((option) => isExact(state, option)) ? ' so far' : '';
      return meeting > 0
        ? { verdict: 'meets', words: `${words} meet${meeting === 1 ? 's' : ''}${so}` }
        : { verdict: 'falls short', words: `none meets${so}` };
    },
  },
  {
    name: 'Network',
    basis: always(['B8', 'B9', 'B25']),
    fields: [],
    judge: (state) => {
      const chosen = chosenOf(state);
      return chosen === undefined ? unassessed : judged(chosen.meets, isExact(state, chosen));
    },
  },
  {
    name: 'Response',
    basis: always(['B10', 'B11', 'B12', 'B33']),
    fields: responseFields,
    judge: (state) => {
      const chosen = chosenOf(state);
      const check = chosen?.checks.find(({ subject }) => subject === 'return loss');
      return chosen === undefined || check === undefined
        ? unassessed
        : judged(check.verdict === 'meets', isExact(state, chosen));
    },
  },
  {
    name: 'Evidence',
    basis: always(['B14', 'B15', 'B16']),
    fields: [],
    judge: ({ dossier }) => (dossier?.evidence ? judged(dossier.evidence.pass) : unassessed),
  },
  {
    name: 'Build',
    basis: always(['B26', 'B27', 'B31', 'B32', 'B34', 'B35', 'B38']),
    fields: buildFields,
    judge: (state) => {
      const chosen = chosenOf(state);
      if (chosen === undefined || (state.dossier?.record.build ?? null) === null) return unassessed;
      if (chosen.built === null) {
        return state.realParts === 'at work' ? { verdict: 'not assessed', words: 'being worked out' } : unassessed;
      }
      const checks = chosen.checks.filter(({ subject }) => ofParts.includes(subject));
      return checks.length === 0 ? unassessed : judged(checks.every(({ verdict }) => verdict === 'meets'));
    },
  },
  {
    name: 'Finished board',
    basis: always(['B40']),
    fields: [],
    judge: ({ dossier, building }) => {
      if ((dossier?.record.asBuilt ?? null) === null) return { verdict: 'not assessed', words: 'not measured' };
      const verdict = dossier?.asBuilt?.verdict.verdict;
      if (verdict !== undefined) return { verdict, words: verdict };
      return building === null ? unassessed : { verdict: 'not assessed', words: 'being compared' };
    },
  },
  {
    name: 'Record and report',
    basis: always(['B17']),
    fields: recordFields,
    judge: ({ dossier }) => {
      const signOff = dossier?.record.signOff;
      const signed =
        signOff === undefined
          ? 0
          : [signOff.prepared, signOff.checked, signOff.approved].filter(({ name, date }) => name !== '' && date !== '')
              .length;
      if (signOff?.state === 'issued') return { verdict: 'meets', words: 'issued' };
      return signed === 3
        ? { verdict: 'meets', words: 'names and dates given' }
        : { verdict: 'not assessed', words: 'not signed off' };
    },
  },
];
