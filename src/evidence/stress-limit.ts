import { formatFixed, formatQuantity, formatRead } from '../quantity/format.ts';
import type { PartStress, Stress, StressFigures, StressKind } from './stress-figures.ts';

/** Of parts whose own says nothing; null: not known. V (peak), A (RMS), W. */
export interface Ratings {
  readonly ratedVolts: number | null;
  readonly ratedAmps: number | null;
  readonly ratedWatts: number | null;
}

/**
 * Available power at which a part reaches its derated rating, W, and which: voltage and current go as its square root,
 * heat goes with it. Null where no rating is known that would ever be reached.
 *
 * @param figures at `powerW`
 */
export function limitOf(
  { voltsPeak, ampsRms, watts }: StressFigures,
  { ratedVolts, ratedAmps, ratedWatts }: Ratings,
  derating: number,
  powerW: number,
): { readonly by: StressKind; readonly powerW: number } | null {
  const ways = [
    { by: 'voltage', rated: ratedVolts, found: voltsPeak, exponent: 2 },
    { by: 'current', rated: ratedAmps, found: ampsRms, exponent: 2 },
    { by: 'heat', rated: ratedWatts, found: watts, exponent: 1 },
  ] as const;
  return ways
    .flatMap(({ by, rated, found, exponent }) =>
      rated === null ? [] : [{ by, powerW: powerW * ((derating * rated) / found) ** exponent }],
    )
    .filter((limit) => Number.isFinite(limit.powerW))
    .reduce<{ by: StressKind; powerW: number } | null>(
      (least, limit) => (least === null || limit.powerW < least.powerW ? limit : least),
      null,
    );
}

/** Which part fails first, at what power, and whether that is more than what is stated. */
export function stressWords(
  parts: readonly PartStress[],
  powerW: number,
  vswr: number | null,
  derating: number,
): Pick<Stress, 'first' | 'within' | 'words'> {
  let first: Stress['first'] = null;
  for (const { designator, limitW, limitBy } of parts) {
    if (limitW === null || limitBy === null) continue;
    if (first === null || limitW < first.powerW) first = { designator, by: limitBy, powerW: limitW };
  }
  if (parts.length === 0) return { first, within: null, words: 'The network has no part.' };
  if (first === null) {
    return { first, within: null, words: 'No rating is known, so that nothing is said of what fails first.' };
  }
  const within = first.powerW >= powerW;
  const rating = derating === 1 ? 'its rating' : `${percent(derating)} % of its rating`;
  const load = vswr === null ? '' : ` with the load mismatched up to a VSWR of ${String(vswr)}`;
  const stated = `the ${formatRead(powerW, 'W')} stated`;
  const compared = within ? `${times(first.powerW / powerW)} ${stated}` : `less than ${stated}`;
  const unknown = parts.filter(({ limitW }) => limitW === null).map(({ designator }) => designator);
  const rest = unknown.length === 0 ? '' : ` No rating is known of ${unknown.join(', ')}.`;
  return {
    first,
    within,
    words: `${first.designator} fails first, by ${first.by}: it reaches ${rating} at ${formatQuantity(first.powerW, 'W', 3)} available${load}, ${compared}.${rest}`,
  };
}

const percent = (fraction: number): string => formatFixed(fraction * 100, Number.isInteger(fraction * 100) ? 0 : 1);

const times = (ratio: number): string =>
  ratio >= 1000
    ? 'over a thousand times'
    : `${ratio < 10 ? formatFixed(ratio, 1) : String(Number(ratio.toPrecision(2)))} times`;
