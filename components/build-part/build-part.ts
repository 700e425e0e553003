import { LitElement, html, nothing, type PropertyValues, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Built, Dossier, Option } from '../../src/dossier.ts';
import type { StockList } from '../../src/parts/stock.ts';
import { formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { dataTable } from '../base/data-table.ts';
import { fieldChange } from '../base/field-change.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { rowsText, type Rows } from '../base/rows.ts';
import { table } from '../base/table.styles.ts';
import { unbroken } from '../base/words.ts';
import '../build-progress/build-progress.ts';
import '../copy-button/copy-button.ts';
import './build-fields.ts';
import { styles } from './build-part.styles.ts';
import {
  coilRows,
  orderRows,
  percent,
  sensitivityBars,
  sensitivityRows,
  setWords,
  stepRows,
  stressRows,
  summaryRows,
} from './rows.ts';

/** A network worked out with real parts, and what it was worked out from. */
interface Shown {
  readonly option: Option;
  readonly built: Built;
  readonly powerStated: boolean;
}

/**
 * Part 7: the chosen network of real parts: what to order, how often it will do, what the parts bear.
 * @fires field-change  of the build, and `set`
 */
@customElement('build-part')
export class BuildPart extends LitElement {
  static override styles = [base, table, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  @property() realParts: 'none' | 'at work' | 'stopped' | 'whole' = 'none';
  /** There is nothing to go on with. */
  @property({ type: Boolean }) idle = false;
  @property({ attribute: false }) stocked: ReadonlyMap<string, StockList> = new Map();
  /** Outcome of reading a stock list: a line, or one for each problem. */
  @property({ attribute: false }) said: readonly string[] = [];

  /** The last one that was worked out: it stays in view until the next is. */
  private shown: Shown | null = null;
  /** It is of an earlier entry. */
  private earlier = false;

  protected override willUpdate(changed: PropertyValues<this>) {
    if (!changed.has('dossier') && !changed.has('realParts')) return;
    const { dossier } = this;
    const option = dossier?.options.find(({ id }) => id === dossier.chosen);
    if (this.realParts === 'none') this.shown = null;
    else if (dossier !== null && option !== undefined && option.built !== null) {
      this.shown = { option, built: option.built, powerStated: dossier.record.requirement.powerW !== null };
    }
    this.earlier = option === undefined || option.built === null;
  }

  override render() {
    return html`
      <build-fields .state=${this.state} .stocked=${this.stocked} .said=${this.said}></build-fields>
      ${
        this.realParts === 'none'
          ? html`<p class="none">
              Values are exact and parts ideal: tolerance, yield and stress are not assessed. Ask for real parts to have
              them worked out.
            </p>`
          : html`<build-progress
                .dossier=${this.dossier}
                .realParts=${this.realParts}
                ?idle=${this.idle}
              ></build-progress>
              ${this.shown === null ? html`<div class="room"></div>` : this.results(this.shown)}`
      }
    `;
  }

  private results({ option, built, powerStated }: Shown): TemplateResult {
    return html`<div class=${this.earlier ? 'results earlier' : 'results'}>
      <p class="of">
        ${this.earlier ? 'Of the entry before, until this one is worked out:' : `${option.title}, of real parts:`}
      </p>
      ${summary(built)} ${section('Parts to order', 'Copy the order list', orderRows(built))}
      ${this.choice(option, built)}
      ${section('From exact values to parts to order', 'Copy the steps', stepRows(built, option))} ${spread(built)}
      ${stress(built, powerStated)}
      <h3>DC</h3>
      ${built.bias.map((text) => html`<p>${unbroken(text)}</p>`)} ${coils(built)}
    </div>`;
  }

  /** The sets of values that come nearest; the engineer may take another than the first. */
  private choice({ id, designators }: Option, { sets, set, searchWords }: Built): TemplateResult {
    if (sets.length === 0) return html`<p class="after">${unbroken(searchWords)}</p>`;
    const { choice, set: typed = '1' } = this.state.fields;
    // The engineer's at once, even while its figures are still on their way.
    const marked = choice === id ? typed : String(set);
    const withYield = sets.some((each) => each.yield !== null);
    return html`<fieldset class="sets">
      <legend>The best sets of values</legend>
      <div class="scroll" tabindex="0" role="group" aria-label="The best sets of values">
        <table>
          <thead>
            <tr>
              <th scope="col">Values</th>
              <th scope="col" class="number">Worst return loss</th>
              ${withYield ? html`<th scope="col" class="number">Yield</th>` : nothing}
            </tr>
          </thead>
          <tbody>
            ${sets.map(
              (each, k) =>
                html`<tr>
                  <th scope="row">
                    <label>
                      <input
                        type="radio"
                        name="set"
                        .checked=${live(String(k + 1) === marked)}
                        @change=${() => this.dispatchEvent(fieldChange('set', String(k + 1)))}
                      />
                      <span>${setWords(each.words, designators)}</span>
                    </label>
                  </th>
                  <td class="number">${returnLossWords(each.worstReturnLossDb)}</td>
                  ${withYield ? html`<td class="number">${each.yield === null ? '–' : percent(each.yield.value)}</td>` : nothing}
                </tr>`,
            )}
          </tbody>
        </table>
      </div>
      <p class="after">${unbroken(searchWords)}</p>
    </fieldset>`;
  }
}

/** A heading with its copy button over a table. */
const section = (title: string, copy: string, rows: Rows, bars: readonly number[] = []): TemplateResult =>
  html`<div class="line">
      <h3>${title}</h3>
      <copy-button .label=${copy} .text=${() => rowsText(rows)}></copy-button>
    </div>
    ${dataTable(title, rows, bars)}`;

/** The figures by which the network of these parts is judged. */
function summary(built: Built): TemplateResult {
  const rows = summaryRows(built);
  return html`<dl>
      ${rows.map(
        ([name, value]) =>
          html`<div>
            <dt>${name}</dt>
            <dd>${unbroken(value)}</dd>
          </div>`,
      )}
    </dl>
    <copy-button label="Copy the figures" .text=${() => rows.map((row) => row.join('\t')).join('\n')}></copy-button>`;
}

function spread({ sensitivity, tighten, worstReturnLossDb }: Built): TemplateResult | typeof nothing {
  if (sensitivity.length === 0) return nothing;
  return html`${section(
    'What each part does to the worst return loss',
    'Copy the sensitivities',
    sensitivityRows(sensitivity),
    sensitivityBars(sensitivity, worstReturnLossDb),
  )}
  ${tighten === '' ? nothing : html`<p class="after">${unbroken(tighten)}</p>`}`;
}

function stress({ stress: found }: Built, powerStated: boolean): TemplateResult {
  if (found === null) {
    return html`<h3>Stress</h3>
      <p>
        ${powerStated ? 'There is no part that could be stressed.' : 'No power is stated: give the available power in part 1, under Parts and power.'}
      </p>`;
  }
  return html`${section(`Stress at ${formatQuantity(found.powerW, 'W', 3)}`, 'Copy the stress', stressRows(found))}
    <p class="after">${unbroken(found.words)}</p>`;
}

function coils({ coils: found }: Built): TemplateResult | typeof nothing {
  if (found.length === 0) return nothing;
  const cautions = found.filter(({ caution }) => caution !== '');
  return html`${section('Inductors as coils, wound by hand', 'Copy the coils', coilRows(found))}
  ${cautions.map(({ designator, caution }) => html`<p class="after">${designator}: ${unbroken(caution)}</p>`)}`;
}

declare global {
  interface HTMLElementTagNameMap {
    'build-part': BuildPart;
  }
}
