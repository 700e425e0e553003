import { LitElement, css, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import type { FieldName } from '../../src/record/fields.ts';
import { base } from '../base/base.styles.ts';
import { fieldChange } from '../base/field-change.ts';
import { field } from '../base/field.styles.ts';
import { symbol } from '../base/symbol.ts';

/**
 * Text of several lines, as high as it has lines. Beneath it stands what was understood, or in one line why not.
 * @fires field-change  on the user's own input only
 */
@customElement('area-field')
export class AreaField extends LitElement {
  static override shadowRootOptions: ShadowRootInit = { ...LitElement.shadowRootOptions, delegatesFocus: true };
  static override styles = [
    base,
    field,
    css`
      /* Each line of it on one line, scrolled like a field of one line; laid out by itself, as such a field is. */
      :host([single]) textarea {
        contain: strict;
        min-height: 0;
        padding: 0.1875rem 0.375rem;
        line-height: 1.5rem;
        white-space: pre;
        overflow: auto hidden;
        scrollbar-width: none;
        resize: none;
      }
    `,
  ];

  @property() name: FieldName = 'reason';
  /** Visible and accessible name, with the symbol that the calculation uses for it. */
  @property() label = '';
  @property() symbol = '';
  @property() value = '';
  /** What was read, in words; '' when there is nothing to say. */
  @property() understood = '';
  @property() problem = '';
  /** One line high until there are more. */
  @property({ type: Boolean, reflect: true }) single = false;

  override render() {
    const lines = this.value.split('\n').length;
    return html`
      <label for="input">${this.label}${this.symbol === '' ? nothing : html` ${symbol(this.symbol)}`}</label>
      <textarea
        id="input"
        rows=${Math.max(2, lines)}
        .style=${this.single ? `height: ${String(1.5 * lines + 0.4375)}rem` : ''}
        autocomplete="off"
        autocapitalize="off"
        spellcheck=${this.single ? 'false' : 'true'}
        .value=${live(this.value)}
        aria-describedby="note"
        aria-invalid=${this.problem === '' ? nothing : 'true'}
        @input=${this.say}
      ></textarea>
      <p id="note" class=${this.problem === '' ? 'note' : 'note problem'}>${this.problem || this.understood}</p>
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
