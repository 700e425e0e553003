import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';

export interface Word {
  readonly text: string;
  readonly x: number;
  /** Baseline, pt up from the foot. */
  readonly y: number;
  readonly width: number;
  readonly size: number;
}

export interface Read {
  readonly pages: readonly (readonly Word[])[];
  readonly text: string;
  readonly info: Readonly<Record<string, unknown>>;
  readonly language: string | null;
  readonly outline: readonly string[];
}

/** A PDF file as another program reads it. */
export async function readPdf(bytes: Uint8Array): Promise<Read> {
  const task = getDocument({ data: bytes.slice(), verbosity: 0 });
  const document = await task.promise;
  const pages: Word[][] = [];
  for (let k = 1; k <= document.numPages; k += 1) {
    const content = await (await document.getPage(k)).getTextContent({ disableNormalization: true });
    pages.push(
      content.items.flatMap((item) =>
        'str' in item && item.str.trim() !== ''
          ? [{ text: item.str, x: item.transform[4], y: item.transform[5], width: item.width, size: item.transform[0] }]
          : [],
      ),
    );
  }
  const { info } = await document.getMetadata();
  const outline = (await document.getOutline()) as readonly { readonly title: string }[] | null;
  const language = (info as { Language?: string | null }).Language ?? null;
  await task.destroy();
  return {
    pages,
    text: pages.map((words) => words.map(({ text }) => text).join(' ')).join('\n'),
    info: info as Readonly<Record<string, unknown>>,
    language,
    outline: (outline ?? []).map(({ title }) => title),
  };
}

/** Pairs of texts on a page that lie over each other by more than a hair. */
export function overlaps(words: readonly Word[]): readonly string[] {
  return words.flatMap((a, k) =>
    words
      .slice(k + 1)
      .filter(
        (b) =>
          Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x) > 0.5 &&
          Math.min(a.y + 0.68 * a.size, b.y + 0.68 * b.size) - Math.max(a.y, b.y) > 0.5,
      )
      .map((b) => `${a.text} / ${b.text}`),
  );
}
