/** Standard structure types (ISO 32000-1, 14.8.4) that a report is made of. */
export type Role =
  | 'Document'
  | 'H1'
  | 'H2'
  | 'H3'
  | 'P'
  | 'L'
  | 'LI'
  | 'Lbl'
  | 'LBody'
  | 'TOC'
  | 'TOCI'
  | 'Link'
  | 'Table'
  | 'TR'
  | 'TH'
  | 'TD'
  | 'Figure'
  | 'Caption'
  | 'Form';

/** A node of the report's structure: what a thing on a page is to someone who hears the page instead of seeing it. */
export interface Element {
  readonly role: Role;
  /** In the order in which they are read. */
  readonly children: Element[];
  /** Words in place of a picture. */
  readonly alt?: string;
  /** Of a cell: how many rows and columns it reaches over, where it is more than one. */
  readonly rowSpan?: number;
  readonly columnSpan?: number;
}

/** What repeats around the text on every sheet; it is no part of the text. */
export type Furniture = 'header' | 'footer' | 'watermark';

export const documentElement = (): Element => ({ role: 'Document', children: [] });

/** A new last child of an element. */
export function child(parent: Element, role: Role, more: Omit<Element, 'role' | 'children'> = {}): Element {
  const element: Element = { role, children: [], ...more };
  parent.children.push(element);
  return element;
}
