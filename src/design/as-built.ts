import type { Option } from '../dossier.ts';
import { asBuilt } from '../evidence/as-built.ts';
import type { AsBuiltFigures } from '../evidence/as-built-figures.ts';
import { realArm, type RealArm } from '../network/real-arm.ts';
import type { Tolerance } from '../parts/tolerance.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { candidatesFor } from './candidates.ts';
import { sweepSpan } from './response.ts';

const exact: Tolerance = { kind: 'relative', value: 0 };

/** The finished board against the chosen network; null where nothing was measured or nothing chosen. */
export function asBuiltOf(record: DesignRecord, chosen: Option | undefined, reach: Span | null): AsBuiltFigures | null {
  const { asBuilt: board, source, loads, aim, requirement, build, partQ } = record;
  if (board === null || chosen === undefined) return null;
  const { arms, designators, built } = chosen;
  const ladder = built?.ladder ?? {
    arms: arms.map((arm) => realArm({ ...arm, q: partQ[arm.part] })),
    strayF: 0,
  };
  return asBuilt({
    measured: board.measured,
    ladder,
    designators,
    tolerances: arms.map((_, k) => built?.parts.find(({ armIndex }) => armIndex === k)?.tolerance ?? exact),
    candidates: ladder.arms.map((arm, k) =>
      build === null
        ? []
        : nextTo(
            arm,
            candidatesFor(record, build, arms[k]!, arm.value).map((part) => part.arm),
          ),
    ),
    source,
    loads,
    attached: board.state,
    aim,
    f0: requirement.frequencyHz,
    spanHz: sweepSpan(record, reach),
    bandHz: requirement.bandHz,
    returnLossDb: requirement.returnLossDb,
    percentiles: built?.percentiles ?? null,
  });
}

/** The next two values below and above a part's own. */
const nextTo = ({ value }: RealArm, parts: readonly RealArm[]): readonly RealArm[] => [
  ...parts.filter((part) => part.value < value * (1 - 1e-9)).slice(-2),
  ...parts.filter((part) => part.value > value * (1 + 1e-9)).slice(0, 2),
];
