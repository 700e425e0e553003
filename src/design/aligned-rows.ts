const gap = '  ';

/**
 * Rows as columns of plain text; what is too wide for its column goes on below itself. Letters are counted one each.
 *
 * @param widths of each column, letters
 * @param indent before every line
 * @returns lines that end in a line feed, without spaces at their ends
 */
export function alignedRows(rows: readonly (readonly string[])[], widths: readonly number[], indent = ''): string {
  // A column is no wider than what stands in it.
  const cells = rows.map((row) => row.map((text, k) => wrapped(text, widths[k]!)));
  const used = widths.map((_, k) => Math.max(0, ...cells.flatMap((row) => row[k]!.map((line) => lengthOf(line)))));
  return cells
    .flatMap((row) =>
      Array.from({ length: Math.max(...row.map((lines) => lines.length)) }, (_, n) =>
        `${indent}${row.map((lines, k) => padded(lines[n] ?? '', used[k]!)).join(gap)}`.trimEnd(),
      ),
    )
    .map((line) => `${line}\n`)
    .join('');
}

const lengthOf = (text: string): number => Array.from(text).length;
const padded = (text: string, width: number): string => text + ' '.repeat(width - lengthOf(text));

/** Lines of at most so many letters, broken between words where that can be, and where the text itself is. */
function wrapped(text: string, width: number): readonly string[] {
  const lines = text.split(/[\n\r\u2028\u2029]+/u).flatMap((line) => wrappedLine(line, width));
  return lines.length === 0 ? [''] : lines;
}

function wrappedLine(text: string, width: number): readonly string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(/\s+/u).filter((each) => each !== '')) {
    const pieces = piecesOf(word, width);
    for (const piece of pieces) {
      const longer = line === '' ? piece : `${line} ${piece}`;
      if (lengthOf(longer) <= width) line = longer;
      else {
        lines.push(line);
        line = piece;
      }
    }
  }
  return line === '' ? lines : [...lines, line];
}

function piecesOf(word: string, width: number): readonly string[] {
  const letters = Array.from(word);
  return Array.from({ length: Math.ceil(letters.length / width) }, (_, k) =>
    letters.slice(k * width, (k + 1) * width).join(''),
  );
}
