import type { Dossier, Option, StateFigures } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { schematicThumbnail } from '../../figures/schematic-thumbnail.ts';
import { returnLossDb } from '../../network/figures-of-merit.ts';
import { formatFixed, formatQuantity } from '../../quantity/format.ts';
import { plain, type Cell, type Column, type Paragraph, type Row } from '../page/block.ts';
import type { DesignRecord } from '../../record/design-record.ts';
import { methodNames } from './methods.ts';
import { mostStressed, orderWords, percent, returnLossName } from './real-words.ts';
import { attenuation, partsOf, reasonsOf, sentence } from './words.ts';

/** The columns of an option's figures, with real parts or without. */
export const optionColumns = (record: DesignRecord): readonly Column[] =>
  record.build === null ? exactColumns : realColumns(record);

const exactColumns: readonly Column[] = [
  { title: 'No.', share: 15 },
  { title: 'Network, source on the left', share: 150 },
  { title: 'Half-power band', share: 100 },
  { title: 'Worst return\u00a0loss', share: 48, align: 'end' },
  { title: 'Loss at stated\u00a0Q', share: 42, align: 'end' },
  { title: 'Attenuation at\u00a02f₀', share: 48, align: 'end' },
  { title: 'Attenuation at\u00a03f₀', share: 48, align: 'end' },
];

const realColumns = (record: DesignRecord): readonly Column[] => [
  { title: 'No.', share: 15 },
  { title: 'Network, source on the left', share: 140 },
  { title: 'Half-power band', share: 100 },
  { title: 'Parts', share: 28 },
  { title: returnLossName(record), share: 52, align: 'end' },
  { title: 'Loss', share: 40, align: 'end' },
  { title: 'Yield', share: 40, align: 'end' },
];

/** An option in full: its drawing, and under its figures the verdict, the states, DC and cautions. */
export function optionRow(option: Option, dossier: Dossier): Row {
  const { title, arms, dc, cautions, id } = option;
  // What the line on DC says needn't be said again as a caution.
  const further = cautions.filter((words) => !/^A (?:shunt inductor shorts|series capacitor blocks) DC\b/u.test(words));
  const below: Paragraph[] = [
    verdictLine(option, dossier),
    ...figuresBelow(option, dossier),
    plain(`DC: ${sentence(dc.words).replace(/^./u, (letter) => letter.toLowerCase())}`, 'small'),
    ...(further.length === 0
      ? []
      : [
          { spans: [{ text: `Cautions: ${further.map(sentence).join(' ')}`, tone: 'muted' }], style: 'small' } as const,
        ]),
  ];
  return {
    cells: [
      [plain(numberOf(option, dossier), 'small')],
      [
        { spans: [{ text: title, bold: true }], style: 'small' },
        { kind: 'picture', figure: schematicThumbnail(arms), scale: 0.9 },
        plain(partsOf(option), 'small'),
        ...(dossier.record.method === 'all' ? [plain(`Method: ${methodNames[option.method]}`, 'small')] : []),
      ],
      ...figures(option, dossier),
    ],
    below: { from: 2, paragraphs: below },
    marked: id === dossier.chosen,
  };
}

/** One of many: name, values, figures and verdict, without a drawing. */
export function compactRow(option: Option, dossier: Dossier): Row {
  const values = plain(partsOf(option), 'small');
  // Beside two lines of figures there is room for a few.
  const beside = dossier.record.build !== null && option.arms.length <= 3;
  return {
    cells: [
      [plain(numberOf(option, dossier), 'small')],
      [{ spans: [{ text: option.title, bold: true }], style: 'small' }, ...(beside ? [values] : [])],
      ...figures(option, dossier),
    ],
    below: {
      from: 1,
      paragraphs: [...(beside ? [] : [values]), verdictLine(option, dossier), ...figuresBelow(option, dossier)],
    },
    marked: option.id === dossier.chosen,
  };
}

const numberOf = ({ id }: Option, { options }: Dossier): string =>
  String(options.findIndex((option) => option.id === id) + 1);

const figures = (option: Option, { record }: Dossier): readonly Cell[] =>
  record.build === null ? exactFigures(option) : bothFigures(option);

function exactFigures({ halfPower, worstReturnLossDb, lossDb, harmonicDb }: Option): readonly Cell[] {
  return [
    halfPower.words,
    worstReturnLossDb === null ? 'no band' : returnLossWords(worstReturnLossDb),
    `${formatFixed(lossDb, 2)} dB`,
    harmonic(harmonicDb, 2),
    harmonic(harmonicDb, 3),
  ].map((words) => [plain(words, 'small')]);
}

/** Figures of exact values over those of real parts. */
function bothFigures({ halfPower, worstReturnLossDb, reflection, lossDb, built }: Option): readonly Cell[] {
  const pairs = [
    ['exact', 'real'],
    [
      returnLossWords(worstReturnLossDb ?? returnLossDb(reflection ** 2)),
      built === null ? '–' : returnLossWords(built.worstReturnLossDb),
    ],
    [`${formatFixed(lossDb, 2)} dB`, built === null ? '–' : `${formatFixed(built.lossDb, 2)} dB`],
    ['–', built === null || built.yield === null ? '–' : percent(built.yield.value)],
  ];
  return [[plain(halfPower.words, 'small')], ...pairs.map((lines) => lines.map((line) => plain(line, 'small')))];
}

function harmonic(harmonicDb: Option['harmonicDb'], order: 2 | 3): string {
  const found = harmonicDb.find((entry) => entry.order === order);
  return found === undefined ? '–' : attenuation(found.attenuationDb);
}

function verdictLine(option: Option, { chosen, proposed }: Dossier): Paragraph {
  const standing = [option.id === chosen ? 'chosen' : '', option.id === proposed ? 'proposed' : ''];
  const said = standing.filter((word) => word !== '').join(', ');
  return {
    spans: [
      { text: `${option.meets ? 'Meets' : 'Falls short'}${said === '' ? '' : ` (${said})`}: `, bold: true },
      { text: reasonsOf(option) },
    ],
    style: 'small',
  };
}

/** What is ordered and bears most; each load state's return loss; how far a fitted network stays below the ceiling. */
function figuresBelow(option: Option, { ceiling, record }: Dossier): readonly Paragraph[] {
  const { states, worstState, method, ceilingGapDb, harmonicDb } = option;
  const lines: string[] = [];
  if (record.build !== null) {
    const attenuated = `Attenuation ${harmonic(harmonicDb, 2)} at 2f₀, ${harmonic(harmonicDb, 3)} at 3f₀ (exact values).`;
    lines.push(...realLines(option), attenuated);
  }
  if (states.length > 1) {
    const each = states.map((state) => stateWords(state) + (state.name === worstState ? ', governs' : ''));
    lines.push(`By load state${record.build === null ? '' : ', exact values'}: ${each.join('; ')}.`);
  }
  if (method === 'fitted' && ceiling !== null && ceilingGapDb !== null) {
    const name = ceiling.estimate ? 'estimated ceiling' : 'ceiling';
    const top = returnLossDb(ceiling.bestReflection ** 2);
    const gap = `${formatFixed(Math.abs(ceilingGapDb), 2)} dB ${ceilingGapDb < 0 ? 'above' : 'below'}`;
    lines.push(`${top > 100 ? 'Far below' : gap} the ${name} (${returnLossWords(top)}).`);
  }
  return lines.map((line) => plain(line, 'small'));
}

function realLines({ built }: Option): string[] {
  if (built === null) return ['Real parts: not worked out.'];
  const stressed = mostStressed(built);
  const ordered = built.parts.length === 0 ? '' : `To order: ${orderWords(built)}.`;
  return [`${ordered}${stressed === null ? '' : ` Most stressed: ${stressed}.`}`].filter((line) => line !== '');
}

function stateWords({ name, worstReturnLossDb, worstAtHz, reflection }: StateFigures): string {
  if (worstReturnLossDb === null) return `${name} ${returnLossWords(returnLossDb(reflection ** 2))}`;
  const at = worstAtHz === null ? '' : ` at ${formatQuantity(worstAtHz, 'Hz', 5)}`;
  return `${name} ${returnLossWords(worstReturnLossDb)}${at}`;
}
