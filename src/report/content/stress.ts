import type { Built, Dossier, PartStress, Stress, StressFigures } from '../../dossier.ts';
import { formatFixed, formatQuantity, formatRead } from '../../quantity/format.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { amps, percent, volts, watts, whyNotBuilt } from './real-words.ts';
import { chosenOption } from './words.ts';

/** What the parts lose, and what each of them bears for the available power. */
export function stress(dossier: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.stress, text: 'Loss and stress' };
  const option = chosenOption(dossier.options, dossier.chosen);
  const { record } = dossier;
  if (option === undefined) return [heading, text(`Not assessed: ${whyNotBuilt(dossier)}.`)];
  const f0 = formatQuantity(record.requirement.frequencyHz, 'Hz', 5);
  const exact = `${formatFixed(option.lossDb, 2)} dB`;
  const { built } = option;
  if (built === null) {
    return [
      heading,
      text(`Exact values with the stated Q lose ${exact} at ${f0}. Stress is not assessed: ${whyNotBuilt(dossier)}.`),
    ];
  }
  if (built.parts.length === 0) return [heading, text('There is no part that could lose power or be stressed.')];
  return [
    heading,
    { kind: 'facts', columns: 4, entries: losses(built, exact, f0, record.loads.length > 1) },
    ...(built.stress === null
      ? [text('Stress is not assessed: no power is stated.')]
      : stressed(built.stress, record.build?.derating ?? 1)),
  ];
}

const losses = (
  { lossDb, efficiency, worstState, stress: found }: Built,
  exact: string,
  f0: string,
  several: boolean,
): readonly { readonly name: string; readonly value: string }[] => [
  { name: `Loss of real parts at ${f0}${several ? `, ${worstState}` : ''}`, value: `${formatFixed(lossDb, 2)} dB` },
  { name: 'Efficiency of the network', value: percent(efficiency) },
  { name: 'Loss of exact values, Q as stated', value: exact },
  { name: 'Available power', value: found === null ? 'not stated' : formatRead(found.powerW, 'W') },
];

function stressed(found: Stress, derating: number): readonly Block[] {
  const { vswr, words, powerW } = found;
  const over =
    vswr === null
      ? 'into the load as given'
      : `into the load as given, and into one that reflects up to a VSWR of ${String(vswr)} at the angle that is worst for the part`;
  const rating = `${formatFixed(derating * 100, Number.isInteger(derating * 100) ? 0 : 1)} %`;
  return [
    {
      ...text(
        `The most that each part bears over band and load states with ${formatRead(powerW, 'W')} available, ${over}; the last column is the available power at which it reaches ${rating} of a rating.`,
      ),
      keep: true,
    },
    {
      kind: 'table',
      columns: [
        { title: 'Part', share: 34 },
        { title: 'Voltage, peak', share: 46, align: 'end' },
        { title: 'Current, RMS', share: 46, align: 'end' },
        { title: 'Heat', share: 44, align: 'end' },
        ...(vswr === null
          ? []
          : ['Voltage, peak', 'Current, RMS', 'Heat'].map((title) => ({
              title: `${title}, VSWR\u00a0${String(vswr)}`,
              share: 50,
              align: 'end' as const,
            }))),
        { title: 'Derated rating reached\u00a0at', share: 90, align: 'end' },
      ],
      rows: found.parts.map((part) => row(part, found)),
    },
    { kind: 'text', paragraph: { spans: [{ text: words, bold: found.within === false }] } },
  ];
}

function row(part: PartStress, { vswr, powerW }: Stress): Row {
  const { designator, mismatched, limitBy, limitW } = part;
  const limit = limitBy === null || limitW === null ? 'no rating known' : `${watts(limitW)}, by ${limitBy}`;
  return {
    cells: [
      [{ spans: [{ text: designator, bold: true }] }],
      ...[...figures(part), ...(vswr === null ? [] : mismatched === null ? ['–', '–', '–'] : figures(mismatched))].map(
        (cell) => [plain(cell)],
      ),
      [{ spans: [{ text: limit, bold: limitW !== null && limitW < powerW }] }],
    ],
  };
}

const figures = ({ voltsPeak, ampsRms, watts: heat }: StressFigures): readonly string[] => [
  volts(voltsPeak),
  amps(ampsRms),
  watts(heat),
];
