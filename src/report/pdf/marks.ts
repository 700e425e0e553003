import type { Element, Furniture } from '../page/element.ts';
import type { Pen } from './pen.ts';

const pagination: Readonly<Record<Furniture, string>> = {
  header: '/Artifact <</Type/Pagination/Subtype/Header>> BDC',
  footer: '/Artifact <</Type/Pagination/Subtype/Footer>> BDC',
  watermark: '/Artifact <</Type/Pagination/Subtype/Watermark>> BDC',
};

/**
 * Marked content of one page (ISO 32000-1, 14.6 to 14.8): says ahead of what is drawn which element of the structure it
 * belongs to, or that it is an artifact, no part of the text.
 */
export class Marks {
  /** Elements by marked-content identifier. */
  readonly elements: Element[] = [];
  readonly #pen: Pen;
  #open: Element | Furniture | 'rule' | null = null;

  constructor(pen: Pen) {
    this.#pen = pen;
  }

  /** What is drawn from here on is part of this. */
  belong(to: Element | Furniture | undefined): void {
    const next = to ?? 'rule';
    if (next === this.#open) return;
    this.close();
    this.#open = next;
    if (next === 'rule') this.#pen.mark('/Artifact BMC');
    else if (typeof next === 'string') this.#pen.mark(pagination[next]);
    else this.#pen.mark(`/${next.role} <</MCID ${String(this.elements.push(next) - 1)}>> BDC`);
  }

  close(): void {
    if (this.#open !== null) this.#pen.mark('EMC');
    this.#open = null;
  }
}
