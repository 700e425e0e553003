/**
 * First name that one object of a JSON text gives twice; null when none does. JSON.parse would keep the last one and
 * say nothing; RFC 8785, by way of RFC 7493, allows no such document.
 *
 * @param text valid JSON
 */
export function repeatedName(text: string): string | null {
  const open: Set<string>[] = [];
  // Strings are taken whole, so that a brace or a colon inside one isn't mistaken for the document's own.
  for (const [token, string, colon] of text.matchAll(/("(?:[^"\\]+|\\.)*")(\s*:)?|[{}]/gu)) {
    if (token === '{') open.push(new Set());
    else if (token === '}') open.pop();
    else if (string !== undefined && colon !== undefined) {
      const name = JSON.parse(string) as string;
      const names = open.at(-1);
      if (names?.has(name) === true) return name;
      names?.add(name);
    }
  }
  return null;
}
