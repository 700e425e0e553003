import type { Arm } from '../network/arm.ts';
import type { DcPath } from '../network/dc-path.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';

/** Board strays are of this order, F; a winding's own capacitance rules an RF inductor above this, H. */
const strayF = 1e-12;
const windingH = 1e-5;

/**
 * Cautions by rules of thumb (common practice, no source), each with its reason. They never hide an option.
 *
 * @param sectionQ Q of the network's sections: above 10 the match is narrow and the losses of real parts count
 */
export function rulesOfThumb(
  arms: readonly Arm[],
  designators: readonly string[],
  dc: DcPath,
  sectionQ: number,
): string[] {
  const cautions: string[] = [];
  arms.forEach(({ part, value }, k) => {
    const name = designators[k]!;
    if (part === 'capacitor' && value < strayF) {
      cautions.push(
        `${name} ${formatQuantity(value, 'F')} is below about 1 pF: board strays of the same order add to it or replace it.`,
      );
    }
    if (part === 'inductor' && value > windingH) {
      cautions.push(
        `${name} ${formatQuantity(value, 'H')} is above about 10 µH: the winding's own capacitance may rule its impedance.`,
      );
    }
  });
  if (dc.sourceShorted && dc.loadShorted) cautions.push('A shunt inductor shorts DC to ground at both ends.');
  else if (dc.sourceShorted) cautions.push('A shunt inductor shorts DC to ground at the source.');
  else if (dc.loadShorted) cautions.push('A shunt inductor shorts DC to ground at the load.');
  if (dc.blocked) cautions.push('A series capacitor blocks DC between source and load.');
  if (sectionQ > 10) {
    cautions.push(
      `Section Q ${formatFixed(sectionQ, sectionQ < 100 ? 1 : 0)} is above 10: losses of real parts will cost power, and small errors will move the match.`,
    );
  }
  return cautions;
}
