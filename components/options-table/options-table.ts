import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { live } from 'lit/directives/live.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Dossier, Option } from '../../src/dossier.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { fieldChange } from '../base/field-change.ts';
import { methodWords } from '../base/methods.ts';
import { optionVerdict, realFigure } from '../base/real-figure.ts';
import { table } from '../base/table.styles.ts';
import { decibels, stressWords } from '../base/words.ts';
import { verdictStyles } from '../verdict-mark/verdict-mark.ts';

/**
 * Many networks, one a line, by method; within one in the order of their size.
 * @fires field-change  `choice`
 */
@customElement('options-table')
export class OptionsTable extends LitElement {
  static override styles = [
    base,
    table,
    verdictStyles,
    css`
      :host {
        margin-bottom: 1rem;
      }

      .scroll {
        max-height: 34rem;
        overflow: auto;
        border-block: 1px solid var(--ink);
      }

      table {
        border: 0;
        font-size: var(--small);
        line-height: 1.35;
      }

      thead th {
        position: sticky;
        z-index: 1;
        top: 0;
        background: var(--paper);
        box-shadow: inset 0 -1px 0 var(--ink);
        padding-top: 0.375rem;
      }

      .over th {
        position: static;
        padding-bottom: 0;
        box-shadow: none;
        border: 0;
        text-align: center;
        font-weight: 700;
        color: var(--ink);
      }

      th,
      td {
        padding: 0.25rem 0.75rem 0.25rem 0;
      }

      th:first-child,
      td:first-child {
        padding-left: 0.5rem;
      }

      /* A rule between the figures of exact values and those of real parts. */
      .real .first {
        border-left: 1px solid var(--hairline);
        padding-left: 0.75rem;
      }

      .over td {
        padding: 0;
      }

      .group th {
        padding-top: 0.625rem;
        font-weight: 700;
      }

      .group th span {
        font-weight: 400;
        color: var(--muted);
      }

      label {
        display: grid;
        grid-template-columns: 1.5rem minmax(0, 1fr);
        min-height: 1.5rem;
        min-width: 11rem;
        cursor: pointer;
      }

      input {
        width: 1rem;
        height: 1rem;
        margin: 0.1rem 0 0;
        accent-color: var(--accent);
      }

      .chosen {
        background: var(--tint);
      }

      .chosen th {
        box-shadow: inset 3px 0 0 var(--accent);
        font-weight: 700;
      }

      .verdict {
        white-space: nowrap;
      }

      .tag {
        color: var(--accent);
      }
    `,
  ];

  @property({ attribute: false }) dossier: Dossier | null = null;

  /** Id of the network that is marked. */
  @property() picked = '';

  override render() {
    if (this.dossier === null) return nothing;
    const { options, record } = this.dossier;
    const real = record.build !== null;
    const methods = [...new Set(options.map(({ method }) => method))];
    return html`<div class="scroll" tabindex="0" role="radiogroup" aria-label="Choose a network">
      <table class=${real ? 'real' : nothing}>
        <thead>
          ${
            real
              ? html`<tr class="over">
                  <td colspan="3"></td>
                  <th scope="colgroup" colspan="4">Real parts</th>
                  <th scope="colgroup" colspan="5">Exact values</th>
                </tr>`
              : nothing
          }
          <tr>
            <th scope="col">Network</th>
            <th scope="col">Verdict</th>
            <th scope="col" class="number">Parts</th>
            ${
              real
                ? html`<th scope="col" class="number first">Worst return loss</th>
                    <th scope="col" class="number">Yield</th>
                    <th scope="col" class="number">Loss</th>
                    <th scope="col" class="number">Largest voltage</th>`
                : nothing
            }
            <th scope="col" class="number first">Worst return loss</th>
            <th scope="col" class="number">Half-power from</th>
            <th scope="col" class="number">to</th>
            <th scope="col" class="number">Loss</th>
            <th scope="col" class="number">Att. 2<i>f</i><sub>0</sub></th>
          </tr>
        </thead>
        ${methods.map((method) =>
          this.group(
            method,
            options.filter((option) => option.method === method),
          ),
        )}
      </table>
    </div>`;
  }

  private group(method: Option['method'], options: readonly Option[]): TemplateResult {
    const meeting = options.filter(({ meets }) => meets).length;
    const name = methodWords[method].words;
    return html`<tbody>
      <tr class="group">
        <th scope="rowgroup" colspan=${this.dossier!.record.build === null ? 8 : 12}>
          ${name.charAt(0).toUpperCase()}${name.slice(1)}
          <span>${String(meeting)} of ${String(options.length)} meet${meeting === 1 ? 's' : ''} everything</span>
        </th>
      </tr>
      ${options.map((option) => this.row(option))}
    </tbody>`;
  }

  private row(option: Option): TemplateResult {
    const { chosen, proposed, record } = this.dossier!;
    const real = record.build !== null;
    const { lowHz, highHz } = option.halfPower;
    const second = option.harmonicDb[0]?.attenuationDb ?? null;
    const pick = () => this.dispatchEvent(fieldChange('choice', option.id));
    return html`<tr class=${option.id === chosen ? 'chosen' : ''}>
      <th scope="row">
        <label>
          <input type="radio" name="network" .checked=${live(option.id === this.picked)} @change=${pick} />
          <span>${option.title}${option.id === proposed ? html` <span class="tag">(proposed)</span>` : nothing}</span>
        </label>
      </th>
      <td>${optionVerdict(option, real)}</td>
      <td class="number">${option.arms.length}</td>
      ${
        real
          ? html`<td class="number first">
                ${realFigure(option, (built) => returnLossWords(built.worstReturnLossDb))}
              </td>
              <td class="number">
                ${realFigure(option, (built) => (built.yield === null ? null : `${formatFixed(built.yield.value * 100, 1)} %`))}
              </td>
              <td class="number">${realFigure(option, (built) => decibels(built.lossDb, 2))}</td>
              <td class="number">${realFigure(option, stressWords)}</td>`
          : nothing
      }
      <td class="number first">
        ${option.worstReturnLossDb === null ? 'no band' : returnLossWords(option.worstReturnLossDb)}
      </td>
      <td class="number">${lowHz === null ? 'none' : formatQuantity(lowHz, 'Hz')}</td>
      <td class="number">${highHz === null ? 'none' : formatQuantity(highHz, 'Hz')}</td>
      <td class="number">${decibels(option.lossDb, 2)}</td>
      <td class="number">${second === null ? 'no data' : decibels(second)}</td>
    </tr>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'options-table': OptionsTable;
  }
}
