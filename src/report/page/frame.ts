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
