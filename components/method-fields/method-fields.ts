import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { FieldName } from '../../src/record/fields.ts';
import type { Method } from '../../src/record/design-record.ts';
import { base } from '../base/base.styles.ts';
import type { Choice } from '../base/choice.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { methodChoices, methodWords, serves } from '../base/methods.ts';
import '../choice-field/choice-field.ts';
import '../radio-field/radio-field.ts';
import '../text-field/text-field.ts';
import { forms, numbers, shuntInductors, sizes } from './choices.ts';

/** By which method networks are found, why one would want it, and the fields that belong to it alone. */
@customElement('method-fields')
export class MethodFields extends LitElement {
  static override styles = [
    base,
    css`
      :host {
        margin-bottom: 1.25rem;
      }

      .method {
        display: grid;
        grid-template-columns: minmax(0, 14rem) minmax(0, 1fr);
        gap: 0.25rem 1.25rem;
        align-items: end;
      }

      .method p {
        padding-bottom: 0.3125rem;
        color: var(--muted);
        font-size: var(--small);
        line-height: 1.35;
      }

      .fields {
        display: grid;
        grid-template-columns: repeat(auto-fill, minmax(11rem, 1fr));
        gap: 0.5rem 1.25rem;
        margin-top: 0.75rem;
      }

      .wide {
        grid-column: 1 / -1;
      }

      radio-field {
        margin-top: 0.75rem;
      }

      @container (max-width: 30rem) {
        .method {
          grid-template-columns: minmax(0, 1fr);
        }
      }
    `,
  ];

  /** Of the sheet: the first of those that it serves. */
  @property() sheet: Method = 'two-element';
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** For which Q a Pi or T exists and which is taken, in words; '' while that isn't known. */
  @property() qWords = '';

  override render() {
    const { fields, problems } = this.state;
    const { method } = fields;
    return html`
      <div class="method">
        ${this.choice('method', 'Method', methodChoices(this.sheet))}
        <p>${serves(this.sheet, method) ? methodWords[method].why : ''}</p>
      </div>
      ${this.fields(method)}
      ${
        method === 'cascade' || method === 'equal-ripple'
          ? html`<radio-field
              name="sections"
              label="Number of sections"
              inline
              .choices=${numbers[method]}
              .value=${fields.sections ?? ''}
              .problem=${problems.sections ?? ''}
            ></radio-field>`
          : nothing
      }
    `;
  }

  private fields(method: string | undefined): TemplateResult | typeof nothing {
    const chosenQ = method === 'pi' || method === 'tee' || method === 'all';
    const searched = method === 'fitted' || method === 'all';
    if (!chosenQ && !searched) return nothing;
    return html`<div class="fields">
      ${
        searched
          ? html`${this.choice('elements', 'Elements of fitted networks', sizes)}
            ${this.choice('fit-form', 'Their form', forms)}
            ${this.choice('shunt-inductor', 'Their shunt inductors', shuntInductors)}
            ${this.text('fit-seed', 'Seed of the search', '')}`
          : nothing
      }
      ${chosenQ ? this.text('q', 'Q of Pi and T, at the steeper end', this.qWords) : nothing}
    </div>`;
  }

  private text(name: FieldName, label: string, words: string): TemplateResult {
    const { fields, problems } = this.state;
    return html`<text-field
      class=${words === '' ? '' : 'wide'}
      .name=${name}
      .label=${label}
      .value=${fields[name] ?? ''}
      .understood=${words}
      .problem=${problems[name] ?? ''}
    ></text-field>`;
  }

  private choice(name: FieldName, label: string, choices: readonly Choice[]): TemplateResult {
    return html`<choice-field
      .name=${name}
      .label=${label}
      .choices=${choices}
      .value=${this.state.fields[name] ?? ''}
      .problem=${this.state.problems[name] ?? ''}
    ></choice-field>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'method-fields': MethodFields;
  }
}
