import type { Figure, Shape } from '../../../src/figures/figure.ts';
import { textWidth } from '../../../src/figures/text-width.ts';

interface Box {
  readonly text: string;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

function boxOf(shape: Extract<Shape, { kind: 'text' }>): Box {
  const width = textWidth(shape.text, shape.size, shape.bold ?? false);
  const left = shape.x - (shape.anchor === 'start' ? 0 : shape.anchor === 'middle' ? width / 2 : width);
  // Height of capitals and depth of descenders.
  const [top, bottom] = [shape.y - 0.72 * shape.size, shape.y + 0.2 * shape.size];
  return { text: shape.text, left, right: left + width, top, bottom };
}

export const textsOf = (figure: Figure): readonly Box[] =>
  figure.shapes.filter((shape) => shape.kind === 'text').map(boxOf);

/** Pairs of texts that lie over each other. */
export function overlaps(figure: Figure): readonly string[] {
  const boxes = textsOf(figure);
  return boxes.flatMap((a, k) =>
    boxes
      .slice(k + 1)
      .filter((b) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom)
      .map((b) => `${a.text} / ${b.text}`),
  );
}

/** Texts that reach out of the figure. */
export const outside = (figure: Figure): readonly string[] =>
  textsOf(figure)
    .filter(
      ({ left, right, top, bottom }) =>
        left < -0.5 || right > figure.width + 0.5 || top < -0.5 || bottom > figure.height + 0.5,
    )
    .map(({ text }) => text);
