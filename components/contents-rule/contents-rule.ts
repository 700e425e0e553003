import { LitElement, css, html } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { base } from '../base/base.styles.ts';
import { verdictMark, verdictStyles, type Verdict } from '../verdict-mark/verdict-mark.ts';

export interface ContentsEntry {
  readonly number: number;
  readonly name: string;
  readonly verdict: Verdict;
  readonly words: string;
}

/**
 * The thin rule beside the document: every part with its verdict.
 * @fires reveal-part  detail: the part's number
 */
@customElement('contents-rule')
export class ContentsRule extends LitElement {
  static override styles = [
    base,
    verdictStyles,
    css`
      nav {
        border-left: 1px solid var(--hairline);
      }

      button {
        display: grid;
        grid-template-columns: 1.25rem minmax(0, 1fr);
        width: 100%;
        min-height: 0;
        padding: 0.5rem 0.25rem 0.5rem 0.875rem;
        border: 0;
        text-align: left;
        font-size: var(--small);
        line-height: 1.35;
        background: none;
      }

      button:hover .name {
        text-decoration: underline;
        text-underline-offset: 0.2em;
      }

      .number {
        color: var(--accent);
        font-weight: 700;
      }

      .verdict {
        grid-column: 2;
      }
    `,
  ];

  @property({ attribute: false }) entries: readonly ContentsEntry[] = [];

  override render() {
    return html`<nav aria-label="Parts of this sheet">
      <ol>
        ${this.entries.map(
          ({ number, name, verdict, words }) => html`
            <li>
              <button type="button" @click=${() => this.ask(number)}>
                <span class="number">${number}</span> <span class="name">${name}</span> ${verdictMark(verdict, words)}
              </button>
            </li>
          `,
        )}
      </ol>
    </nav>`;
  }

  private ask(number: number) {
    this.dispatchEvent(new CustomEvent('reveal-part', { detail: number }));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'contents-rule': ContentsRule;
  }
}
