import { draftMark } from './draft-mark.ts';
import type { Frame } from './frame.ts';
import type { Lettering } from './lettering.ts';
import type { Sheet } from './paginate.ts';
import type { Item } from './piece.ts';
import { rules, space, styles } from './style.ts';
import { clip } from './wrap.ts';

/** What a sheet says of its document. */
export interface Sheets {
  readonly number: string;
  readonly revision: string;
  /** How far the document has come. */
  readonly state: string;
  readonly draft: boolean;
  readonly title: string;
  /** At the foot: what made it, and the digest of its record. */
  readonly foot: string;
}

/** Head and foot of every sheet: document number, revision, state and title; digest and page. Drafts are marked across. */
export function addFurniture(sheets: readonly Sheet[], frame: Frame, words: Sheets, letters: Lettering): void {
  const { size } = styles.small;
  const width = frame.right - frame.left;
  const revision = clip(`Revision ${words.revision}`, 0.2 * width, size, false, letters);
  const number = clip(words.number, 0.35 * width, size, true, letters);
  const beside = frame.left + letters.width(number, size, true) + space.wide;
  const state = beside + letters.width(revision, size, false) + space.wide;
  const room = frame.right - state - letters.width(words.state, size, true) - 2 * space.wide;
  const title = clip(words.title, room, size, false, letters);
  const headY = 38;
  const footY = frame.height - 36;
  const { size: micro } = styles.micro;
  sheets.forEach(({ items }, k) => {
    if (words.draft) items.unshift(draftMark(frame));
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
    write(state, headY, words.state, size, 'ink', true);
    write(frame.right - letters.width(title, size, false), headY, title, size, 'muted');
    items.push(across(headY + 6, rules.line), across(footY - 11, rules.hair));
    write(frame.left, footY, words.foot, micro, 'muted');
    write(frame.right - letters.width(page, size, false), footY, page, size, 'ink');
  });
}
