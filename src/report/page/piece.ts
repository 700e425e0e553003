import type { Figure, Tone } from '../../figures/figure.ts';
import type { Element, Furniture } from './element.ts';

/** What is known once everything has its sheet. */
export interface Places {
  readonly sheets: number;
  /** Sheet, from 1, on which the part with this bookmark begins; 0: there is none. */
  readonly sheetOf: (bookmark: string) => number;
}

/** A text that counts sheets is written once there are sheets. */
export type Words = string | ((places: Places) => string);

/** What an item is part of; nothing: it only divides or underlines. */
interface Belonging {
  readonly of?: Element | Furniture;
}

/** What is drawn, in pt from the left of the sheet and down from the top of its piece (or, once placed, of the sheet). */
export type Item = Belonging & Drawn;

type Drawn =
  | {
      readonly kind: 'text';
      readonly x: number;
      /** Baseline. */
      readonly y: number;
      readonly text: Words;
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
    }
  | {
      /** Leads to the part with this bookmark. */
      readonly kind: 'link';
      readonly x: number;
      readonly y: number;
      readonly X: number;
      readonly Y: number;
      readonly bookmark: string;
    }
  | {
      /** Room for a digital signature. */
      readonly kind: 'signature';
      readonly x: number;
      readonly y: number;
      readonly X: number;
      readonly Y: number;
      readonly name: string;
      /** What is to be signed, for whoever signs. */
      readonly label: string;
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

/** The same items as parts of an element; rules stay what they are. */
export const within = (element: Element, items: readonly Item[]): readonly Item[] =>
  items.map((item) => (item.kind === 'rule' ? item : { ...item, of: element }));

/** The same items, repeated around the text and no part of it any more. */
export const asHeader = (items: readonly Item[]): readonly Item[] => items.map((item) => ({ ...item, of: 'header' }));

export const shift = <I extends Item>(item: I, dy: number): I =>
  'Y' in item ? { ...item, y: item.y + dy, Y: item.Y + dy } : { ...item, y: item.y + dy };

/** Extent of an item from top to bottom. */
export function extent(item: Item): readonly [number, number] {
  if (item.kind === 'text') return [item.y - item.size, item.y + 0.3 * item.size];
  if (item.kind === 'figure') return [item.y, item.y + item.scale * item.figure.height];
  return [Math.min(item.y, item.Y), Math.max(item.y, item.Y)];
}
