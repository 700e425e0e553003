import type { DesignRecord } from '../record/design-record.ts';
import { formatRead } from '../quantity/format.ts';
import type { Frame, Key } from './chart-frame.ts';
import type { Box } from './curve-numbers.ts';
import { n, path, rectangle, stroke } from './draw.ts';
import type { Shape } from './figure.ts';
import { hatch } from './hatch.ts';

type Requirement = DesignRecord['requirement'];

const edge = { stroke: 'limit', width: stroke.thin } as const;

/** Name of the required region, to stand beside the title; undefined where nothing is required. */
export const requiredKey = ({ returnLossDb: needed }: Requirement): Key | undefined =>
  needed === null
    ? undefined
    : {
        text: `required: at least ${formatRead(needed, 'dB')}`,
        tone: 'limit',
        reach: 17,
        sample: (x, y, X, Y) => [hatch(x, y, X, Y, 3.5), rectangle(x, y, X - x, Y - y, edge)],
      };

/** The band up to the return loss asked for, hatched: curves must stay out of it. Empty where nothing is required. */
export function requiredRegion(
  frame: Frame,
  { returnLossDb: needed, bandHz, frequencyHz }: Requirement,
): { readonly shapes: readonly Shape[]; readonly boxes: readonly Box[] } {
  if (needed === null) return { shapes: [], boxes: [] };
  const band = bandHz ?? { low: frequencyHz, high: frequencyHz };
  const inside = (hertz: number): number => Math.min(frame.right, Math.max(frame.left, frame.x(hertz)));
  let [x, X] = [inside(band.low), inside(band.high)];
  if (X - x < 3) [x, X] = [(x + X) / 2 - 1.5, (x + X) / 2 + 1.5];
  const y = frame.y(needed);
  return {
    shapes: [
      hatch(x, y, X, frame.bottom),
      path(`M${n(x)} ${n(frame.bottom)}L${n(x)} ${n(y)}L${n(X)} ${n(y)}L${n(X)} ${n(frame.bottom)}`, edge),
    ],
    boxes: [{ left: x, right: X, top: y, bottom: frame.bottom }],
  };
}

/** The same in words, for whoever doesn't see it. */
export function requiredWords({ returnLossDb: needed, bandHz, frequencyHz }: Requirement): string {
  if (needed === null) return 'No return loss is required.';
  const where =
    bandHz === null
      ? `at ${formatRead(frequencyHz, 'Hz')}`
      : `from ${formatRead(bandHz.low, 'Hz')} to ${formatRead(bandHz.high, 'Hz')}`;
  return `Required: at least ${formatRead(needed, 'dB')} ${where}.`;
}
