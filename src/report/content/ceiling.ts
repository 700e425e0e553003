import type { Ceiling, Dossier } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { returnLossDb } from '../../network/figures-of-merit.ts';
import { formatFixed, formatRead } from '../../quantity/format.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { ratio, sentence } from './words.ts';

/** What no lossless network can beat over the band, and the requirement set against it; or why there is no such limit. */
export function ceiling({ ceiling: found, noCeiling, record }: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.ceiling, text: 'Ceiling' };
  if (found === null) return [heading, text(noCeiling)];
  const { estimate, basis, governs, state, q, fractionalWidth, verdict, words } = found;
  return [
    heading,
    {
      kind: 'text',
      paragraph: { spans: [{ text: `${sentence(verdict)} `, bold: true }, { text: withoutVerdict(words, verdict) }] },
      keep: true,
    },
    {
      kind: 'text',
      paragraph: {
        spans: [
          ...(estimate ? [{ text: 'Estimate. ', bold: true }] : []),
          { text: `Basis: ${sentence(basis).replace(/^One-/u, 'one-')}` },
          ...(record.loads.length > 1
            ? [{ text: ' Each load state is judged by itself; holding all of them at once may not be possible.' }]
            : []),
        ],
      },
      keep: true,
    },
    {
      kind: 'facts',
      columns: 4,
      entries: [
        { name: 'Governing end', value: governs === 'source' ? 'Source' : state === '' ? 'Load' : `Load, ${state}` },
        { name: 'Its Q at the band’s centre', value: ratio(q) },
        { name: 'Fractional width of the band', value: ratio(fractionalWidth) },
        { name: 'Standing of the figures', value: estimate ? 'Estimate' : 'Exact for lossless networks' },
      ],
    },
    table(found, record.requirement.returnLossDb),
  ];
}

/** The verdict stands in bold before the sentence, which needn't open with it again. */
const withoutVerdict = (words: string, verdict: string): string =>
  words.toLowerCase().startsWith(`${verdict}: `) ? sentence(words.slice(verdict.length + 2)) : words;

function table({ perResonators, bestReflection, needs, estimate, verdict }: Ceiling, asked: number | null): Block {
  const best = [...perResonators, bestReflection];
  const row = (name: string, cells: readonly string[]): Row => ({
    cells: [[plain(name)], ...cells.map((cell) => [plain(cell, 'small')])],
  });
  const holds = (k: number): boolean =>
    k < perResonators.length ? needs !== null && k + 1 >= needs : verdict !== 'out of reach';
  return {
    kind: 'table',
    columns: [
      { title: 'Resonators, the end’s\u00a0own\u00a0counted', share: 100 },
      ...perResonators.map((_, k) => ({ title: String(k + 1), share: 44, align: 'end' as const })),
      { title: 'Any number', share: 46, align: 'end' },
    ],
    rows: [
      row(
        `Return loss at best${estimate ? ' (estimate)' : ''}`,
        best.map((reflection) => returnLossWords(returnLossDb(reflection ** 2))),
      ),
      row(
        '|Γ| at best',
        best.map((reflection) => (reflection < 5e-5 ? '< 0.0001' : formatFixed(reflection, 4))),
      ),
      ...(asked === null
        ? []
        : [
            row(
              `Can hold ${formatRead(asked, 'dB')}`,
              best.map((_, k) => (holds(k) ? 'yes' : 'no')),
            ),
          ]),
    ],
  };
}
