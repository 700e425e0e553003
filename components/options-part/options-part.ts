import { LitElement, html, nothing, type PropertyValues, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Absent, Built, Dossier, Option } from '../../src/dossier.ts';
import { formatFixed } from '../../src/quantity/format.ts';
import type { Method } from '../../src/record/design-record.ts';
import '../area-field/area-field.ts';
import { base } from '../base/base.styles.ts';
import { fieldChange } from '../base/field-change.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { optionVerdict, realFigure } from '../base/real-figure.ts';
import { builtPartWords, count, decibels, harmonics, partWords, stressWords, unbroken } from '../base/words.ts';
import '../method-fields/method-fields.ts';
import { verdictStyles } from '../verdict-mark/verdict-mark.ts';
import { styles } from './options-part.styles.ts';
import { thumbnail } from './thumbnail.ts';

/** Above so many parts a drawing stands over the words, not beside them. */
const spread = 4;

/** Above so many networks a table stands for the list. */
const listed = 16;

/**
 * Part 3: every network that exists with its verdict, and every form that doesn't with the reason.
 * @fires field-change  the method with its fields, `choice` or `reason`
 */
@customElement('options-part')
export class OptionsPart extends LitElement {
  static override styles = [base, verdictStyles, styles];

  /** Of the sheet: the first method of those that it serves. */
  @property() sheet: Method = 'two-element';
  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** Why the engineer's choice is not in force; '' when it is. */
  @property() notice = '';

  /** The networks of another number of sections are spread out too. */
  @state() private open = false;

  /** Tables are fetched by those who come to need one. */
  protected override willUpdate(changed: PropertyValues<this>) {
    if (!changed.has('dossier') || this.dossier === null) return;
    if (this.dossier.sections !== null) void import('../sections-table/sections-table.ts');
    if (isLong(this.dossier)) void import('../options-table/options-table.ts');
  }

  override render() {
    const { fields, problems } = this.state;
    return html`
      <method-fields .sheet=${this.sheet} .state=${this.state} .qWords=${qWords(this.dossier)}></method-fields>
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

  private networks(dossier: Dossier): TemplateResult {
    const { absent, sections, chosen, minimum } = dossier;
    return html`
      <p class="minimum">${unbroken(minimum)}</p>
      ${sections === null ? nothing : html`<sections-table .table=${sections} .chosen=${chosen ?? ''}></sections-table>`}
      ${isLong(dossier) ? this.table(dossier) : this.lists(dossier)} ${absent.length === 0 ? nothing : absence(absent)}
    `;
  }

  /** Many networks in a table, and the figures of the chosen one. */
  private table(dossier: Dossier): TemplateResult {
    const chosen = dossier.options.find(({ id }) => id === dossier.chosen);
    return html`<options-table .dossier=${dossier} .picked=${this.picked()}></options-table>
      ${chosen === undefined ? nothing : html`<div class="option alone"><div>${this.content(chosen)}</div></div>`}`;
  }

  private lists({ options, sections, chosen }: Dossier): TemplateResult {
    // Of many sections only the chosen number is spread out; the table above has them all.
    const number = sections === null ? undefined : options.find(({ id }) => id === chosen)?.sections;
    const others = options.filter((option) => number !== undefined && option.sections !== number);
    return html`<fieldset>
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
    </fieldset>`;
  }

  private list(options: readonly Option[]): TemplateResult {
    return html`<ol>
      ${options.map((option) => this.option(option))}
    </ol>`;
  }

  private option(option: Option): TemplateResult {
    return html`
      <li class=${option.id === this.dossier?.chosen ? 'option chosen' : 'option'}>
        <input
          type="radio"
          name="network"
          id="network-${option.id}"
          aria-describedby="verdict-${option.id} reason-${option.id}"
          .checked=${live(option.id === this.picked())}
          @change=${() => this.pick(option)}
        />
        ${this.content(option)}
      </li>
    `;
  }

  /** Id of the network that is marked: the engineer's at once, even while its figures are still on their way. */
  private picked(): string {
    const { options, chosen } = this.dossier!;
    const { choice = '' } = this.state.fields;
    return options.some(({ id }) => id === choice) ? choice : (chosen ?? '');
  }

  private pick({ id }: Option) {
    this.dispatchEvent(fieldChange('choice', id));
  }

  private content(option: Option): TemplateResult {
    const { chosen, chosenBy, proposed } = this.dossier!;
    return html`<div class=${option.arms.length > spread ? 'content long' : 'content'}>
      <div class="drawing" aria-hidden="true" @click=${() => this.pick(option)}>${thumbnail(option.arms)}</div>
      <div class="text">
        <div class="head">
          <label class="title" for="network-${option.id}">${option.title}</label>
          ${option.id === proposed ? html`<span class="tag">proposed</span>` : nothing}
          ${option.id === chosen && chosenBy !== 'proposal' ? html`<span class="tag">${chosenBy === 'engineer' ? 'chosen' : 'nearest'}</span>` : nothing}
          <span id="verdict-${option.id}">${optionVerdict(option, this.dossier!.record.build !== null)}</span>
        </div>
        <p class="values">
          ${
            option.arms.length === 0
              ? 'No part is needed.'
              : partWords(option).map((words) => html`<span class="value">${words}</span> `)
          }
        </p>
        ${figures(option, this.dossier!)}
        <p class="reason" id="reason-${option.id}">${unbroken(option.reasons.join('; '))}</p>
      </div>
    </div>`;
  }
}

/** A table serves where there are many, and where they are of every method. */
const isLong = ({ options, record, sections }: Dossier): boolean =>
  sections === null && (options.length > listed || record.method === 'all');

/** For which Q a Pi or T exists, and which is taken. */
const qWords = (dossier: Dossier | null): string =>
  (dossier?.assumptions ?? []).filter((text) => /^(?:Pi|T) networks exist/u.test(text)).join(' ');

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
function figures(option: Option, { record }: Dossier): TemplateResult {
  const { inductor, capacitor } = record.partQ;
  return html`<dl>
      <div>
        <dt>Worst return loss</dt>
        <dd>
          ${option.worstReturnLossDb === null ? 'no band' : returnLossWords(option.worstReturnLossDb)}
          ${option.worstState === '' || option.worstReturnLossDb === null ? nothing : html`<span class="muted">(${option.worstState})</span>`}
        </dd>
      </div>
      <div>
        <dt>Half-power band</dt>
        <dd>${option.halfPower.words}</dd>
      </div>
      <div>
        <dt>Attenuation 2<i>f</i><sub>0</sub>, 3<i>f</i><sub>0</sub></dt>
        <dd>${harmonics(option)}</dd>
      </div>
      <div>
        <dt>Loss at <i>Q</i> ${inductor} and ${capacitor}</dt>
        <dd>${decibels(option.lossDb, 2)}</dd>
      </div>
      ${
        option.method !== 'fitted' || option.ceilingGapDb === null
          ? nothing
          : html`<div>
              <dt>Below the ceiling</dt>
              <dd>${option.ceilingGapDb >= 100 ? 'over 100 dB' : decibels(option.ceilingGapDb)}</dd>
            </div>`
      }
    </dl>
    ${option.states.length < 2 ? nothing : states(option)} ${record.build === null ? nothing : realFigures(option)}
    <p class="form">${option.form}, ${count(option.arms.length, 'part')}. DC: ${option.dc.words}.</p>`;
}

/** The same network of real parts. */
function realFigures(option: Option): TemplateResult {
  const rows: readonly (readonly [string, (built: Built) => string | null])[] = [
    ['Worst return loss', ({ worstReturnLossDb }) => returnLossWords(worstReturnLossDb)],
    ['Yield', (built) => (built.yield === null ? null : `${formatFixed(built.yield.value * 100, 1)} %`)],
    ['Largest voltage', stressWords],
    ['Loss', ({ lossDb }) => decibels(lossDb, 2)],
  ];
  return html`<p class="real">
      <span class="muted">Real parts</span>
      ${
        option.built === null
          ? realFigure(option, () => null)
          : builtPartWords(option.built).map((words) => html`<span class="value">${words}</span> `)
      }
    </p>
    <dl>
      ${rows.map(
        ([name, figure]) =>
          html`<div>
            <dt>${name}</dt>
            <dd>${realFigure(option, figure)}</dd>
          </div>`,
      )}
    </dl>`;
}

/** Worst return loss into each state of the load. */
function states({ states, worstReturnLossDb }: Option): TemplateResult | typeof nothing {
  if (worstReturnLossDb === null) return nothing;
  const words = states.map(
    ({ name, worstReturnLossDb: db }) => `${name} ${db === null ? 'no band' : returnLossWords(db)}`,
  );
  return html`<p class="states">Worst return loss by state: ${unbroken(words.join('; '))}.</p>`;
}

declare global {
  interface HTMLElementTagNameMap {
    'options-part': OptionsPart;
  }
}
