import type { Figure } from '../../figures/figure.ts';
import type { Lettering } from '../page/lettering.ts';
import type { Font } from './font.ts';
import { pathOperators } from './path.ts';
import type { Pen } from './pen.ts';

export interface Fonts {
  readonly regular: Font;
  readonly bold: Font;
  readonly letters: Lettering;
}

/**
 * Draws a figure with its upper left corner at (x, y), pt right and down from the page's upper left.
 *
 * @param height  of the page, pt
 * @param scale   page pt per figure pt
 */
export function drawFigure(
  pen: Pen,
  figure: Figure,
  x: number,
  y: number,
  scale: number,
  height: number,
  { regular, bold, letters }: Fonts,
): void {
  for (const shape of figure.shapes) {
    if (shape.kind === 'path') {
      const path = pathOperators(shape.d, x, height - y, scale);
      if (shape.fill !== undefined) pen.fill(path, shape.fill, shape.fillOpacity);
      if (shape.stroke !== undefined) {
        pen.stroke(
          path,
          shape.stroke,
          (shape.width ?? 1) * scale,
          shape.dash?.map((length) => length * scale),
        );
      }
      continue;
    }
    const heavy = shape.bold ?? false;
    const text = letters.printable(shape.text);
    const size = shape.size * scale;
    const width = shape.anchor === 'start' ? 0 : letters.width(text, size, heavy);
    const left = x + shape.x * scale - (shape.anchor === 'middle' ? width / 2 : width);
    const font = heavy ? bold : regular;
    pen.text(left, y + shape.y * scale, font.encode(text), font.name, size, shape.tone);
  }
}
