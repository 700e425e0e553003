import type { Dossier } from '../../dossier.ts';
import { attenuationDb } from '../../network/figures-of-merit.ts';
import { formatFixed, formatImpedance, formatQuantity } from '../../quantity/format.ts';
import { plain, text, type Block } from '../page/block.ts';
import { parts } from './parts.ts';
import { chosenOption, powerOfTen } from './words.ts';

/** Independent routes to the same figures, and how far they lie apart. */
export function verification({ evidence }: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.verification, text: 'Verification' };
  if (evidence === null) return [heading, text('Without a network there is nothing to verify.')];
  const at = evidence.frequenciesHz.map((hertz) => formatQuantity(hertz, 'Hz', 5)).join(', ');
  return [
    heading,
    {
      kind: 'text',
      paragraph: {
        spans: [
          { text: evidence.pass ? 'Passes. ' : 'Fails. ', bold: true },
          { text: `Each route works out the figures in its own way; compared at ${at}.` },
        ],
      },
      keep: true,
    },
    {
      kind: 'table',
      columns: [
        { title: 'Route', share: 14 },
        { title: 'How it computes', share: 52 },
        { title: `Impedance seen at f₀`, share: 21, align: 'end' },
        { title: 'Transducer gain at\u00a0f₀', share: 13, align: 'end' },
      ],
      rows: evidence.routes.map(({ name, how, seen, transducerGain }) => ({
        cells: [
          [plain(name, 'small')],
          [plain(how, 'small')],
          [plain(seen === null ? '–' : formatImpedance(seen.r, seen.x, 7), 'small')],
          [plain(transducerGain === null ? '–' : formatFixed(transducerGain, 9), 'small')],
        ],
      })),
    },
    {
      kind: 'table',
      columns: [
        { title: 'Compared', share: 26 },
        { title: 'Largest spread', share: 12, align: 'end' },
        { title: 'Tolerance', share: 10, align: 'end' },
        { title: 'Result', share: 8 },
        { title: 'Meaning', share: 44 },
      ],
      rows: evidence.checks.map(({ subject, spread, tolerance, pass, note }) => ({
        cells: [
          [plain(subject, 'small')],
          [plain(powerOfTen(spread), 'small')],
          [plain(powerOfTen(tolerance), 'small')],
          [{ spans: [{ text: pass ? 'pass' : 'FAIL', bold: true }], style: 'small' }],
          [plain(note, 'small')],
        ],
      })),
    },
  ];
}

/** The half-power bandwidth by the rule and by the sweep, side by side. */
export function bandwidth({ options, chosen }: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.bandwidth, text: 'Half-power bandwidth' };
  const option = chosenOption(options, chosen);
  if (option === undefined) return [heading, text('Without a network there is no bandwidth.')];
  const { loadedQ, bandwidthFromQHz, halfPower, bandwidthNote, states, worstState } = option;
  const several = states.length > 1;
  return [
    heading,
    {
      kind: 'table',
      columns: [
        { title: 'Figure', share: 40 },
        { title: 'Bandwidth', share: 16, align: 'end' },
        { title: 'Edges', share: 44 },
      ],
      rows: [
        {
          cells: [
            [plain(loadedQ === null ? 'From loaded Q' : `From loaded Q: f₀/QL, QL = ${formatFixed(loadedQ, 3)}`)],
            [plain(bandwidthFromQHz === null ? 'none' : formatQuantity(bandwidthFromQHz, 'Hz'))],
            [plain('not given by this rule')],
          ],
        },
        ...states.map(({ name, halfPower: swept }) => ({
          cells: [
            [plain(several ? `From the sweep, ${name}` : 'From the sweep, 3.01 dB below the peak')],
            [plain(swept.bandwidthHz === null ? 'not bounded' : formatQuantity(swept.bandwidthHz, 'Hz'))],
            [plain(swept.words)],
          ],
        })),
      ],
    },
    text(several && bandwidthFromQHz !== null ? `Against ${worstState}: ${lowerFirst(bandwidthNote)}` : bandwidthNote),
    text(
      `${several ? `Peak of ${worstState}` : 'Peak'}: ${formatFixed(0 - attenuationDb(halfPower.peakGain), 3)} dB at ${formatQuantity(halfPower.peakHz, 'Hz', 5)}.`,
    ),
  ];
}

const lowerFirst = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);
