import type { Tone } from '../../figures/figure.ts';
import type { Paragraph, Span } from './block.ts';
import type { Lettering } from './lettering.ts';
import { styles } from './style.ts';

/** A run of letters of one weight and tone within a line; x from the line's start, pt. */
export interface Run {
  readonly x: number;
  readonly text: string;
  readonly bold: boolean;
  readonly tone: Tone;
}

export interface Line {
  readonly runs: readonly Run[];
  readonly width: number;
}

interface Word {
  readonly text: string;
  readonly width: number;
  readonly span: Span;
  /** A space stands before it. */
  readonly spaced: boolean;
}

/**
 * Lines of a paragraph no wider than `width` pt. Breaks at spaces; a word wider than a line breaks where it must, so
 * that nothing is ever cut off. At least one line, an empty one for an empty paragraph.
 */
export function wrap(paragraph: Paragraph, width: number, letters: Lettering): readonly Line[] {
  const { size } = styles[paragraph.style ?? 'body'];
  const lines: Line[] = [];
  let runs: Run[] = [];
  let x = 0;
  const close = (spaced = false): void => {
    const last = runs.at(-1);
    // A line's end is a space to whoever hears or copies the text.
    if (spaced && last !== undefined) runs[runs.length - 1] = { ...last, text: `${last.text} ` };
    lines.push({ runs, width: x });
    runs = [];
    x = 0;
  };
  const put = ({ text, span }: Word, wide: number, spaced: boolean): void => {
    const bold = span.bold ?? false;
    const tone = span.tone ?? 'ink';
    const last = runs.at(-1);
    const gap = spaced ? letters.width(' ', size, bold) : 0;
    if (last !== undefined && last.bold === bold && last.tone === tone) {
      runs[runs.length - 1] = { ...last, text: last.text + (spaced ? ' ' : '') + text };
    } else {
      runs.push({ x, text: (spaced ? ' ' : '') + text, bold, tone });
    }
    x += gap + wide;
  };
  for (const word of wordsOf(paragraph.spans, size, letters)) {
    const gap = word.spaced && x > 0 ? letters.width(' ', size, word.span.bold ?? false) : 0;
    if (x + gap + word.width <= width) {
      put(word, word.width, gap > 0);
    } else if (word.width <= width) {
      close(word.spaced);
      put(word, word.width, false);
    } else {
      let first = true;
      for (const piece of broken(word, x + gap, width, size, letters)) {
        if (piece.fresh) close(first && word.spaced);
        first = false;
        put({ ...word, text: piece.text }, piece.width, !piece.fresh && gap > 0);
      }
    }
  }
  if (runs.length > 0 || lines.length === 0) close();
  return lines;
}

function wordsOf(spans: readonly Span[], size: number, letters: Lettering): readonly Word[] {
  const words: Word[] = [];
  for (const span of spans) {
    const clean = letters.printable(span.text);
    // printable trims; whether the span continues the word before it shows in what was given.
    let spaced =
      words.length > 0 && (/^\s/u.test(span.text) || /\s$/u.test(spans[spans.indexOf(span) - 1]?.text ?? ''));
    for (const text of clean.split(' ')) {
      if (text === '') continue;
      words.push({ text, width: letters.width(text, size, span.bold ?? false), span, spaced });
      spaced = true;
    }
  }
  return words;
}

/** A word wider than a line, cut to what is left of this line and to whole lines after it. */
function* broken(
  { text, span }: Word,
  start: number,
  width: number,
  size: number,
  letters: Lettering,
): Generator<{ readonly text: string; readonly width: number; readonly fresh: boolean }> {
  let part = '';
  let wide = 0;
  // A stub of a few letters at the end of a line helps no one.
  let fresh = width - start < 4 * size;
  let room = fresh ? width : width - start;
  for (const letter of text) {
    const step = letters.width(letter, size, span.bold ?? false);
    if (wide + step > room && part !== '') {
      yield { text: part, width: wide, fresh };
      [part, wide, fresh, room] = ['', 0, true, width];
    }
    part += letter;
    wide += step;
  }
  if (part !== '') yield { text: part, width: wide, fresh };
}

/** A text cut to one line of `width` pt, with an ellipsis where something is left out. */
export function clip(content: string, width: number, size: number, bold: boolean, letters: Lettering): string {
  const clean = letters.printable(content);
  if (letters.width(clean, size, bold) <= width) return clean;
  let kept = '';
  for (const letter of clean) {
    if (letters.width(`${kept}${letter}…`, size, bold) > width) break;
    kept += letter;
  }
  return `${kept.trimEnd()}…`;
}
