import { readFileSync } from 'node:fs';

/** The typeface of reports, as a TrueType file. */
export const fontOf = (weight: 'regular' | 'bold'): Uint8Array =>
  new Uint8Array(readFileSync(new URL(`../../public/fonts/ferrule-${weight}.ttf`, import.meta.url)));
