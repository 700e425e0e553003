/** Text of any kind as a cell of a Markdown table: one line, and nothing in it that Markdown would take for its own. */
export const markdownCell = (text: string): string =>
  text
    .trim()
    .replace(/[\\`*_[\]<>|~#]/gu, (mark) => `\\${mark}`)
    .replaceAll('&', '&amp;')
    .replace(/\s*[\n\r\u2028\u2029]+\s*/gu, '<br>');
