import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

/** A node of the structure as another program reads it, with the text of its own marked content. */
export interface Node {
  readonly role: string;
  readonly alt: string | undefined;
  readonly text: string;
  /** Annotations that belong to it. */
  readonly objects: number;
  readonly children: readonly Node[];
}

export interface Structure {
  /** One tree a page. */
  readonly pages: readonly Node[];
  /** Texts outside the structure, page by page. */
  readonly artifacts: readonly (readonly string[])[];
  /** Texts in no marked content at all. */
  readonly loose: readonly string[];
}

interface RawNode {
  readonly role: string;
  readonly alt?: string;
  readonly children: readonly (RawNode | Leaf)[];
}

interface Leaf {
  readonly type: string;
  readonly id: string;
}

/** The tags of a PDF file, and what is left without one. */
export async function readStructure(bytes: Uint8Array): Promise<Structure> {
  const task = getDocument({ data: bytes.slice(), verbosity: 0 });
  const document = await task.promise;
  const pages: Node[] = [];
  const artifacts: string[][] = [];
  const loose: string[] = [];
  for (let k = 1; k <= document.numPages; k += 1) {
    const page = await document.getPage(k);
    const content = await page.getTextContent({ includeMarkedContent: true, disableNormalization: true });
    const texts = new Map<string, string>();
    const outside: string[] = [];
    const open: (string | null)[] = [];
    for (const item of content.items) {
      if ('str' in item) {
        const of = open.at(-1);
        if (of === undefined && item.str.trim() !== '') loose.push(item.str);
        else if (of === null) outside.push(item.str);
        else if (of !== undefined) texts.set(of, (texts.get(of) ?? '') + item.str);
      } else if (item.type === 'endMarkedContent') {
        open.pop();
      } else {
        open.push('id' in item && typeof item.id === 'string' ? item.id : null);
      }
    }
    artifacts.push(outside);
    pages.push(nodeOf((await page.getStructTree()) as unknown as RawNode, texts));
  }
  await task.destroy();
  return { pages, artifacts, loose };
}

function nodeOf({ role, alt, children }: RawNode, texts: ReadonlyMap<string, string>): Node {
  const leaves = children.filter((each): each is Leaf => !('role' in each));
  return {
    role,
    alt,
    text: leaves.map(({ id }) => texts.get(id) ?? '').join(''),
    objects: leaves.filter(({ type }) => type !== 'content').length,
    children: children.filter((each): each is RawNode => 'role' in each).map((each) => nodeOf(each, texts)),
  };
}

/** Nodes of a role, wherever they are. */
export const nodesOf = (node: Node, role: string): readonly Node[] => [
  ...(node.role === role ? [node] : []),
  ...node.children.flatMap((each) => nodesOf(each, role)),
];
