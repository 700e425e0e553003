import { LitElement, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { base } from '../base/base.styles.ts';
import { basisLinks } from '../base/basis-links.ts';
import { verdictMark, verdictStyles, type Verdict } from '../verdict-mark/verdict-mark.ts';
import { styles } from './sheet-part.styles.ts';

/**
 * One numbered part of the document: its number and its formulas in the margin, its name and verdict as a heading.
 * @slot  the part's content
 */
@customElement('sheet-part')
export class SheetPart extends LitElement {
  static override styles = [base, verdictStyles, styles];

  @property({ type: Number }) number = 0;
  @property() name = '';
  @property() verdict: Verdict = 'not assessed';
  @property() words = '';
  /** Numbers in the basis of calculation that the part rests on: "B3". */
  @property({ attribute: false }) basis: readonly string[] = [];
  /** Why the figures belong to an earlier entry; '' when they don't. */
  @property({ reflect: true, converter: { toAttribute: (words: string) => (words === '' ? null : '') } }) stale = '';

  override render() {
    return html`
      <section aria-labelledby="heading">
        <div class="margin">
          <span class="number" aria-hidden="true">${this.number}</span>
          ${
            this.basis.length === 0
              ? nothing
              : html`<p class="basis" aria-label="Basis of calculation">${basisLinks(this.basis)}</p>`
          }
        </div>
        <div class="body">
          <header>
            <h2 id="heading" tabindex="-1"><span class="inline">${this.number}</span> ${this.name}</h2>
            ${verdictMark(this.verdict, this.words || this.verdict)}
          </header>
          ${this.stale !== '' ? html`<p class="stale">${this.stale}</p>` : nothing}
          <slot></slot>
        </div>
      </section>
    `;
  }

  /** Brings the part into view and moves the reading position to its heading. */
  reveal() {
    this.scrollIntoView({ block: 'start' });
    this.renderRoot.querySelector<HTMLElement>('#heading')?.focus({ preventScroll: true });
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'sheet-part': SheetPart;
  }
}
