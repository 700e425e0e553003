import type { Dossier } from '../../dossier.ts';
import { formatRead } from '../../quantity/format.ts';
import type { DesignRecord } from '../../record/design-record.ts';
import { plain, type Block } from '../page/block.ts';
import { methodAsked } from './methods.ts';
import { parts } from './parts.ts';
import { realRequired } from './real-required.ts';
import { notStated, spanRead } from './words.ts';

/** What was asked, as the record holds it. */
export function requirement({ record }: Dossier): readonly Block[] {
  const { frequencyHz, bandHz, returnLossDb, blockDc, keepDc, inductorH, capacitorF, powerW } = record.requirement;
  const rows: readonly (readonly [string, string])[] = [
    ['Design frequency f₀', formatRead(frequencyHz, 'Hz')],
    ['Band to hold', bandHz === null ? 'none: the design frequency alone' : spanRead(bandHz, 'Hz')],
    [
      'Return loss',
      returnLossDb === null ? 'not required' : `at least ${formatRead(returnLossDb, 'dB')}${everywhere(record)}`,
    ],
    [
      'Aim',
      record.aim === 'conjugate'
        ? 'Conjugate: looking into the network from the source one sees ZS*'
        : 'Reflectionless: looking into the network from the source one sees ZS',
    ],
    ['Method', methodAsked(record)],
    ['DC between source and load', blockDc ? 'must be blocked' : 'need not be blocked'],
    ['DC to be kept', keepDc === 'none' ? 'none' : `at ${ends[keepDc]}: the network must not short it to ground`],
    ['Practicable parts', `inductors ${spanRead(inductorH, 'H')}, capacitors ${spanRead(capacitorF, 'F')}`],
    [record.build === null ? 'Q of parts, for the loss alone' : 'Q of parts at f₀', qOf(record)],
    ['Available power', powerW === null ? notStated : formatRead(powerW, 'W')],
    ...realRequired(record.build),
  ];
  return [
    { kind: 'heading', number: parts.requirement, text: 'Requirement' },
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

const everywhere = ({ loads }: DesignRecord): string => (loads.length > 1 ? ' in every load state' : '');

const qOf = ({ partQ }: DesignRecord): string =>
  `inductors ${String(partQ.inductor)}, capacitors ${String(partQ.capacitor)}`;

/** Numbered, so that a reviewer can name one. */
export function assumptions({ assumptions: lines }: Dossier): readonly Block[] {
  return [
    { kind: 'heading', number: parts.assumptions, text: 'Assumptions' },
    { kind: 'list', entries: lines.map((line, k) => ({ mark: `A${String(k + 1)}`, paragraph: plain(line) })) },
  ];
}
