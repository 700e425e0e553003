import type { Figure, Tone } from '../../figures/figure.ts';

/** What is drawn, in pt from the left of the sheet and down from the top of its piece (or, once placed, of the sheet). */
export type Item =
  | {
      readonly kind: 'text';
      readonly x: number;
      /** Baseline. */
      readonly y: number;
      readonly text: string | ((sheets: number) => string);
      readonly size: number;
      readonly bold: boolean;
      readonly tone: Tone;
    }
  | {
      readonly kind: 'rule';
      readonly x: number;
      readonly y: number;
      readonly X: number;
      readonly Y: number;
      readonly width: number;
      readonly tone: Tone;
    }
  | {
      readonly kind: 'figure';
      readonly x: number;
      readonly y: number;
      readonly scale: number;
      readonly figure: Figure;
    };

/** The smallest thing that a page break respects: a line, a table row, a figure with its caption. */
export interface Piece {
  /** Space over it; dropped at the head of a page. */
  readonly before: number;
  readonly height: number;
  readonly items: readonly Item[];
  /** Stays on the page of the piece after it. */
  readonly keep: boolean;
  /** Repeated over it when it opens a page: its table's head. */
  readonly header?: Piece;
  /** Name in the document's outline. */
  readonly bookmark?: string;
}

export const shift = (item: Item, dy: number): Item =>
  item.kind === 'rule' ? { ...item, y: item.y + dy, Y: item.Y + dy } : { ...item, y: item.y + dy };

/** Extent of an item from top to bottom. */
export function extent(item: Item): readonly [number, number] {
  if (item.kind === 'text') return [item.y - item.size, item.y + 0.3 * item.size];
  if (item.kind === 'rule') return [Math.min(item.y, item.Y), Math.max(item.y, item.Y)];
  return [item.y, item.y + item.scale * item.figure.height];
}
