import type { Lettering } from './lettering.ts';
import type { Sheet } from './paginate.ts';
import type { Item } from './piece.ts';
import { rules, space, styles } from './style.ts';
import { clip } from './wrap.ts';

/** Measures of a sheet, pt. */
export interface Frame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const millimetre = 72 / 25.4;
const papers = { a4: [210 * millimetre, 297 * millimetre], letter: [612, 792] } as const;

/** Left margin for filing, as drawing sheets have it (ISO 5457: 20 mm). */
export function frameOf(paper: 'a4' | 'letter'): Frame {
  const [width, height] = papers[paper];
  return { width, height, left: 20 * millimetre, right: width - 15 * millimetre, top: 62, bottom: height - 56 };
}

/** Head and foot of every sheet: document number, revision and title; digest and page. */
export function addFurniture(
  sheets: readonly Sheet[],
  frame: Frame,
  words: { readonly number: string; readonly revision: string; readonly title: string; readonly digest: string },
  letters: Lettering,
): void {
  const { size } = styles.small;
  const width = frame.right - frame.left;
  const revision = clip(`Revision ${words.revision}`, 0.2 * width, size, false, letters);
  const number = clip(words.number, 0.35 * width, size, true, letters);
  const beside = frame.left + letters.width(number, size, true) + space.wide;
  const room = frame.right - beside - letters.width(revision, size, false) - 2 * space.wide;
  const title = clip(words.title, room, size, false, letters);
  const headY = 38;
  const footY = frame.height - 36;
  const { size: micro } = styles.micro;
  sheets.forEach(({ items }, k) => {
    const page = `Page ${String(k + 1)} of ${String(sheets.length)}`;
    const write = (x: number, y: number, text: string, pt: number, tone: 'ink' | 'muted', bold = false): void => {
      items.push({ kind: 'text', x, y, text, size: pt, bold, tone, of: y === headY ? 'header' : 'footer' });
    };
    const across = (y: number, wide: number): Item => ({
      kind: 'rule',
      x: frame.left,
      y,
      X: frame.right,
      Y: y,
      width: wide,
      tone: 'ink',
    });
    write(frame.left, headY, number, size, 'ink', true);
    write(beside, headY, revision, size, 'ink');
    write(frame.right - letters.width(title, size, false), headY, title, size, 'muted');
    items.push(across(headY + 6, rules.line), across(footY - 11, rules.hair));
    write(frame.left, footY, `SHA-256 of the record ${words.digest}`, micro, 'muted');
    write(frame.right - letters.width(page, size, false), footY, page, size, 'ink');
  });
}
