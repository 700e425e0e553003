import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, query, state } from 'lit/decorators.js';
import { base } from '../base/base.styles.ts';
import { field } from '../base/field.styles.ts';
import { pathOf } from '../ferrule-sheet/address.ts';
import { stateOf, textOf } from '../record-store/documents.ts';
import type { Entry } from '../record-store/entry.ts';
import { keptAddress } from '../record-store/kept-address.ts';
import { styles } from './kept-entry.styles.ts';
import { keptWords, nameOf, revisionWords } from './words.ts';

/** What is to be done with an entry. */
export type EntryAct =
  | { readonly act: 'duplicate' | 'save' | 'delete'; readonly entry: Entry }
  | { readonly act: 'rename'; readonly entry: Entry; readonly title: string; readonly number: string };

/**
 * One draft or one issued revision, and what can be done with it.
 * @fires entry-act  detail: an EntryAct
 */
@customElement('kept-entry')
export class KeptEntry extends LitElement {
  static override styles = [base, field, styles];

  @property({ attribute: false }) entry!: Entry;
  /** Where it differs from the heading that it stands under. */
  @property() ownTitle = '';
  @property() note = '';

  @state() private renaming = false;
  @query('a') private readonly link!: HTMLAnchorElement;
  @query('#title') private readonly titleField!: HTMLInputElement;
  @query('#number') private readonly numberField!: HTMLInputElement;

  override render() {
    const { entry } = this;
    const { sheet, id, kind } = entry;
    const name = nameOf(entry);
    return html`
      <div class="line">
        <a href=${`${import.meta.env.BASE_URL}${pathOf(sheet) ?? ''}#${keptAddress(id)}`} aria-label=${`Open ${name}`}
          >${revisionWords(entry)}</a
        >
        <span class="state">${stateOf(entry)}${kind === 'issued' ? ', frozen' : ''}</span>
        <span class="date">${textOf(entry, 'date')}</span>
        <span class="kept">${keptWords(entry)}</span>
        <span class="acts">
          ${this.button('Duplicate', name, () => this.act({ act: 'duplicate', entry }))}
          ${kind === 'issued' ? html`<span></span>` : this.button('Rename', name, this.rename, this.renaming)}
          ${this.button('Save as a file', name, () => this.act({ act: 'save', entry }))}
          ${this.button('Delete', name, () => this.act({ act: 'delete', entry }))}
        </span>
      </div>
      ${this.ownTitle === '' ? nothing : html`<p class="muted">${this.ownTitle}</p>`}
      ${this.note === '' ? nothing : html`<p class="note">${this.note}</p>`} ${this.renaming ? this.form() : nothing}
    `;
  }

  override focus() {
    this.link.focus();
  }

  private button(words: string, name: string, act: () => void, open?: boolean): TemplateResult {
    return html`<button type="button" aria-label=${`${words}: ${name}`} aria-expanded=${open ?? nothing} @click=${act}>
      ${words}
    </button>`;
  }

  private form(): TemplateResult {
    return html`<form @submit=${this.submit} @keydown=${this.escape}>
      <p>
        <label for="title">Title</label>
        <input id="title" autocomplete="off" maxlength="120" .value=${textOf(this.entry, 'title')} />
      </p>
      <p>
        <label for="number">Document number</label>
        <input id="number" autocomplete="off" maxlength="120" .value=${textOf(this.entry, 'number')} />
      </p>
      <button class="main">Rename</button>
      <button type="button" @click=${this.leave}>Cancel</button>
    </form>`;
  }

  private readonly rename = () => {
    this.renaming = !this.renaming;
    if (this.renaming) void this.updateComplete.then(() => this.titleField.select());
  };

  private submit(event: SubmitEvent) {
    event.preventDefault();
    this.act({ act: 'rename', entry: this.entry, title: this.titleField.value, number: this.numberField.value });
    this.renaming = false;
  }

  private escape(event: KeyboardEvent) {
    if (event.key === 'Escape') this.leave();
  }

  private leave() {
    this.renaming = false;
    this.renderRoot.querySelector<HTMLButtonElement>('[aria-expanded]')?.focus();
  }

  private act(detail: EntryAct) {
    this.dispatchEvent(new CustomEvent('entry-act', { detail, bubbles: true, composed: true }));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'kept-entry': KeptEntry;
  }
}
