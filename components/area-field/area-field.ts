import { LitElement, html } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import type { FieldName } from '../../src/record/fields.ts';
import { base } from '../base/base.styles.ts';
import { fieldChange } from '../base/field-change.ts';
import { field } from '../base/field.styles.ts';

/**
 * A few lines in the engineer's own words.
 * @fires field-change  on the user's own input only
 */
@customElement('area-field')
export class AreaField extends LitElement {
  static override shadowRootOptions: ShadowRootInit = { ...LitElement.shadowRootOptions, delegatesFocus: true };
  static override styles = [base, field];

  @property() name: FieldName = 'reason';
  @property() label = '';
  @property() value = '';
  @property() problem = '';

  override render() {
    return html`
      <label for="input">${this.label}</label>
      <textarea
        id="input"
        rows="2"
        .value=${live(this.value)}
        aria-describedby="note"
        aria-invalid=${this.problem === '' ? 'false' : 'true'}
        @input=${this.say}
      ></textarea>
      <p id="note" class="note problem">${this.problem}</p>
    `;
  }

  private say(event: InputEvent) {
    this.dispatchEvent(fieldChange(this.name, (event.target as HTMLTextAreaElement).value));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'area-field': AreaField;
  }
}
