import { LitElement, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { base } from '../base/base.styles.ts';
import { styles } from './title-block.styles.ts';

/** Head of the document: what it is called, what identifies it, and the outcome in a sentence or two. */
@customElement('title-block')
export class TitleBlock extends LitElement {
  static override styles = [base, styles];

  /** Of the sheet: "Complex terminations". */
  @property() sheet = '';
  /** Texts as typed in the last part. */
  @property({ attribute: false }) identity: {
    readonly title: string;
    readonly number: string;
    readonly revision: string;
    readonly date: string;
    readonly ticket: string;
  } = { title: '', number: '', revision: '', date: '', ticket: '' };
  @property() outcome = '';
  /** Why the outcome is of an earlier entry; '' when it isn't. */
  @property({ reflect: true, converter: { toAttribute: (words: string) => (words === '' ? null : '') } }) stale = '';

  override render() {
    const { title, number, revision, date, ticket } = this.identity;
    const rows = [
      ['Document', number],
      ['Revision', revision],
      ['Date', date],
      ['Ticket', ticket],
    ].filter(([, text]) => text !== '');
    return html`
      <header>
        <p class="sheet">Calculation sheet: ${this.sheet.toLowerCase()}</p>
        <h1>${title || 'Untitled'}</h1>
        <dl>
          ${rows.map(
            ([name, text]) =>
              html`<div>
                <dt>${name}</dt>
                <dd>${text}</dd>
              </div>`,
          )}
        </dl>
      </header>
      ${this.stale !== '' ? html`<p class="stale">${this.stale}</p>` : nothing}
      <p class="outcome">${this.outcome}</p>
    `;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'title-block': TitleBlock;
  }
}
