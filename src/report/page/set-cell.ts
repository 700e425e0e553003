import type { Figure } from '../../figures/figure.ts';
import type { Cell } from './block.ts';
import { child, type Element } from './element.ts';
import type { Lettering } from './lettering.ts';
import { shift, within, type Item } from './piece.ts';
import { setParagraph, type Set } from './set-paragraph.ts';
import { space } from './style.ts';

/** Where a column stands on the sheet. */
export interface Place {
  readonly x: number;
  readonly width: number;
  readonly align: 'start' | 'end';
}

/** A cell's paragraphs, pictures and room for a signature, one under the other; its first top at y = 0. */
export function setCell(cell: Cell, { x, width, align }: Place, letters: Lettering, element: Element): Set {
  const items: Item[] = [];
  let y = 0;
  for (const content of cell) {
    if (!('kind' in content)) {
      const set = setParagraph(content, x, width, letters, align);
      const own = cell.length === 1 ? element : child(element, 'P');
      items.push(...within(own, set.items).map((item) => shift(item, y)));
      y += set.height;
    } else if (content.kind === 'picture') {
      const { figure } = content;
      const scale = Math.min(content.scale, width / figure.width);
      items.push({ kind: 'figure', x, y: y + space.hair, scale, figure, of: pictured(figure, element) });
      y += figure.height * scale + space.tight;
    } else {
      const { name, label, height } = content;
      items.push({ kind: 'signature', x, y, X: x + width, Y: y + height, name, label, of: child(element, 'Form') });
      y += height;
    }
  }
  return { items, height: y };
}

/** A figure's element, with the words that stand in for it. */
export const pictured = ({ title, description }: Figure, parent: Element): Element =>
  child(parent, 'Figure', { alt: title === '' ? description : `${title}. ${description}` });
