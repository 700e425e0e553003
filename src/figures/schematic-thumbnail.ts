import type { Arm } from '../network/arm.ts';
import { circle, line, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';
import { earth, junction, part } from './symbols.ts';

const wire = { stroke: 'ink', width: stroke.line } as const;
const scale = 0.62;
const wireY = 8;
const earthY = 42;
const middleY = (wireY + earthY) / 2;

/**
 * The network's shape for a list of options: no values, no terminations, an open circle at either port. Grows with the
 * number of arms; at least 60 pt wide, so that drawings in a column begin and end alike.
 */
export function schematicThumbnail(arms: readonly Arm[]): Figure {
  const shapes: Shape[] = [];
  const r = 1.8;
  const left = 3;
  let end = left + r;
  const lead = (x: number): void => {
    shapes.push(line(end, wireY, x, wireY, wire));
    end = x;
  };
  shapes.push(circle(left, wireY, r, wire));
  let under = 0;
  for (const arm of arms) {
    if (arm.arm === 'series') {
      const reach = part(arm.part, 0, 0, 'across', scale).reach;
      // A narrow symbol keeps a winding's distance to what stands beside it.
      const x = end + 5 + Math.max(reach, 6);
      lead(x - reach);
      shapes.push(...part(arm.part, x, wireY, 'across', scale).shapes);
      end = x + reach;
    } else {
      const half = arm.part === 'capacitor' ? 5.6 : 5;
      const x = Math.max(end + 7, under + 4 + half);
      lead(x);
      const placed = part(arm.part, x, middleY, 'down', scale);
      shapes.push(junction(x, wireY, 0.75), line(x, wireY, x, middleY - placed.reach, wire), ...placed.shapes);
      shapes.push(line(x, middleY + placed.reach, x, earthY, wire), earth(x, earthY, scale));
      under = x + half;
    }
  }
  const port = Math.max(end + 9, under + 3, 54);
  lead(port - r);
  shapes.push(circle(port, wireY, r, wire));
  const words = arms.map((arm) => `${arm.arm} ${arm.part}`).join(', ');
  return {
    width: port + r + 2,
    height: 50,
    title: 'Network shape',
    description: words === '' ? 'Direct connection, no part.' : `From source to load: ${words}.`,
    shapes,
  };
}
