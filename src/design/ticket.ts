import type { Dossier, Option } from '../dossier.ts';
import { returnLossDb } from '../network/figures-of-merit.ts';
import { formatFixed, formatQuantity, formatRead } from '../quantity/format.ts';
import { fileName } from '../record/file-name.ts';
import { alignedRows } from './aligned-rows.ts';
import { markdownCell } from './markdown.ts';
import { returnLossWords, yieldWords } from './words.ts';

type Fact = readonly [name: string, value: string];

/** A short account of a design to paste into a change ticket, as plain text of lines below 100 letters. */
export function ticketText(dossier: Dossier): string {
  return (
    alignedRows([[titleOf(dossier)], [documentOf(dossier)]], [98]) + '\n' + alignedRows(factsOf(dossier), [22, 74])
  );
}

/** The same in Markdown. */
export function ticketMarkdown(dossier: Dossier): string {
  const rows = factsOf(dossier).map(([name, value]) => `| ${name} | ${markdownCell(value)} |`);
  return [
    `**${markdownCell(titleOf(dossier))}**`,
    '',
    markdownCell(documentOf(dossier)),
    '',
    '| Subject | Figure |',
    '| --- | --- |',
    ...rows,
    '',
  ].join('\n');
}

const titleOf = ({ record }: Dossier): string => record.identity.title.trim() || 'Untitled matching network';

function documentOf({ record: { identity, signOff } }: Dossier): string {
  const number = identity.number.trim() || 'unnumbered';
  const ticket = identity.ticket.trim();
  return [
    number,
    `revision ${identity.revision}`,
    identity.date,
    signOff.state,
    ticket === '' ? '' : `ticket ${ticket}`,
  ]
    .filter((each) => each !== '')
    .join(', ');
}

function factsOf(dossier: Dossier): readonly Fact[] {
  const { record, digest, version } = dossier;
  const { frequencyHz, bandHz, returnLossDb: asked } = record.requirement;
  const option = dossier.options.find(({ id }) => id === dossier.chosen);
  return [
    ['Verdict', verdictOf(dossier, option)],
    ...(record.identity.change.trim() === '' ? [] : [['What changes', record.identity.change] as const]),
    ['Design frequency', formatRead(frequencyHz, 'Hz')],
    ...(bandHz === null
      ? []
      : [['Band', `${formatRead(bandHz.low, 'Hz')} to ${formatRead(bandHz.high, 'Hz')}`] as const]),
    ['Return loss required', asked === null ? 'none' : `at least ${formatRead(asked, 'dB')}`],
    ...(option === undefined ? [] : ofNetwork(option)),
    ...record.deviations.map(({ subject, reason }) => [`Deviation, ${subject}`, reason] as const),
    ['Record’s SHA-256', digest],
    ['Report', fileName(record, 'pdf')],
    ['Computed with', `Ferrule ${version}`],
  ];
}

function verdictOf({ evidence }: Dossier, option: Option | undefined): string {
  if (option === undefined) return 'no network of the kind asked for matches these terminations';
  const proof = evidence?.pass === false ? '; verification fails' : '';
  return `${option.meets ? 'meets the requirement' : 'falls short of the requirement'}: ${option.reasons.join('; ')}${proof}`;
}

function ofNetwork({ title, built, ...option }: Option): readonly Fact[] {
  const worst = option.worstReturnLossDb ?? returnLossDb(option.reflection ** 2);
  if (built === null) {
    return [
      ['Return loss at worst', `${returnLossWords(worst)} with exact parts`],
      ['Network', title],
      ['Parts', exactParts(option) || 'none'],
      ['Loss', `${formatFixed(option.lossDb, 2)} dB for the stated Q`],
    ];
  }
  const { parts, worstReturnLossDb, lossDb, yield: found, stress } = built;
  return [
    [
      'Return loss at worst',
      `${returnLossWords(worstReturnLossDb)}; with exact, ideal parts ${returnLossWords(worst)}`,
    ],
    ['Network', title],
    [
      'Parts',
      parts.map(({ designator, part, value, from }) => `${designator} ${written(part, value)} (${from})`).join(', ') ||
        'none',
    ],
    ...(found === null ? [] : [['Yield', yieldWords(found)] as const]),
    ['Loss', `${formatFixed(lossDb, 2)} dB`],
    ...(stress === null ? [] : [['Stress', stress.words] as const]),
  ];
}

const exactParts = ({ arms, designators }: Pick<Option, 'arms' | 'designators'>): string =>
  arms
    .map(({ part, value }, k) => `${designators[k] ?? ''} ${formatQuantity(value, part === 'inductor' ? 'H' : 'F')}`)
    .join(', ');

/** A part on sale as it is ordered, one that is exact or wound to as many digits as it can be held. */
const written = (part: 'inductor' | 'capacitor', value: number): string =>
  formatRead(Number(value.toPrecision(4)), part === 'inductor' ? 'H' : 'F');
