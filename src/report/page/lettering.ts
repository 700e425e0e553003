import type { Typeface } from './typeface.ts';

/** Stands for a character that the typeface can't draw. */
export const missing = '□';

/** Both weights of the report's typeface, with every width worked out once. */
export interface Lettering {
  /** Width of a text, pt. */
  readonly width: (text: string, size: number, bold: boolean) => number;
  /** The text as it can be drawn: what the typeface lacks becomes a visible mark, never nothing. */
  readonly printable: (text: string) => string;
}

/** Joiners, direction marks and the like: they draw nothing, and left out they change no letter. */
const invisible = /[\u00ad\u034f\u061c\u200b-\u200f\u202a-\u202e\u2060-\u206f\ufe00-\ufe0f\ufeff]/gu;
// eslint-disable-next-line no-control-regex -- a control character in a name must not reach the page
const blank = /(?:[^\S\u00a0]|[\u0000-\u001f\u007f-\u009f])+/gu;
/** A space that belongs to a quantity: before its unit, and around the sign of an impedance. */
const beforeUnit = /(?<=\d) (?=(?:[TGMkmµnpfa]?(?:Hz|Ω|H|F|W|V|A)|dB|%)(?![\p{L}\d]))/gu;
/** A writer's apostrophe and quotation marks where a typewriter's were typed. */
const apostrophe = /(?<=\p{L})'/gu;
const quoted = /(?<![^\s(])"([^"\s](?:[^"]*[^"\s])?)"(?![\p{L}\d])/gu;
const aroundSign = /(?<=[\d∞]) ([−+]) (?=j\d)/gu;

export function lettering(regular: Typeface, bold: Typeface): Lettering {
  const widths = [measure(regular), measure(bold)] as const;
  return {
    width: (text, size, heavy) => widths[heavy ? 1 : 0](text) * size,
    printable: (text) => {
      const clean = text.normalize('NFC').replace(invisible, '').replace(blank, ' ').trim();
      const marked = clean.replace(apostrophe, '’').replace(quoted, '“$1”');
      const whole = marked.replace(beforeUnit, '\u00a0').replace(aroundSign, '\u00a0$1\u00a0');
      let out = '';
      for (const letter of whole) {
        const code = letter.codePointAt(0) ?? 0;
        out += regular.glyphs.has(code) && bold.glyphs.has(code) ? letter : missing;
      }
      return out;
    },
  };
}

/** Width of a text in em; the widths of the characters met are kept. */
function measure({ glyphs, advance, unitsPerEm }: Typeface): (text: string) => number {
  const known = new Float64Array(0x10000).fill(-1);
  return (text) => {
    let em = 0;
    for (let k = 0; k < text.length; k += 1) {
      const code = text.charCodeAt(k);
      let width = known[code] ?? -1;
      if (width < 0) {
        width = advance(glyphs.get(code) ?? 0) / unitsPerEm;
        known[code] = width;
      }
      em += width;
    }
    return em;
  };
}
