/** One row, with the line that it begins in, counted from 1; cells without blanks around them. */
export interface Row {
  readonly line: number;
  readonly cells: readonly string[];
}

export interface SeparatedValues {
  readonly rows: readonly Row[];
  /** Rows after these, counted and not taken apart. */
  readonly more: number;
  /** Line of a quotation mark that nothing closes, or that something other than a separator follows; null: none. */
  readonly brokenQuote: number | null;
}

/**
 * Splits comma-separated values (RFC 4180) into rows; semicolons or tabs separate where the first row has any. Lines
 * that are empty, have nothing but separators or begin with # are passed over.
 *
 * @param most rows that are taken apart; of more, a line counts as one
 */
export function separatedValues(given: string, most: number): SeparatedValues {
  const text = given.replace(/^\uFEFF/u, '').replaceAll(/\r\n?/gu, '\n');
  const rows: Row[] = [];
  let separator: string | null = null;
  let more = 0;
  let line = 0;
  for (let at = 0; at < text.length;) {
    const end = endOf(text, at);
    const plain = text.slice(at, end);
    line += 1;
    const next = end + 1;
    // A spreadsheet may have put a comment in quotes.
    if (/^\s*"?#/u.test(plain) || !/[^\s,;]/u.test(plain)) {
      at = next;
      continue;
    }
    separator ??= plain.includes('\t') ? '\t' : plain.includes(';') ? ';' : ',';
    if (rows.length >= most) {
      more += 1;
      at = next;
    } else if (!plain.includes('"')) {
      rows.push({ line, cells: plain.split(separator).map((cell) => cell.trim()) });
      at = next;
    } else {
      const quoted = quotedRow(text, at, separator);
      if (quoted === null) return { rows, more, brokenQuote: line };
      rows.push({ line, cells: quoted.cells });
      line += quoted.breaks;
      at = quoted.next;
    }
  }
  return { rows, more, brokenQuote: null };
}

function endOf(text: string, from: number): number {
  const end = text.indexOf('\n', from);
  return end < 0 ? text.length : end;
}

/**
 * A row with quotation marks in it, where the next begins, and the line breaks inside its cells; null: a mark is never
 * closed, or something other than a separator follows.
 */
function quotedRow(
  text: string,
  from: number,
  separator: string,
): { readonly cells: string[]; readonly next: number; readonly breaks: number } | null {
  const cells: string[] = [];
  let breaks = 0;
  for (let at = from; ;) {
    const start = skipBlanks(text, at);
    let end: number;
    if (text[start] === '"') {
      const close = closingQuote(text, start);
      if (close === null) return null;
      end = skipBlanks(text, close + 1);
      const content = text.slice(start + 1, close).replaceAll('""', '"');
      breaks += content.split('\n').length - 1;
      cells.push(content.trim());
    } else {
      end = start;
      while (end < text.length && text[end] !== separator && text[end] !== '\n') end += 1;
      cells.push(text.slice(start, end).trim());
    }
    if (end >= text.length || text[end] === '\n') return { cells, next: end + 1, breaks };
    if (text[end] !== separator) return null;
    at = end + 1;
  }
}

function skipBlanks(text: string, from: number): number {
  let at = from;
  while (text[at] === ' ') at += 1;
  return at;
}

/** Two marks in a row stand for one inside the cell. */
function closingQuote(text: string, open: number): number | null {
  for (let at = open + 1; ;) {
    const mark = text.indexOf('"', at);
    if (mark < 0) return null;
    if (text[mark + 1] !== '"') return mark;
    at = mark + 2;
  }
}
