import type { Arm } from '../../network/arm.ts';
import { dcPath } from '../../network/dc-path.ts';

/** Which part stands in which arm, source side first; values are for the fit to find. */
export type Shape = readonly Omit<Arm, 'value'>[];

/** What the engineer allows. */
export interface ShapeRule {
  /** low-pass: series L and shunt C only; high-pass: series C and shunt L only. */
  readonly form: 'any' | 'low-pass' | 'high-pass';
  readonly shuntInductor: boolean;
  /** A series capacitor stands between source and load. */
  readonly blockDc: boolean;
  /** Ends whose DC no shunt inductor may short. */
  readonly keepDc: 'none' | 'source' | 'load' | 'both';
}

/** Every ladder of `elements` alternating arms that the rule allows; at most 2·2^n of them. */
export function shapesOf(elements: number, rule: ShapeRule): Shape[] {
  const shapes: Shape[] = [];
  for (let first = 0; first < 2; first += 1) {
    for (let code = 0; code < 2 ** elements; code += 1) {
      const shape = Array.from({ length: elements }, (_, k) => ({
        arm: (k + first) % 2 === 0 ? ('series' as const) : ('shunt' as const),
        part: (code >> k) % 2 === 0 ? ('inductor' as const) : ('capacitor' as const),
      }));
      if (allowed(shape, rule)) shapes.push(shape);
    }
  }
  return shapes;
}

function allowed(shape: Shape, { form, shuntInductor, blockDc, keepDc }: ShapeRule): boolean {
  const lowPass = ({ arm, part }: Shape[number]): boolean => (arm === 'series') === (part === 'inductor');
  if (form === 'low-pass' && !shape.every(lowPass)) return false;
  if (form === 'high-pass' && shape.some(lowPass)) return false;
  const dc = dcPath(shape);
  if (blockDc && !dc.blocked) return false;
  if (dc.sourceShorted && (keepDc === 'source' || keepDc === 'both')) return false;
  if (dc.loadShorted && (keepDc === 'load' || keepDc === 'both')) return false;
  return shuntInductor || !shape.some(({ arm, part }) => arm === 'shunt' && part === 'inductor');
}
