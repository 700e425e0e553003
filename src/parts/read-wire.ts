import { normalise, readQuantity } from '../quantity/read-quantity.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';
import { power } from '../quantity/elementary.ts';

const would = 'write it as 0.8 mm or AWG 20';

/** Wires that a coil can be wound of by hand, m. */
const thinnest = 0.01e-3;
const thickest = 20e-3;

/** Reads the diameter of a wire, m: `0.8 mm`, or an American wire gauge from 0 to 40, `AWG 18` or `18 AWG`. */
export function readWire(text: string): Reading<number> {
  const given = normalise(text);
  const gauge = /^(?:awg\s*#?\s*(\d+)|#?(\d+)\s*awg)$/iu.exec(given);
  if (gauge !== null) {
    const number = Number(gauge[1] ?? gauge[2]);
    return number <= 40 ? read(gaugeDiameter(number)) : refuse('a gauge is from 0 to 40', would);
  }
  if (/awg/iu.test(given)) return refuse('not a gauge', would);
  // A number alone may be millimetres or a gauge as well as metres.
  if (/^[\d.,]+$/u.test(given)) return refuse('the unit is missing', would);
  const diameter = readQuantity(given, 'm');
  if (!diameter.ok) return refuse(diameter.why, would);
  return diameter.value >= thinnest && diameter.value <= thickest
    ? diameter
    : refuse('a wire is from 0.01 mm to 20 mm thick', would);
}

/** ASTM B258: 36 is 0.127 mm, 0000 is 92 times as thick, and every step between has the same ratio. */
const gaugeDiameter = (gauge: number): number => 0.127e-3 * power(92, (36 - gauge) / 39);
