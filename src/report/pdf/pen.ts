import type { Tone } from '../../figures/figure.ts';
import { opacityName } from './opacity.ts';

/** Device RGB, 0 to 1, as operands. Ink on paper and one accent; told apart in black and white too. */
const colours: Record<Tone, string> = {
  ink: '0.086 0.098 0.114',
  muted: '0.333 0.361 0.396',
  faint: '0.8 0.82 0.835',
  accent: '0.043 0.353 0.42',
  limit: '0.086 0.098 0.114',
};

const n = (value: number): string => String(Math.round(value * 100) / 100);

/** Writes the operators of one page's content stream (ISO 32000-1), telling a colour or a width only when it changes. */
export class Pen {
  readonly #parts: string[] = [];
  readonly #height: number;
  #stroke = '';
  #fill = '';
  #width = '';
  #dash = '';
  #font = '';

  /** @param height of the page, pt: callers count down from its top, PDF counts up from its foot. */
  constructor(height: number) {
    this.#height = height;
    // Round joins: a half-circle winding meets the next without a spike.
    this.#parts.push('1 j');
  }

  /** One line of text; `glyphs` in hexadecimal, as the font encodes them. */
  text(x: number, y: number, glyphs: string, font: string, size: number, tone: Tone): void {
    this.#fillWith(tone);
    const face = `/${font} ${n(size)} Tf`;
    this.#parts.push(`BT ${face === this.#font ? '' : `${face} `}${n(x)} ${n(this.#height - y)} Td <${glyphs}> Tj ET`);
    this.#font = face;
  }

  line(x: number, y: number, X: number, Y: number, width: number, tone: Tone): void {
    this.#strokeWith(tone, width, undefined);
    this.#parts.push(`${n(x)} ${n(this.#height - y)} m ${n(X)} ${n(this.#height - Y)} l S`);
  }

  /** Path operators with coordinates already on the page, then stroked or filled. */
  stroke(path: string, tone: Tone, width: number, dash: readonly number[] | undefined): void {
    this.#strokeWith(tone, width, dash);
    this.#parts.push(path, 'S');
  }

  /** @param opacity 0 to 1; what was drawn before shows through */
  fill(path: string, tone: Tone, opacity = 1): void {
    this.#fillWith(tone);
    if (opacity === 1) this.#parts.push(path, 'f');
    else this.#parts.push('q', `/${opacityName(opacity)} gs`, path, 'f', 'Q');
  }

  /** An operator that draws nothing: opens or closes marked content. */
  mark(operator: string): void {
    this.#parts.push(operator);
  }

  toString(): string {
    return this.#parts.join('\n');
  }

  #fillWith(tone: Tone): void {
    const operator = `${colours[tone]} rg`;
    if (operator !== this.#fill) this.#parts.push((this.#fill = operator));
  }

  #strokeWith(tone: Tone, width: number, dash: readonly number[] | undefined): void {
    const colour = `${colours[tone]} RG`;
    if (colour !== this.#stroke) this.#parts.push((this.#stroke = colour));
    const wide = `${n(width)} w`;
    if (wide !== this.#width) this.#parts.push((this.#width = wide));
    const pattern = `[${dash === undefined ? '' : dash.map(n).join(' ')}] 0 d`;
    if (pattern !== this.#dash) this.#parts.push((this.#dash = pattern));
  }
}
