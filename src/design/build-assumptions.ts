import { formatFixed, formatQuantity } from '../quantity/format.ts';
import { formatTolerance } from '../parts/tolerance.ts';
import type { Build, DesignRecord } from '../record/design-record.ts';

/** What the figures of real parts rest on. */
export function buildAssumptions({ partQ, requirement }: DesignRecord, build: Build): string[] {
  const { stock, strayF, leadH, eslH, selfResonanceHz, vswr, ratedVolts, ratedAmps, ratedWatts } = build;
  const ratings = [
    ratedVolts === null ? '' : `${formatQuantity(ratedVolts, 'V', 3)} peak`,
    ratedAmps === null ? '' : `${formatQuantity(ratedAmps, 'A', 3)} RMS`,
    ratedWatts === null ? '' : `${formatQuantity(ratedWatts, 'W', 3)} of heat`,
  ].filter((rating) => rating !== '');
  return [
    'Options are found with exact, ideal parts; figures with real parts are named so, and the verdicts are theirs.',
    `Real parts: inductors ${originWords(build, 'inductor')}; capacitors ${originWords(build, 'capacitor')}.${stock === null ? '' : ` Stock list ${stock.name}, ${String(stock.parts.length)} parts, SHA-256 ${stock.sha256.slice(0, 16)}…`}`,
    `Inductors have ${qWords(partQ.inductor, build.inductor.qSlope)} and ${selfResonanceHz === null ? 'no self-resonance in question' : `resonate by themselves at ${formatQuantity(selfResonanceHz, 'Hz')}, as a capacitance across them`}${build.inductor.origin === 'wound' ? '; a wound coil has the self-capacitance of its winding' : ''}. Capacitors have ${qWords(partQ.capacitor, build.capacitor.qSlope)} and an ESL of ${formatQuantity(eslH, 'H', 3)}. A stock line that says otherwise is taken at its word.`,
    strayF === 0 && leadH === 0
      ? 'No stray capacitance and no lead inductance are taken in: the board is not known.'
      : `Every node has ${formatQuantity(strayF, 'F', 3)} to ground; every shunt arm has ${formatQuantity(leadH, 'H', 3)} of lead in series.`,
    build.pairs
      ? 'Two parts in series or in parallel may stand for one where a single one misses the requirement.'
      : 'Every arm is one part.',
    `Values are drawn independently, ${distributionWords[build.distribution]}, seed ${String(build.seed)}, ${String(build.samples)} networks (JCGM 101).${spreadWords('source', build.sourceSpread)}${spreadWords('load', build.loadSpread)}`,
    requirement.powerW === null
      ? 'Stress is not assessed: no power is stated.'
      : `Stress is for all of the available power, over band and load states${vswr === null ? '; a mismatched load is not assessed' : `, and with the load reflecting up to a VSWR of ${String(vswr)} against its nominal impedance, at every angle`}. ${ratings.length === 0 ? 'Parts have no rating but that of their stock line' : `Parts whose stock line says nothing are rated ${ratings.join(', ')}`}; ${formatFixed(build.derating * 100, 0)} % of a rating may be used.`,
  ];
}

function originWords({ inductor, capacitor }: Build, part: 'inductor' | 'capacitor'): string {
  const { origin, tolerance } = part === 'inductor' ? inductor : capacitor;
  const from = {
    exact: 'of exact value',
    stock: 'from the stock list',
    wound: 'wound to value',
  }[origin as 'exact'] as string | undefined;
  return `${from ?? `of series ${origin} (IEC 60063)`}, ${formatTolerance(tolerance, part)}`;
}

const qWords = (q: number, slope: number): string =>
  slope === 0 ? `Q ${String(q)} at every frequency` : `Q ${String(q)}·(f/f₀)^${formatFixed(slope, 2)}`;

const distributionWords = {
  uniform: 'evenly over their tolerance',
  triangular: 'in a triangle over their tolerance',
  normal: 'normally with a third of their tolerance as standard deviation, cut off at it',
} as const;

const spreadWords = (end: string, spread: number): string =>
  spread === 0
    ? ''
    : ` The ${end} spreads too: R by ±${String(Number((spread * 100).toPrecision(6)))} %, X by as much of |Z|, the same at every frequency.`;
