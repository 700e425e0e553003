import type { AsBuiltFigures, Dossier } from '../../dossier.ts';
import { attachedWords, causeWords, gamma, remedyWords, verdictWords } from '../../evidence/as-built-words.ts';
import { finishedBoardPlot } from '../../figures/finished-board-plot.ts';
import { chartSize } from '../../figures/chart-frame.ts';
import { frequencySpan, returnLossWords } from '../../quantity/figures-in-words.ts';
import { formatFixed, formatQuantity, formatRead } from '../../quantity/format.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { chosenBuilt } from './real-words.ts';
import { bandWords } from './real-response.ts';
import { orNotStated, sentence, spanRead } from './words.ts';

/** Spans and causes that are told one by one; what comes after them weighs less. */
const [mostSpans, mostCauses] = [12, 8];

const verdicts = {
  meets: 'The finished board meets the requirement',
  'falls short': 'The finished board falls short of the requirement',
  'not assessed': 'The finished board is not assessed against the requirement',
} as const;

/** What was measured on the finished board, against what was required and predicted, and why the two differ. */
export function finishedBoard(dossier: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.finishedBoard, text: 'Finished board' };
  const { asBuilt: figures, record } = dossier;
  if (record.asBuilt === null) return [heading, text('None was measured for this revision.')];
  const { measured } = record.asBuilt;
  if (figures === null) {
    return [heading, text(`${measured.name} was measured, and there is no network to hold it against.`)];
  }
  return [
    heading,
    {
      kind: 'text',
      paragraph: { spans: [{ text: headline(figures), bold: true }], style: 'lead' },
      bar: true,
      opens: true,
      keep: true,
    },
    ...verdictWords(figures.verdict).map((words): Block => ({
      kind: 'text',
      paragraph: plain(words),
      bar: true,
      keep: true,
    })),
    measurement(figures, record.asBuilt.note),
    ...plot(figures, dossier),
    ...outside(figures),
    ...causes(figures),
    ...remedy(figures),
  ];
}

/** For whoever reads no further than the first sheet; '' where no board was measured. */
export function boardBrief({ asBuilt }: Dossier): string {
  if (asBuilt === null) return '';
  const worst = asBuilt.verdict.worstReturnLossDb;
  const figure = worst === null ? '' : ` (${returnLossWords(worst)} measured at worst)`;
  return `${headline(asBuilt)}${figure}: see part ${String(parts.finishedBoard)}.`;
}

const headline = ({ verdict: { requiredDb, verdict } }: AsBuiltFigures): string =>
  requiredDb === null ? 'The finished board was measured; no return loss is required' : verdicts[verdict];

function measurement(figures: AsBuiltFigures, note: string): Block {
  const { name, sha256, samples, measuredHz, referenceOhm, attached, overlay } = figures;
  const row = (subject: string, words: string, below?: string): Row => ({
    cells: [[plain(subject)], [plain(words)]],
    ...(below === undefined ? {} : { below: { from: 1, paragraphs: [plain(below, 'small')] } }),
  });
  const by = attachedWords(figures);
  return {
    kind: 'table',
    columns: [
      { title: 'Measurement', share: 30 },
      { title: 'Looking in from the source side, the load attached', share: 70 },
    ],
    rows: [
      row('File', name, `SHA-256 ${sha256}`),
      row('Samples', `${String(samples)}, ${spanRead(measuredHz, 'Hz')}, reference ${formatRead(referenceOhm, 'Ω')}`),
      row('Compared with the prediction', comparedWords(overlay.frequencyHz)),
      row('Load state attached', attached.by === 'only one' ? 'there is only one' : attached.state, by || undefined),
      row('Note', orNotStated(note)),
    ],
  };
}

function comparedWords(frequencyHz: readonly number[]): string {
  const [low, high] = [frequencyHz[0], frequencyHz.at(-1)];
  if (low === undefined || high === undefined) return 'no sample: none lies within the sweep shown';
  if (low === high) return `1 sample, ${formatQuantity(low, 'Hz', 5)}`;
  return `${String(frequencyHz.length)} samples, ${frequencySpan({ low, high })}: those within the sweep shown`;
}

function plot(figures: AsBuiltFigures, dossier: Dossier): readonly Block[] {
  const { record, responses } = dossier;
  const [swept] = responses;
  if (figures.overlay.frequencyHz.length === 0 || swept === undefined) return [];
  const found = chosenBuilt(dossier)?.percentiles ?? null;
  const states = found?.states.filter(({ state }) => state === figures.attached.state) ?? [];
  const real = found === null || states.length === 0 ? null : { ...found, states };
  const needed = record.requirement.returnLossDb === null ? '' : ' The hatched region must stay free.';
  return [
    {
      kind: 'picture',
      figure: finishedBoardPlot(figures, record.requirement, swept.spanHz, real, chartSize),
      caption: `Figure 5. Return loss measured on the finished board (solid, dots on samples) over the prediction (dashed).${needed} ${bandWords(real, record)}`,
      scale: 1.1,
    },
  ];
}

function outside({ outside: spans, overlay }: AsBuiltFigures): readonly Block[] {
  if (overlay.frequencyHz.length === 0) return [];
  const heading: Block = { kind: 'heading', text: 'Outside the tolerance band' };
  if (spans === null) return [heading, text('Not assessed: no band was worked out for this load state.')];
  if (spans.length === 0) return [heading, text('Nowhere: every sample lies within the band.')];
  const told = spans
    .toSorted((a, b) => b.byDb - a.byDb)
    .slice(0, mostSpans)
    .sort((a, b) => a.low - b.low);
  const more = spans.length - told.length;
  return [
    heading,
    {
      kind: 'table',
      columns: [
        { title: 'Return loss measured is', share: 30 },
        { title: 'From', share: 18, align: 'end' },
        { title: 'To', share: 18, align: 'end' },
        { title: 'By at most', share: 16, align: 'end' },
        { title: 'At', share: 18, align: 'end' },
      ],
      rows: told.map(({ low, high, side, byDb, atHz }) => ({
        cells: [
          side === 'below' ? 'below the band: worse' : 'above the band: better',
          hertz(low),
          hertz(high),
          `${formatFixed(byDb, 2)} dB`,
          hertz(atHz),
        ].map((cell) => [plain(cell)]),
      })),
    },
    ...(more > 0 ? [text(`Left out: ${String(more)} more, each by less than these.`)] : []),
  ];
}

const hertz = (value: number): string => formatQuantity(value, 'Hz', 5);

function causes(figures: AsBuiltFigures): readonly Block[] {
  const { conclusion, distance, explanations, alike } = figures;
  if (conclusion === 'not compared' || distance === null) return [];
  const heading: Block = { kind: 'heading', text: 'What would explain it' };
  const [best] = explanations;
  if (conclusion === 'as predicted' || best === undefined) return [heading, text(causeWords(figures).join(' '))];
  const concluded = {
    explained: `One cause stands out: ${best.words}.`,
    alike: `Any one of the first ${String(alike)}, marked, explains it, and this measurement can’t tell them apart.`,
    unexplained: 'No single cause explains it: even the nearest takes too little away. Look for several.',
  }[conclusion];
  const shown = explanations.slice(0, Math.max(mostCauses, alike));
  const more = explanations.length - shown.length;
  return [
    heading,
    {
      ...text(
        `Measurement and prediction are ${gamma(distance)} apart in Γ (RMS). Each single cause below was fitted alone, the one that leaves least first. ${concluded}`,
      ),
      keep: true,
    },
    {
      kind: 'table',
      columns: [
        { title: 'Single cause, and its size', share: 52 },
        { title: 'Tolerance of the part', share: 18 },
        { title: 'Distance left in\u00a0Γ\u00a0(RMS)', share: 16, align: 'end' },
        { title: 'Of the distance', share: 14, align: 'end' },
      ],
      rows: shown.map(({ words, withinTolerance, residual }, k) => ({
        cells: [
          sentence(words).slice(0, -1),
          withinTolerance === null ? '–' : withinTolerance ? 'allows it' : 'exceeded',
          gamma(residual),
          `${formatFixed((100 * residual) / distance, 0)} %`,
        ].map((cell) => [plain(cell)]),
        marked: k < alike,
      })),
    },
    ...(more > 0 ? [text(`Left out: ${String(more)} that ${more === 1 ? 'leaves' : 'leave'} more than these.`)] : []),
  ];
}

function remedy(figures: AsBuiltFigures): readonly Block[] {
  const words = remedyWords(figures);
  if (words === '') return [];
  return [{ kind: 'heading', text: 'Remedy' }, text(words)];
}
