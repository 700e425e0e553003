/** Advance widths of the project's typeface from U+0020 to U+007E, thousandths of an em. */
const widths = [
  236, 284, 419, 713, 598, 927, 694, 242, 335, 335, 450, 600, 272, 399, 272, 383, 600, 600, 600, 600, 600, 600, 600,
  600, 600, 600, 292, 292, 600, 600, 600, 477, 891, 641, 653, 621, 671, 583, 559, 695, 707, 400, 510, 634, 501, 812,
  707, 708, 606, 708, 640, 581, 572, 678, 609, 891, 613, 593, 580, 317, 383, 317, 600, 565, 600, 534, 580, 503, 580,
  549, 324, 528, 568, 250, 250, 527, 272, 873, 568, 560, 580, 580, 367, 487, 351, 568, 492, 768, 507, 499, 464, 343,
  314, 343, 600,
] as const;

/** Ω, the widest letter outside ASCII that a figure writes. */
const other = 716;
/** The bold weight's letters are at most so much wider in a word. */
const boldRatio = 1.05;

/**
 * Width of a text, pt: figures are drawn without a font at hand, and labels must neither collide nor stand apart.
 * On a page that falls back to another typeface it is an estimate.
 */
export function textWidth(text: string, size: number, bold = false): number {
  let units = 0;
  for (const letter of text) units += widths[(letter.codePointAt(0) ?? 0) - 0x20] ?? other;
  return (units * size * (bold ? boldRatio : 1)) / 1000;
}
