import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { lacksForIssue } from '../../src/design/issuing.ts';
import type { Dossier } from '../../src/dossier.ts';
import type { FieldName } from '../../src/record/fields.ts';
import '../area-field/area-field.ts';
import { base } from '../base/base.styles.ts';
import type { Choice } from '../base/choice.ts';
import type { FieldChange } from '../base/field-change.ts';
import { fieldChange } from '../base/field-change.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { field } from '../base/field.styles.ts';
import { count, unbroken } from '../base/words.ts';
import '../radio-field/radio-field.ts';
import '../start-revision/start-revision.ts';
import '../text-field/text-field.ts';
import { deviating, withDeviation, type Deviating } from './deviations.ts';
import { styles } from './sign-off.styles.ts';

const signers = ['prepared', 'checked', 'approved'] as const;
const states: readonly Choice[] = [
  { value: 'draft', words: 'draft' },
  { value: 'for review', words: 'for review' },
];

/**
 * Who answers for the record: signatures, what falls short and is accepted in writing, what lacks before issue, and the
 * issue itself.
 * @fires field-change  of the sign-off, and `deviations`
 */
@customElement('sign-off')
export class SignOff extends LitElement {
  static override styles = [base, field, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** Why the dossier isn't whole, or isn't that of the entries; '' where it is. */
  @property() unready = '';
  /** The record is issued, and can be read. */
  @property({ type: Boolean }) frozen = false;
  /** Something was changed since it was issued. */
  @property({ type: Boolean }) waiting = false;
  /** Why the next revision can't be started, in one line. */
  @property() revisionSaid = '';

  @state() private said = '';

  override render() {
    const { fields } = this.state;
    const option = this.dossier?.options.find(({ id }) => id === this.dossier?.chosen);
    return html`
      <h3>Sign-off</h3>
      ${signers.map(
        (signer) => html`
          <fieldset class="signer">
            <legend>${signer.charAt(0).toUpperCase()}${signer.slice(1)}</legend>
            ${this.text(`${signer}-name`, 'Name')} ${this.text(`${signer}-role`, 'Role')}
            ${this.text(`${signer}-date`, 'Date')}
            <area-field
              class="remark"
              single
              .name=${`${signer}-remark` as const}
              label="Remark"
              .value=${fields[`${signer}-remark`] ?? ''}
              .problem=${this.state.problems[`${signer}-remark`] ?? ''}
            ></area-field>
          </fieldset>
        `,
      )}
      ${this.deviations(deviating(fields.deviations ?? '', option))} ${this.frozen ? this.issued() : this.open()}
    `;
  }

  private text(name: FieldName, label: string): TemplateResult {
    const { fields, problems } = this.state;
    return html`<text-field
      .name=${name}
      .label=${label}
      .value=${fields[name] ?? ''}
      .problem=${problems[name] ?? ''}
    ></text-field>`;
  }

  private deviations(all: readonly Deviating[]): TemplateResult | typeof nothing {
    if (all.length === 0) return nothing;
    const problem = this.state.problems.deviations ?? '';
    return html`<h3>Deviations</h3>
      ${all.map(
        ({ subject, why, reason }) =>
          html`<div class="deviation" @field-change=${(event: CustomEvent<FieldChange>) => this.accept(event, subject)}>
            <p>
              ${
                why === ''
                  ? html`A deviation is written for <strong>${subject}</strong>, which doesn’t fall short: empty the
                      line to leave it out.`
                  : html`<strong>${subject.charAt(0).toUpperCase()}${subject.slice(1)}</strong> falls short:
                      ${unbroken(why)}.`
              }
            </p>
            <text-field
              name="deviations"
              label="Accept in writing: reason"
              .of=${`${subject}:`}
              .value=${reason}
            ></text-field>
          </div>`,
      )}
      ${problem === '' ? nothing : html`<p class="note problem">${problem}</p>`}`;
  }

  /** A line of the field stands in a field of its own. */
  private accept(event: CustomEvent<FieldChange>, subject: string) {
    event.stopPropagation();
    const text = withDeviation(this.state.fields.deviations ?? '', subject, event.detail.value);
    this.dispatchEvent(fieldChange('deviations', text));
  }

  private issued(): TemplateResult {
    const lacks = this.lacks();
    return html`<h3>Issued</h3>
      ${
        lacks.length === 0
          ? nothing
          : html`<p>It is marked as issued, though by today’s figures something lacks:</p>
              ${list(lacks)}`
      }
      ${
        this.waiting
          ? html`<p>What was changed since waits for the next revision.</p>`
          : html`<start-revision
              .issued=${this.state.fields.revision ?? ''}
              .typed=${this.state.fields.revision ?? ''}
              .said=${this.revisionSaid}
            ></start-revision>`
      }`;
  }

  private open(): TemplateResult {
    const lacks = this.lacks();
    return html`<h3 id="lacks">What lacks before issue</h3>
      <div class="lacks" role="group" aria-labelledby="lacks" tabindex="-1">
        ${lacks.length === 0 ? html`<p>Nothing: it may be issued.</p>` : list(lacks)}
      </div>
      <div class="state">
        <radio-field
          inline
          name="state"
          label="State"
          .choices=${states}
          .value=${this.state.fields.state ?? 'draft'}
          .problem=${this.state.problems.state ?? ''}
        ></radio-field>
        <button type="button" class="main" aria-disabled=${lacks.length > 0} @click=${this.issue}>Issue</button>
      </div>
      <p class="outcome" role="status">${this.said}</p>`;
  }

  private lacks(): readonly string[] {
    const { dossier, unready } = this;
    return [...(unready === '' ? [] : [unready]), ...(dossier === null ? [] : lacksForIssue(dossier))];
  }

  private issue() {
    const lacks = this.lacks();
    if (lacks.length === 0) {
      this.said = '';
      this.dispatchEvent(fieldChange('state', 'issued'));
      return;
    }
    this.said = `Not issued: ${count(lacks.length, 'thing')} ${lacks.length === 1 ? 'lacks' : 'lack'}.`;
    this.renderRoot.querySelector<HTMLElement>('.lacks')?.focus();
  }
}

const list = (lacks: readonly string[]): TemplateResult =>
  html`<ul>
    ${lacks.map((words) => html`<li>${unbroken(words.charAt(0).toUpperCase() + words.slice(1))}</li>`)}
  </ul>`;

declare global {
  interface HTMLElementTagNameMap {
    'sign-off': SignOff;
  }
}
