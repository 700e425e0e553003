import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { base } from '../base/base.styles.ts';
import type { Recalled } from '../record-store/draft-keeper.ts';
import type { Keeping } from '../record-store/keeping.ts';
import { styles } from './kept-line.styles.ts';

/**
 * How it stands with keeping what is typed in this browser, and what was typed last time, to go on with.
 *
 * @fires kept-other   the engineer wants to see what another tab made of the document
 * @fires kept-go-on   the engineer goes on with what is offered
 * @fires kept-leave   what is offered stays where it is
 */
@customElement('kept-line')
export class KeptLine extends LitElement {
  static override styles = [base, styles];

  @property({ attribute: false }) keeping: Keeping | null = null;
  @property({ attribute: false }) offer: Recalled | null = null;

  override render() {
    return html`${this.renderOffer()}${this.renderKeeping()}`;
  }

  private renderOffer(): TemplateResult | typeof nothing {
    if (this.offer === null) return nothing;
    const { fields, entry } = this.offer;
    const when = new Date(entry.savedAt).toLocaleString('en-GB', { dateStyle: 'medium', timeStyle: 'short' });
    return html`<p>
      <span>Kept in this browser on ${when}: ${fields.title}, revision ${fields.revision}.</span>
      ${this.button('Go on with it', 'kept-go-on')} ${this.button('Leave it', 'kept-leave')}
    </p>`;
  }

  private renderKeeping(): TemplateResult | typeof nothing {
    const { words = '', state = 'kept' } = this.keeping ?? {};
    if (words === '') return nothing;
    const other = state === 'changed elsewhere' || state === 'kept apart';
    return html`<p role="status">
      <span>${words}</span>${other ? this.button('Show the other', 'kept-other') : nothing}
    </p>`;
  }

  private button(words: string, event: string): TemplateResult {
    return html`<button type="button" @click=${() => this.dispatchEvent(new CustomEvent(event))}>${words}</button>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'kept-line': KeptLine;
  }
}
