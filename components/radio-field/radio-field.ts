import { LitElement, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import type { FieldName } from '../../src/record/fields.ts';
import { base } from '../base/base.styles.ts';
import type { Choice } from '../base/choice.ts';
import { fieldChange } from '../base/field-change.ts';
import { field } from '../base/field.styles.ts';
import { styles } from './radio-field.styles.ts';

/**
 * One of a few, all in view.
 * @fires field-change  on the user's own choice only
 */
@customElement('radio-field')
export class RadioField extends LitElement {
  static override styles = [base, field, styles];

  @property() name: FieldName = 'aim';
  @property() label = '';
  @property({ attribute: false }) choices: readonly Choice[] = [];
  @property() value = '';
  @property() note = '';
  @property() problem = '';
  /** Choices side by side. */
  @property({ type: Boolean, reflect: true }) inline = false;

  override render() {
    const words = this.problem || this.note;
    return html`
      <fieldset aria-describedby=${words === '' ? nothing : 'note'}>
        <legend class="label">${this.label}</legend>
        <div class="choices">
          ${this.choices.map(
            (choice) => html`
              <label>
                <input
                  type="radio"
                  name="choice"
                  value=${choice.value}
                  .checked=${live(choice.value === this.value)}
                  @change=${this.say}
                />
                <span>${choice.words}</span>
              </label>
            `,
          )}
        </div>
        ${words === '' ? nothing : html`<p id="note" class=${this.problem === '' ? 'note' : 'note problem'}>${words}</p>`}
      </fieldset>
    `;
  }

  private say(event: Event) {
    this.dispatchEvent(fieldChange(this.name, (event.target as HTMLInputElement).value));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'radio-field': RadioField;
  }
}
