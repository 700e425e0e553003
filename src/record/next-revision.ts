/**
 * The revision after one: A to B, Z to AA, 3 to 4, A1 to A2, 0.9 to 0.10. Letters count only where they stand alone, so
 * that a word isn't taken for a number; such a revision is numbered behind it.
 */
export function nextRevision(revision: string): string {
  const given = revision.trim();
  if (given === '') return 'A';
  const numbered = /^(.*?)(\d+)$/su.exec(given);
  if (numbered !== null) {
    const [, head = '', digits = ''] = numbered;
    return head + String(BigInt(digits) + 1n).padStart(digits.length, '0');
  }
  const lettered = /^(.*?)(?<!\p{L})([A-Z]{1,2}|[a-z]{1,2})$/su.exec(given);
  if (lettered !== null) return lettered[1]! + nextLetters(lettered[2]!);
  return `${given}-2`;
}

function nextLetters(letters: string): string {
  const [first, last] = letters.toUpperCase() === letters ? ['A', 'Z'] : ['a', 'z'];
  const head = letters.slice(0, -1);
  const end = letters.slice(-1);
  if (end !== last) return head + String.fromCharCode(end.charCodeAt(0) + 1);
  return (head === '' ? first : nextLetters(head)) + first;
}
