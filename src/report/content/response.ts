import type { Dossier, HalfPower, Option, Response } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { chartSize } from '../../figures/chart-frame.ts';
import { gainPlot } from '../../figures/gain-plot.ts';
import { reflectionPlane } from '../../figures/reflection-plane.ts';
import { returnLossPlot } from '../../figures/return-loss-plot.ts';
import { formatFixed, formatQuantity, formatRead } from '../../quantity/format.ts';
import { plain, text, type Block, type Column, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { bandWords, percentilesBy, realFiguresAt } from './real-response.ts';
import { chosenOption, namedFrequencies, sampleAt, spanRead } from './words.ts';

/** The sweep in pictures, and its figures at the frequencies that the requirement names. */
export function response(dossier: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.response, text: 'Response' };
  const option = chosenOption(dossier.options, dossier.chosen);
  const { responses, record } = dossier;
  const [swept] = responses;
  if (option === undefined || swept === undefined) return [heading, text('Without a network there is no response.')];
  const { requirement } = record;
  const real = option.arms.length === 0 ? null : percentilesBy(responses, option.built);
  const span = `${formatQuantity(swept.spanHz.low, 'Hz')} to ${formatQuantity(swept.spanHz.high, 'Hz')}`;
  const into = responses.length > 1 ? ` into each of ${String(responses.length)} load states` : '';
  const governing = responses.length > 1 ? ` of ${swept.state}` : '';
  return [
    heading,
    { ...text(`Swept from ${span}${into}, ${String(swept.frequencyHz.length)} points.`), keep: true },
    ...figuresAt(responses, requirement),
    ...(real === null ? [] : realFiguresAt(real, requirement)),
    {
      kind: 'picture',
      figure: returnLossPlot(responses, requirement, chartSize, real),
      caption: [
        requirement.returnLossDb === null
          ? 'Figure 2. Return loss.'
          : `Figure 2. Return loss; the hatched region is the requirement${requirement.bandHz === null ? '' : ` (${spanRead(requirement.bandHz, 'Hz')})`} and must stay free.`,
        bandWords(real, record),
      ]
        .filter((words) => words !== '')
        .join(' '),
      scale: 1.1,
    },
    {
      kind: 'picture',
      figure: gainPlot(responses, requirement, halfPowerOf(option, swept)),
      caption: `Figure 3. Transducer gain; the dashed line lies 3.01 dB below the peak${governing}, with the half-power edges on it.`,
      scale: 1.1,
    },
    {
      kind: 'picture',
      figure: reflectionPlane(responses, requirement),
      caption: `Figure 4. Reflection coefficient at the source for the ${record.aim} aim.`,
      scale: 1.1,
    },
  ];
}

/** Real parts may be worst in another state than exact ones: the edges are those of the state that is shown first. */
const halfPowerOf = ({ states, halfPower }: Option, { state }: Response): HalfPower =>
  states.find(({ name }) => name === state)?.halfPower ?? halfPower;

function figuresAt(
  responses: readonly Response[],
  { frequencyHz, bandHz }: Dossier['record']['requirement'],
): readonly Block[] {
  const named = namedFrequencies({ frequencyHz, bandHz });
  const several = responses.length > 1;
  const rows = responses.flatMap((swept, state) =>
    named.flatMap(([name, hertz], k): readonly Row[] => {
      const figures = figuresOf(swept, hertz);
      if (figures === null) return [];
      const first = k > 0 ? '' : `${swept.state}${state === 0 ? ' (governs)' : ''}`;
      return [{ cells: [[plain(several ? first : name)], ...figures.map((figure) => [plain(figure)])] }];
    }),
  );
  if (rows.length === 0) return [];
  const columns: readonly Column[] = [
    { title: several ? 'Load state' : 'At', share: 22 },
    { title: 'Frequency', share: 17, align: 'end' },
    { title: 'Return loss', share: 15, align: 'end' },
    { title: 'VSWR', share: 12, align: 'end' },
    { title: 'Mismatch loss', share: 17, align: 'end' },
    { title: 'Transducer gain', share: 18, align: 'end' },
  ];
  return [{ kind: 'table', columns, rows }];
}

/** Figures at one frequency; null where the sweep doesn't hold it. */
function figuresOf(swept: Response, hertz: number): readonly string[] | null {
  const k = sampleAt(swept, hertz);
  if (k < 0) return null;
  const ratio = swept.vswr[k] ?? 0;
  return [
    formatRead(hertz, 'Hz'),
    returnLossWords(swept.returnLossDb[k] ?? 0),
    ratio >= 1e4 ? '> 10 000' : formatFixed(ratio, 3),
    `${formatFixed(swept.mismatchLossDb[k] ?? 0, 3)} dB`,
    `${formatFixed(swept.transducerGainDb[k] ?? 0, 3)} dB`,
  ];
}
