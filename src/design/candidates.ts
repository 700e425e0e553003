import type { Arm } from '../network/arm.ts';
import type { RealArm } from '../network/real-arm.ts';
import { coil } from '../parts/coil.ts';
import type { Pair } from '../evidence/pair-share.ts';
import { preferredValues } from '../parts/preferred-series.ts';
import type { StockPart } from '../parts/stock.ts';
import type { Tolerance } from '../parts/tolerance.ts';
import type { Build, DesignRecord } from '../record/design-record.ts';
import { log, power } from '../quantity/elementary.ts';

/** One part that can be had. */
export interface SinglePart {
  readonly arm: RealArm;
  /** Name of the series ("E24"), of the stock line, "wound" or "exact". */
  readonly from: string;
  readonly tolerance: Tolerance;
  readonly selfResonanceHz: number | null;
  readonly ratedVolts: number | null;
  readonly ratedAmps: number | null;
}

/** What can stand for an arm: one part, or two joined. */
export interface Candidate {
  readonly arm: RealArm;
  readonly parts: readonly SinglePart[];
  readonly pair: Pair;
}

/** How far from the value that would be best parts are considered, as a ratio. */
export const reach = 2.4;
/** The same for the two parts of a pair: a small one trims a large one. */
export const pairReach = 100;
/** Lines of a stock list considered for an arm, the nearest by ratio; more of them where two may stand for one. */
const mostLines = { single: 60, pair: 200 } as const;

/** What one arm of a network could be made of, ascending by value; never empty. */
export function candidatesFor(
  record: DesignRecord,
  build: Build,
  arm: Arm,
  centre: number,
  within = reach,
): readonly SinglePart[] {
  const { origin } = build[arm.part];
  const range = arm.part === 'inductor' ? record.requirement.inductorH : record.requirement.capacitorF;
  const low = Math.max(range.low, centre / within);
  const high = Math.min(range.high, centre * within);
  if (origin === 'exact') return [partOf(record, build, arm, arm.value, 'exact')];
  if (origin === 'stock') {
    const lines = usable(build, arm, record.requirement.frequencyHz);
    const near = lines
      .toSorted((a, b) => distance(a.value, centre) - distance(b.value, centre))
      .slice(0, within > reach ? mostLines.pair : mostLines.single);
    return near.toSorted((a, b) => a.value - b.value).map((line) => partOfStock(record, build, arm, line));
  }
  // A coil's turns are spread or pressed to any value; so fine a series stands for them.
  const series = origin === 'wound' ? 'E192' : origin;
  const near = low <= high ? preferredValues(series, low, high) : [];
  const values = near.length > 0 ? near : [nearestOf(series, centre, range.low, range.high)];
  return values.map((value) => partOf(record, build, arm, value, origin));
}

/** Lines of the kind; those that resonate by themselves below the design frequency are no such part there. */
function usable({ stock }: Build, { part }: Arm, f0: number): readonly StockPart[] {
  const lines = stock!.parts.filter(({ kind }) => kind === part);
  const below = lines.filter(({ selfResonanceHz }) => selfResonanceHz === null || selfResonanceHz > f0);
  return below.length > 0 ? below : lines;
}

const distance = (value: number, centre: number): number => Math.abs(log(value / centre));

/** Of a series within the practicable range, the value nearest to one outside it; where it has none, of all. */
function nearestOf(series: Parameters<typeof preferredValues>[0], centre: number, low: number, high: number): number {
  const inside = preferredValues(series, low, high);
  const values = inside.length > 0 ? inside : preferredValues(series, centre / 3, centre * 3);
  return values.reduce((a, b) => (distance(b, centre) < distance(a, centre) ? b : a));
}

/** A part that a series has, or that is made to its value, with what the policy says of its kind. */
export function partOf(record: DesignRecord, build: Build, arm: Arm, value: number, from: string): SinglePart {
  const policy = build[arm.part];
  const wound = arm.part === 'inductor' && from === 'wound' ? coil('', value, build.winding) : null;
  const ownC = wound?.selfCapacitanceF ?? null;
  const resonance = wound === null ? (arm.part === 'inductor' ? build.selfResonanceHz : null) : wound.selfResonanceHz;
  return {
    arm: {
      arm: arm.arm,
      part: arm.part,
      value,
      q: record.partQ[arm.part],
      qSlope: policy.qSlope,
      parallelF: ownC ?? (resonance === null ? 0 : resonating(resonance, value)),
      seriesH: (arm.part === 'capacitor' ? build.eslH : 0) + leadOf(build, arm),
    },
    from,
    tolerance: policy.tolerance,
    selfResonanceHz: arm.part === 'capacitor' && build.eslH > 0 ? resonanceOf(build.eslH, value) : resonance,
    ratedVolts: build.ratedVolts,
    ratedAmps: build.ratedAmps,
  };
}

/** A line of the stock list; what it leaves open is the policy's. */
function partOfStock(record: DesignRecord, build: Build, arm: Arm, line: StockPart): SinglePart {
  const policy = build[arm.part];
  const f0 = record.requirement.frequencyHz;
  const asBought = partOf(record, build, arm, line.value, 'stock');
  const q = line.q === null ? record.partQ[arm.part] : line.q * power(f0 / (line.qAtHz ?? f0), policy.qSlope);
  const { selfResonanceHz } = line;
  const esl = line.eslH ?? (selfResonanceHz === null ? build.eslH : resonating(selfResonanceHz, line.value));
  return {
    arm: {
      ...asBought.arm,
      q,
      ...(arm.part === 'inductor'
        ? { parallelF: selfResonanceHz === null ? asBought.arm.parallelF : resonating(selfResonanceHz, line.value) }
        : { seriesH: esl + leadOf(build, arm) }),
    },
    from: line.name,
    tolerance: line.tolerance ?? policy.tolerance,
    selfResonanceHz:
      selfResonanceHz ??
      (arm.part === 'capacitor' && esl > 0 ? resonanceOf(esl, line.value) : asBought.selfResonanceHz),
    ratedVolts: line.ratedVolts ?? build.ratedVolts,
    ratedAmps: line.ratedAmps ?? build.ratedAmps,
  };
}

const leadOf = ({ leadH }: Build, { arm }: Arm): number => (arm === 'shunt' ? leadH : 0);

/** What resonates with a reactance of the other kind at a frequency: 1/(ω²·value), H or F. */
const resonating = (frequencyHz: number, value: number): number => 1 / ((2 * Math.PI * frequencyHz) ** 2 * value);

const resonanceOf = (henry: number, farad: number): number => 1 / (2 * Math.PI * Math.sqrt(henry * farad));
