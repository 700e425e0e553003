import { LitElement, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { FieldName } from '../../src/record/fields.ts';
import { base } from '../base/base.styles.ts';
import type { Choice } from '../base/choice.ts';
import { fieldChange } from '../base/field-change.ts';
import { field } from '../base/field.styles.ts';
import { symbol } from '../base/symbol.ts';

/**
 * One of a few, in a list that folds. A text from a link that is none of them stays, as a choice of its own.
 * @fires field-change  on the user's own choice only
 */
@customElement('choice-field')
export class ChoiceField extends LitElement {
  static override shadowRootOptions: ShadowRootInit = { ...LitElement.shadowRootOptions, delegatesFocus: true };
  static override styles = [base, field];

  @property() name: FieldName = 'source-behaviour';
  @property() label = '';
  @property() symbol = '';
  /** Said before the label to those who don't see where the field stands. */
  @property() of = '';
  @property({ attribute: false }) choices: readonly Choice[] = [];
  @property() value = '';
  @property() problem = '';

  override render() {
    const known = this.choices.some((choice) => choice.value === this.value);
    return html`
      <label for="select"
        >${this.of === '' ? nothing : html`<span class="unseen">${this.of}</span>`}
        ${this.label}${this.symbol === '' ? nothing : html` ${symbol(this.symbol)}`}</label
      >
      <select
        id="select"
        aria-describedby=${this.problem === '' ? nothing : 'note'}
        aria-invalid=${this.problem === '' ? nothing : 'true'}
        @change=${this.say}
      >
        ${known ? nothing : html`<option .value=${this.value} selected>${this.value}</option>`}
        ${this.choices.map(
          ({ value, words }) => html`<option .value=${value} .selected=${value === this.value}>${words}</option>`,
        )}
      </select>
      ${this.problem === '' ? nothing : html`<p id="note" class="note problem">${this.problem}</p>`}
    `;
  }

  private say(event: Event) {
    this.dispatchEvent(fieldChange(this.name, (event.target as HTMLSelectElement).value));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'choice-field': ChoiceField;
  }
}
