const narrow = new Set("iIjlft.,:;·|'!()[] ");
const wide = new Set('mwMW%@Ωω∞→');

/**
 * Upper estimate of a text's width, pt: figures are drawn without knowing the font, and labels must never collide.
 * Digits of the project's typeface are 0.6 em wide.
 */
export function textWidth(text: string, size: number): number {
  let em = 0;
  for (const letter of text) em += narrow.has(letter) ? 0.38 : wide.has(letter) ? 0.9 : 0.63;
  return em * size;
}
