import type { Built, Dossier, PartSensitivity } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { formatTolerance } from '../../parts/tolerance.ts';
import { formatFixed, formatRead } from '../../quantity/format.ts';
import type { Build } from '../../record/design-record.ts';
import { plain, text, type Block } from '../page/block.ts';
import { parts } from './parts.ts';
import { chosenBuilt, orderedValue, percent, whyNotBuilt, worstWords } from './real-words.ts';
import { sentence } from './words.ts';

/** How many of the networks built will do, at worst, and which part decides it. */
export function tolerance(dossier: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.tolerance, text: 'Tolerance and yield' };
  const built = chosenBuilt(dossier);
  const { build, requirement } = dossier.record;
  if (built === null || build === null) return [heading, text(`Not assessed: ${whyNotBuilt(dossier)}.`)];
  if (built.parts.length === 0 && build.sourceSpread === 0 && build.loadSpread === 0) {
    return [heading, text('There is nothing whose value could vary.')];
  }
  return [
    heading,
    { ...text(yieldSentence(built, requirement.returnLossDb)), keep: true },
    { kind: 'facts', columns: 4, entries: drawn(built, build) },
    ...(built.parts.length === 0 ? [] : [...corner(built, requirement.returnLossDb), ...sensitivity(built)]),
  ];
}

function yieldSentence({ yield: found }: Built, required: number | null): string {
  if (found === null || required === null) return 'Yield is not assessed: no return loss is required.';
  const { value, low, high, confidence, passed, samples } = found;
  return (
    `Of ${String(samples)} networks drawn, ${String(passed)} hold ${formatRead(required, 'dB')}: a yield of ${percent(value)}; ` +
    `with ${formatFixed(confidence * 100, 0)} % confidence it lies between ${percent(low)} and ${percent(high)} (Clopper-Pearson).`
  );
}

const distributions = {
  uniform: 'uniform over the tolerance',
  triangular: 'triangular over the tolerance',
  normal: 'normal, σ a third of the tolerance, cut off at it',
} as const;

function drawn(
  { yield: found }: Built,
  { distribution, sourceSpread, loadSpread, samples, seed, leastYield }: Build,
): readonly { readonly name: string; readonly value: string }[] {
  const spread = (value: number): string => (value === 0 ? 'none' : `±${percent(value)}`);
  const least =
    leastYield === null
      ? 'not required'
      : `${percent(leastYield)}: ${found === null ? 'not assessed' : found.value >= leastYield ? 'met' : 'missed'}`;
  return [
    { name: 'Least yield', value: least },
    { name: 'Networks drawn, seed', value: `${String(samples)}, seed ${String(seed)}` },
    { name: 'Distribution of values', value: distributions[distribution] },
    {
      name: 'Spread of source, of load',
      value: sourceSpread === 0 && loadSpread === 0 ? 'none' : `${spread(sourceSpread)}, ${spread(loadSpread)}`,
    },
  ];
}

function corner({ corners }: Built, required: number | null): readonly Block[] {
  if (corners === null) return [];
  const { worstReturnLossDb, worstAtHz, worstState, words, meets } = corners;
  const against =
    meets === null || required === null
      ? ''
      : `, ${meets ? 'at least' : 'below'} the ${formatRead(required, 'dB')} required`;
  return [
    { kind: 'heading', text: 'Worst corner' },
    text(
      `With every part at an end of its tolerance the return loss falls to ${worstWords(worstReturnLossDb, worstAtHz, worstState)}${against}: ${sentence(words.replace(/ (?=[+−]\d)/gu, '\u00a0'))}`,
    ),
  ];
}

function sensitivity({
  sensitivity: ranked,
  parts: ordered,
  worstReturnLossDb,
  tighten,
  yield: found,
}: Built): readonly Block[] {
  if (ranked.length === 0) return [];
  const halved = ranked.some(({ yieldIfHalved }) => yieldIfHalved !== null);
  const valueWords = (designator: string): string => {
    const part = ordered.find((each) => each.designator === designator);
    return part === undefined ? '–' : `${orderedValue(part)} ${formatTolerance(part.tolerance, part.part)}`;
  };
  const row = ({ designator, dbPerPercent, dbPerMinusPercent, atToleranceDb, yieldIfHalved }: PartSensitivity) => ({
    cells: [
      [{ spans: [{ text: designator, bold: true }] }],
      ...[
        valueWords(designator),
        ...[dbPerPercent, dbPerMinusPercent].map((db) => `${db > 0 ? '+' : ''}${formatFixed(db, 2)} dB`),
        returnLossWords(atToleranceDb),
        ...(halved ? [yieldIfHalved === null ? '–' : percent(yieldIfHalved)] : []),
      ].map((cell) => [plain(cell)]),
    ],
  });
  const buys =
    tighten !== '' ? tighten : found === null ? '' : 'Halving the tolerance of any one part does not raise the yield.';
  return [
    { kind: 'heading', text: 'What each part does to it' },
    {
      ...text(
        `Each part by itself, the others at their values; with all at theirs it is ${returnLossWords(worstReturnLossDb)}. The largest effect stands first.`,
      ),
      keep: true,
    },
    {
      kind: 'table',
      columns: [
        { title: 'Part', share: 12 },
        { title: 'Value', share: 24 },
        { title: 'For +1\u00a0%', share: 15, align: 'end' },
        { title: 'For −1\u00a0%', share: 15, align: 'end' },
        { title: 'At the worse end of its\u00a0tolerance', share: 24, align: 'end' },
        ...(halved ? [{ title: 'Yield with its tolerance\u00a0halved', share: 22, align: 'end' as const }] : []),
      ],
      rows: ranked.map(row),
    },
    ...(buys === '' ? [] : [text(buys)]),
  ];
}
