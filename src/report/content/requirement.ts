import type { Dossier } from '../../dossier.ts';
import { formatImpedanceRead, formatRead } from '../../quantity/format.ts';
import type { DesignRecord } from '../../record/design-record.ts';
import { plain, type Block } from '../page/block.ts';
import { notStated, spanRead } from './words.ts';

const methods: Record<DesignRecord['method'], string> = {
  'two-element': 'At most two parts between any two terminations',
  'resistive-pair': 'Resistive pair by the single-parameter Q method',
  cascade: 'Sections in cascade',
};

/** What was asked, as the record holds it. */
export function requirement({ record }: Dossier): readonly Block[] {
  const { frequencyHz, bandHz, returnLossDb, blockDc, keepDc, inductorH, capacitorF, powerW } = record.requirement;
  const rows: readonly (readonly [string, string])[] = [
    ['Design frequency f₀', formatRead(frequencyHz, 'Hz')],
    ['Band to hold', bandHz === null ? 'none: the design frequency alone' : spanRead(bandHz, 'Hz')],
    ['Return loss', returnLossDb === null ? 'not required' : `at least ${formatRead(returnLossDb, 'dB')}`],
    [
      'Aim',
      record.aim === 'conjugate'
        ? 'Conjugate: looking into the network from the source one sees ZS*'
        : 'Reflectionless: looking into the network from the source one sees ZS',
    ],
    ['Method', `${methods[record.method]}${record.method === 'cascade' ? sectionsAsked(record.sections) : ''}`],
    ['DC between source and load', blockDc ? 'must be blocked' : 'need not be blocked'],
    ['DC to be kept', keepDc === 'none' ? 'none' : `at ${ends[keepDc]}: the network must not short it to ground`],
    ['Practicable parts', `inductors ${spanRead(inductorH, 'H')}, capacitors ${spanRead(capacitorF, 'F')}`],
    ['Available power', powerW === null ? notStated : formatRead(powerW, 'W')],
  ];
  return [
    { kind: 'heading', number: 1, text: 'Requirement' },
    {
      kind: 'table',
      columns: [
        { title: 'Subject', share: 30 },
        { title: 'Required', share: 70 },
      ],
      rows: rows.map(([name, value]) => ({ cells: [[plain(name)], [plain(value)]] })),
    },
  ];
}

const ends = { source: 'the source', load: 'the load', both: 'both ends' } as const;

const sectionsAsked = (sections: DesignRecord['sections']): string =>
  sections === 'auto' ? ': the smallest number that holds the requirement' : `: ${String(sections)}, as asked`;

const behaviours = {
  constant: 'held constant',
  series: 'R in series with the L or C that X means at f₀',
  parallel: 'R in parallel with the L or C that X means at f₀',
} as const;

/** Both ends of the interface, and what they are taken to do away from the design frequency. */
export function terminations({ record }: Dossier): readonly Block[] {
  const f0 = formatRead(record.requirement.frequencyHz, 'Hz');
  return [
    { kind: 'heading', number: 2, text: 'Terminations' },
    {
      kind: 'table',
      columns: [
        { title: 'End', share: 30 },
        { title: `Impedance at ${f0}`, share: 26 },
        { title: 'Away from it', share: 44 },
      ],
      rows: (['source', 'load'] as const).map((end) => {
        const { r, x, behaviour } = record[end];
        const words = x === 0 ? 'the same at every frequency' : behaviours[behaviour];
        const name = end === 'source' ? 'Source, ZS' : 'Load, ZL';
        return { cells: [[plain(name)], [plain(formatImpedanceRead(r, x))], [plain(words)]] };
      }),
    },
  ];
}

/** Numbered, so that a reviewer can name one. */
export function assumptions({ assumptions: lines }: Dossier): readonly Block[] {
  return [
    { kind: 'heading', number: 3, text: 'Assumptions' },
    { kind: 'list', entries: lines.map((line, k) => ({ mark: `A${String(k + 1)}`, paragraph: plain(line) })) },
  ];
}
