import type { Arm } from '../network/arm.ts';
import { formatQuantity } from '../quantity/format.ts';
import { label, line, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';
import { earth, generator, impedance, junction, part } from './symbols.ts';
import { textWidth } from './text-width.ts';

const wire = { stroke: 'ink', width: stroke.line } as const;
const size = 9;
const leading = 11;
/** Wire from source to load, and the line on which every earth symbol hangs. */
const wireY = 46;
const earthY = 132;
const middleY = (wireY + earthY) / 2;
const height = 146;
const gap = 9;

/**
 * The network between its terminations, source on the left, with designators and values to four significant digits.
 * Labels of series arms stand over the wire, those of shunt arms to the right of the part, so that neither can meet
 * the other; each side keeps its own right-hand edge.
 *
 * @param arms         from source to load; values in H or F
 * @param designators  of the same length
 * @param sourceText   the generator's internal impedance in a few letters: "50 Ω"
 * @param loadText     the same of the load: "9.4 − j61 Ω", "2 states"
 */
export function schematic(
  arms: readonly Arm[],
  designators: readonly string[],
  sourceText: string,
  loadText: string,
): Figure {
  const shapes: Shape[] = [];
  const write = (x: number, y: number, name: string, value: string, anchor: 'start' | 'middle'): number => {
    shapes.push(label(x, y, name, size, anchor, 'ink', true), label(x, y + leading, value, size, anchor));
    return Math.max(textWidth(name, size, true), textWidth(value, size));
  };
  /** A part between the wire and earth, its label to the right; gives the label's right-hand edge. */
  const hang = (x: number, kind: 'inductor' | 'capacitor' | 'load', name: string, value: string): number => {
    const placed = kind === 'load' ? impedance(x, middleY, 'down') : part(kind, x, middleY, 'down');
    const clear = kind === 'capacitor' ? 13 : 10;
    shapes.push(line(x, wireY, x, middleY - placed.reach, wire), ...placed.shapes);
    shapes.push(line(x, middleY + placed.reach, x, earthY, wire), earth(x, earthY));
    return x + clear + write(x + clear, middleY - 2, name, value, 'start');
  };

  const sourceX = 16;
  const feed = generator(sourceX, middleY);
  shapes.push(...feed.shapes, earth(sourceX, earthY), line(sourceX, middleY + feed.reach, sourceX, earthY, wire));
  shapes.push(line(sourceX, wireY, sourceX, middleY - feed.reach, wire));
  const sourceWidth = Math.max(textWidth('Source', size, true), textWidth(sourceText, size));
  const inner = impedance(0, 0, 'across').reach;
  const sourceCentre = Math.max(sourceX + 8 + inner, sourceWidth / 2 + 2);
  write(sourceCentre, wireY - 23, 'Source', sourceText, 'middle');
  shapes.push(line(sourceX, wireY, sourceCentre - inner, wireY, wire));
  shapes.push(...impedance(sourceCentre, wireY, 'across').shapes);

  /** End of the wire so far, and the right-hand edges of what is written over and under it. */
  let end = sourceCentre + inner;
  let over = sourceCentre + sourceWidth / 2;
  let under = sourceX + feed.reach;
  const lead = (x: number): void => {
    shapes.push(line(end, wireY, x, wireY, wire));
    end = x;
  };

  arms.forEach((arm, index) => {
    const name = designators[index] ?? '';
    const value = formatQuantity(arm.value, arm.part === 'inductor' ? 'H' : 'F');
    if (arm.arm === 'series') {
      const half = Math.max(textWidth(name, size, true), textWidth(value, size)) / 2;
      const reach = part(arm.part, 0, 0, 'across').reach;
      // A capacitor is short: it keeps a winding's distance to the junction before it.
      const x = Math.max(end + 8 + Math.max(reach, 8), over + gap + half);
      lead(x - reach);
      shapes.push(...part(arm.part, x, wireY, 'across').shapes);
      write(x, wireY - 23, name, value, 'middle');
      end = x + reach;
      over = x + half;
    } else {
      const x = Math.max(end + 12, under + gap + (arm.part === 'capacitor' ? 9 : 2));
      lead(x);
      shapes.push(junction(x, wireY));
      under = hang(x, arm.part, name, value);
    }
  });

  const loadX = Math.max(end + 20, under + gap + 5);
  lead(loadX);
  const right = hang(loadX, 'load', 'Load', loadText);
  return {
    width: Math.ceil(Math.max(right, over)) + 2,
    height,
    title: 'Schematic',
    description: describe(arms, designators, sourceText, loadText),
    shapes,
  };
}

/** The network in words, in the order of its arms. */
function describe(arms: readonly Arm[], designators: readonly string[], source: string, load: string): string {
  const parts = arms.map(
    (arm, index) =>
      `${arm.arm} ${arm.part} ${designators[index] ?? ''} ${formatQuantity(arm.value, arm.part === 'inductor' ? 'H' : 'F')}`,
  );
  const between = parts.length === 0 ? 'a direct connection, no part' : parts.join(', ');
  return `From the source (${source}) to the load (${load}): ${between}.`;
}
