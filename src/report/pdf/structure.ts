import { PDFHexString, PDFName, type PDFDict, type PDFDocument, type PDFRef } from 'pdf-lib';
import type { Element } from '../page/element.ts';

/** Where an element stands on the pages: marked content by page, and annotations. */
export interface Drawn {
  readonly page: PDFRef;
  /** By marked-content identifier. */
  readonly elements: readonly Element[];
}

export interface Annotation {
  readonly ref: PDFRef;
  readonly page: PDFRef;
  readonly of: Element;
}

/** Corners of a picture on its page, pt from the lower left. */
export type Box = readonly [number, number, number, number];

/**
 * The report's structure tree (ISO 32000-1, 14.7) with the way back from marked content to it. Keys of the parent tree:
 * the pages in order, then the annotations.
 */
export function writeStructure(
  document: PDFDocument,
  root: Element,
  pages: readonly Drawn[],
  annotations: readonly Annotation[],
  boxes: ReadonlyMap<Element, Box>,
): void {
  const { context, catalog } = document;
  const contents = contentsOf(pages, annotations);
  const refs = new Map<Element, PDFRef>();
  const tree = context.nextRef();

  const write = (element: Element, parent: PDFRef): PDFRef | null => {
    const { role, children, alt } = element;
    const content = contents.get(element);
    const ref = context.nextRef();
    const below = children.flatMap((each) => write(each, ref) ?? []);
    // An empty cell keeps its place in the row; anything else without content is nothing.
    if (content === undefined && below.length === 0 && role !== 'TD' && role !== 'TH') return null;
    const page = content?.marked[0]?.page ?? content?.annotations[0]?.page;
    const kids = [
      ...(content?.marked.map((mark) =>
        mark.page === page ? mark.id : context.obj({ Type: 'MCR', Pg: mark.page, MCID: mark.id }),
      ) ?? []),
      ...below,
      ...(content?.annotations.map((each) => context.obj({ Type: 'OBJR', Obj: each.ref, Pg: each.page })) ?? []),
    ];
    const dict = context.obj({ S: role, P: parent }) as PDFDict;
    if (page !== undefined) dict.set(PDFName.of('Pg'), page);
    if (kids.length > 0)
      dict.set(PDFName.of('K'), kids.length === 1 ? context.obj([...kids]).get(0) : context.obj(kids));
    if (alt !== undefined) dict.set(PDFName.of('Alt'), PDFHexString.fromText(alt));
    const attributes = attributesOf(element, boxes.get(element));
    if (attributes !== null) dict.set(PDFName.of('A'), context.obj(attributes));
    context.assign(ref, dict);
    refs.set(element, ref);
    return ref;
  };
  const top = write(root, tree);
  if (top === null) return;

  const parents = [
    ...pages.map(({ elements }) => context.register(context.obj(elements.map((element) => refs.get(element)!)))),
    ...annotations.map(({ of }) => refs.get(of)!),
  ];
  const parentTree = context.register(context.obj({ Nums: parents.flatMap((parent, key) => [key, parent]) }));
  context.assign(
    tree,
    context.obj({ Type: 'StructTreeRoot', K: top, ParentTree: parentTree, ParentTreeNextKey: parents.length }),
  );
  catalog.set(PDFName.of('StructTreeRoot'), tree);
  catalog.set(PDFName.of('MarkInfo'), context.obj({ Marked: true }));
}

interface Content {
  readonly marked: { readonly page: PDFRef; readonly id: number }[];
  readonly annotations: Annotation[];
}

function contentsOf(pages: readonly Drawn[], annotations: readonly Annotation[]): Map<Element, Content> {
  const contents = new Map<Element, Content>();
  const of = (element: Element): Content => {
    const known = contents.get(element);
    if (known !== undefined) return known;
    const content: Content = { marked: [], annotations: [] };
    contents.set(element, content);
    return content;
  };
  for (const { page, elements } of pages) elements.forEach((element, id) => of(element).marked.push({ page, id }));
  for (const annotation of annotations) of(annotation.of).annotations.push(annotation);
  return contents;
}

type Attributes = Record<string, string | number | number[]>;

/** Standard attributes (ISO 32000-1, 14.8.5) that a reader needs to make sense of a list, a cell or a picture. */
function attributesOf({ role, rowSpan, columnSpan }: Element, box: Box | undefined): Attributes | null {
  if (role === 'TH') return { O: 'Table', Scope: 'Column' };
  if (role === 'L') return { O: 'List', ListNumbering: 'Decimal' };
  if (box !== undefined) return { O: 'Layout', Placement: 'Block', BBox: [...box] };
  if (rowSpan !== undefined) return { O: 'Table', RowSpan: rowSpan };
  return columnSpan === undefined ? null : { O: 'Table', ColSpan: columnSpan };
}
