import { LitElement, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import type { FieldName } from '../../src/record/fields.ts';
import { base } from '../base/base.styles.ts';
import { fieldChange } from '../base/field-change.ts';
import { field } from '../base/field.styles.ts';
import { symbol } from '../base/symbol.ts';

/**
 * One line of text on a rule, never changed by the sheet. Beneath it stands what was understood, or in one line why not.
 * @fires field-change  on the user's own input only
 */
@customElement('text-field')
export class TextField extends LitElement {
  static override shadowRootOptions: ShadowRootInit = { ...LitElement.shadowRootOptions, delegatesFocus: true };
  static override styles = [base, field];

  @property() name: FieldName = 'frequency';
  /** Visible and accessible name, with the symbol that the calculation uses for it. */
  @property() label = '';
  @property() symbol = '';
  /** Said before the label to those who don't see where the field stands. */
  @property() of = '';
  @property() value = '';
  /** What was read, in words; '' when there is nothing to say. */
  @property() understood = '';
  /** One line: why it can't be used and what would do. */
  @property() problem = '';
  /** Shown while the field is empty. */
  @property() empty = '';

  override render() {
    return html`
      <label for="input"
        >${this.of === '' ? nothing : html`<span class="unseen">${this.of}</span> `}${this.label}${this.symbol === '' ? nothing : html` ${symbol(this.symbol)}`}</label
      >
      <input
        id="input"
        autocomplete="off"
        autocapitalize="off"
        spellcheck="false"
        .value=${live(this.value)}
        aria-describedby="note"
        aria-invalid=${this.problem === '' ? nothing : 'true'}
        @input=${this.say}
      />
      <p id="note" class=${this.problem === '' ? 'note' : 'note problem'}>
        ${this.problem || this.understood || this.empty}
      </p>
    `;
  }

  private say(event: InputEvent) {
    this.dispatchEvent(fieldChange(this.name, (event.target as HTMLInputElement).value));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'text-field': TextField;
  }
}
