import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import { repeat } from 'lit/directives/repeat.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Absent, Dossier, Option } from '../../src/dossier.ts';
import '../area-field/area-field.ts';
import { base } from '../base/base.styles.ts';
import type { Choice } from '../base/choice.ts';
import { fieldChange } from '../base/field-change.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { count, decibels, partWords, unbroken } from '../base/words.ts';
import '../radio-field/radio-field.ts';
import '../sections-table/sections-table.ts';
import { verdictMark, verdictStyles } from '../verdict-mark/verdict-mark.ts';
import { styles } from './options-part.styles.ts';
import { thumbnail } from './thumbnail.ts';

/** Above so many parts a drawing stands over the words, not beside them. */
const spread = 4;

const numbers: readonly Choice[] = [
  { value: 'auto', words: 'the smallest that holds the band' },
  ...['1', '2', '3', '4', '5', '6'].map((value) => ({ value, words: value })),
];

/**
 * Part 2: every network that exists with its verdict, and every form that doesn't with the reason.
 * @fires field-change  `sections`, `choice` or `reason`
 */
@customElement('options-part')
export class OptionsPart extends LitElement {
  static override styles = [base, verdictStyles, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** Why the engineer's choice is not in force; '' when it is. */
  @property() notice = '';

  /** The networks of another number of sections are spread out too. */
  @state() private open = false;

  override render() {
    const { fields, problems } = this.state;
    return html`
      ${this.dossier?.sections ? html`<sections-table .table=${this.dossier.sections} .chosen=${this.dossier.chosen ?? ''}></sections-table>` : nothing}
      ${
        fields.method === 'cascade' || fields.method === 'equal-ripple'
          ? html`<radio-field
              name="sections"
              label="Number of sections"
              inline
              .choices=${numbers}
              .value=${fields.sections ?? ''}
              .problem=${problems.sections ?? ''}
            ></radio-field>`
          : nothing
      }
      ${this.notice === '' ? nothing : html`<p class="notice">${this.notice}</p>`}
      ${this.dossier === null ? nothing : this.networks(this.dossier)}
      <area-field
        name="reason"
        label="Why this one (printed in the report)"
        .value=${fields.reason ?? ''}
        .problem=${problems.reason ?? ''}
      ></area-field>
    `;
  }

  private networks({ options, absent, sections, chosen }: Dossier): TemplateResult {
    // Of many sections only the chosen number is spread out; the table above has them all.
    const number = sections === null ? undefined : options.find(({ id }) => id === chosen)?.sections;
    const others = options.filter((option) => number !== undefined && option.sections !== number);
    return html`
      <fieldset>
        <legend class="unseen">Choose a network</legend>
        ${this.list(options.filter((option) => !others.includes(option)))}
        ${
          others.length === 0
            ? nothing
            : html`<details
                class="others"
                @toggle=${(event: Event) => (this.open = (event.target as HTMLDetailsElement).open)}
              >
                <summary>${count(others.length, 'network')} of another number of sections</summary>
                ${this.open ? this.list(others) : nothing}
              </details>`
        }
      </fieldset>
      ${absent.length === 0 ? nothing : absence(absent)}
    `;
  }

  private list(options: readonly Option[]): TemplateResult {
    return html`<ol>
      ${repeat(
        options,
        ({ id }) => id,
        (option) => this.option(option),
      )}
    </ol>`;
  }

  private option(option: Option): TemplateResult {
    const { chosen, chosenBy, proposed } = this.dossier!;
    const input = `network-${option.id}`;
    const pick = () => this.dispatchEvent(fieldChange('choice', option.id));
    return html`
      <li class=${option.id === chosen ? 'option chosen' : 'option'}>
        <input
          type="radio"
          name="network"
          id=${input}
          aria-describedby="verdict-${option.id} reason-${option.id}"
          .checked=${live(option.id === chosen)}
          @change=${pick}
        />
        <div class=${option.arms.length > spread ? 'content long' : 'content'}>
          <div class="drawing" aria-hidden="true" @click=${pick}>${thumbnail(option.arms)}</div>
          <div class="text">
            <div class="head">
              <label class="title" for=${input}>${option.title}</label>
              ${option.id === proposed ? html`<span class="tag">proposed</span>` : nothing}
              ${option.id === chosen && chosenBy !== 'proposal' ? html`<span class="tag">${chosenBy === 'engineer' ? 'chosen' : 'nearest'}</span>` : nothing}
              <span id="verdict-${option.id}">${verdictMark(option.meets ? 'meets' : 'falls short')}</span>
            </div>
            <p class="values">
              ${
                option.arms.length === 0
                  ? 'No part is needed.'
                  : partWords(option).map((words) => html`<span class="value">${words}</span> `)
              }
            </p>
            ${figures(option)}
            <p class="reason" id="reason-${option.id}">${unbroken(option.reasons.join('; '))}</p>
          </div>
        </div>
      </li>
    `;
  }
}

/** Forms that have no network, each with the inequality that fails. */
function absence(absent: readonly Absent[]): TemplateResult {
  return html`<h3>Forms without a network</h3>
    <dl class="absent">
      ${absent.map(
        ({ form, why }) =>
          html`<div>
            <dt>${form}</dt>
            <dd>${unbroken(why)}</dd>
          </div>`,
      )}
    </dl>`;
}

/** The figures by which networks are compared, the same for each and in the same columns. */
function figures(option: Option): TemplateResult {
  const harmonics = option.harmonicDb
    .map(({ attenuationDb }) => (attenuationDb === null ? 'outside the data' : decibels(attenuationDb)))
    .join(', ');
  return html`<dl>
      <div>
        <dt>Worst return loss</dt>
        <dd>${option.worstReturnLossDb === null ? 'no band' : returnLossWords(option.worstReturnLossDb)}</dd>
      </div>
      <div>
        <dt>Half-power band</dt>
        <dd>${option.halfPower.words}</dd>
      </div>
      <div>
        <dt>Attenuation 2<i>f</i><sub>0</sub>, 3<i>f</i><sub>0</sub></dt>
        <dd>${harmonics}</dd>
      </div>
    </dl>
    <p class="form">${option.form}, ${count(option.arms.length, 'part')}. DC: ${option.dc.words}.</p>`;
}

declare global {
  interface HTMLElementTagNameMap {
    'options-part': OptionsPart;
  }
}
