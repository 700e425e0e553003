import type { Figure, Tone } from '../../figures/figure.ts';
import type { Words } from './piece.ts';
import type { Style } from './style.ts';

/** A report's content before it has places: what follows what, and what stays together. */
export type Block = Heading | Text | List | Facts | Contents | Table | Picture;

export interface Span {
  readonly text: string;
  readonly bold?: boolean;
  readonly tone?: Tone;
}

export interface Paragraph {
  readonly spans: readonly Span[];
  readonly style?: Style;
}

/** Opens a numbered part, or (without number) a division of one. Never stands alone at the foot of a page. */
export interface Heading {
  readonly kind: 'heading';
  readonly number?: number;
  readonly text: string;
}

export interface Text {
  readonly kind: 'text';
  readonly paragraph: Paragraph;
  /** A bar at its left, for a verdict. */
  readonly bar?: boolean;
  /** Stands apart from what is before it. */
  readonly opens?: boolean;
  /** Stays with what follows. */
  readonly keep?: boolean;
}

/** Paragraphs behind hanging marks: A1, A2, ... */
export interface List {
  readonly kind: 'list';
  readonly entries: readonly { readonly mark: string; readonly paragraph: Paragraph }[];
}

/** Name over value, so many in a row. A value that counts sheets is written once there are sheets. */
export interface Facts {
  readonly kind: 'facts';
  readonly columns: number;
  readonly entries: readonly { readonly name: string; readonly value: Words }[];
}

/** Numbered parts with the sheet on which each begins. */
export interface Contents {
  readonly kind: 'contents';
  readonly columns: number;
  readonly entries: readonly { readonly number: number; readonly text: string }[];
}

export interface Column {
  readonly title: string;
  /** Share of the text width. */
  readonly share: number;
  readonly align?: 'end';
}

export type Cell = readonly (Paragraph | Picture | SignatureSpace)[];

/** Room for a signature, by hand or by a program that signs PDF. */
export interface SignatureSpace {
  readonly kind: 'signature';
  /** Of the form field. */
  readonly name: string;
  /** What is to be signed. */
  readonly label: string;
  /** pt */
  readonly height: number;
}

export interface Row {
  readonly cells: readonly Cell[];
  /** A bar in the margin beside it. */
  readonly marked?: boolean;
  /** Set under the cells of the columns from the one of this index on, over their whole width. */
  readonly below?: { readonly from: number; readonly paragraphs: readonly Paragraph[] };
}

export interface Table {
  readonly kind: 'table';
  readonly columns: readonly Column[];
  readonly rows: readonly Row[];
  /** Stays whole, and with what follows. */
  readonly together?: boolean;
}

export interface Picture {
  readonly kind: 'picture';
  readonly figure: Figure;
  readonly caption?: string;
  /** Largest scale at which it is drawn; smaller where the width asks for it. */
  readonly scale: number;
}

/** A numbered part's name in the outline, by which contents lead to it. */
export const bookmarkOf = (number: number, heading: string): string => `${String(number)} ${heading}`;

export const plain = (text: string, style?: Style): Paragraph =>
  style === undefined ? { spans: [{ text }] } : { spans: [{ text }], style };

export const text = (content: string, style?: Style): Text => ({ kind: 'text', paragraph: plain(content, style) });
