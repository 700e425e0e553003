import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { Response } from '../../src/dossier.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { field } from '../base/field.styles.ts';
import { table } from '../base/table.styles.ts';
import '../copy-button/copy-button.ts';
import { nearest } from '../response-table/nearest.ts';

/** About so many rows are shown; all of them are copied. */
const rows = 40;

/** The response as a table, of one load state at a time. */
@customElement('response-numbers')
export class ResponseNumbers extends LitElement {
  static override styles = [
    base,
    field,
    table,
    css`
      .head {
        display: flex;
        flex-wrap: wrap;
        justify-content: space-between;
        align-items: end;
        gap: 0.5rem 1.5rem;
        margin: 0.5rem 0;
      }

      .scroll {
        max-height: 28rem;
        overflow: auto;
      }

      thead th {
        position: sticky;
        top: 0;
        background: var(--paper);
      }
    `,
  ];

  /** One a load state, one at least, over the same frequencies. */
  @property({ attribute: false }) responses!: readonly Response[];
  @property({ attribute: false }) requirement!: DesignRecord['requirement'];

  /** Load state shown; the governing one where it isn't there any more. */
  @state() private state = '';

  override render() {
    const response = this.responses.find(({ state }) => state === this.state) ?? this.responses[0]!;
    return html`
      <div class="head">
        ${this.responses.length < 2 ? nothing : this.choice(response)}
        <copy-button label="Copy every line" .text=${() => textOf(response)}></copy-button>
      </div>
      <div class="scroll" tabindex="0" role="group" aria-label="Response in numbers">
        <table>
          <thead>
            <tr>
              <th scope="col" class="number">Frequency</th>
              <th scope="col" class="number">Return loss, dB</th>
              <th scope="col" class="number">VSWR</th>
              <th scope="col" class="number">Mismatch loss, dB</th>
              <th scope="col" class="number">Transducer gain, dB</th>
            </tr>
          </thead>
          <tbody>
            ${this.shown(response).map((index) => row(response, index))}
          </tbody>
        </table>
      </div>
    `;
  }

  private choice(shown: Response): TemplateResult {
    return html`<div>
      <label for="state">State of the load</label>
      <select id="state" @change=${(event: Event) => (this.state = (event.target as HTMLSelectElement).value)}>
        ${this.responses.map(({ state }) => html`<option .value=${state} .selected=${state === shown.state}>${state}</option>`)}
      </select>
    </div>`;
  }

  /** Every so many lines, and those of the design frequency and the band's ends. */
  private shown({ frequencyHz }: Response): readonly number[] {
    const { frequencyHz: f0, bandHz } = this.requirement;
    const marked = new Set([f0, bandHz?.low, bandHz?.high].map((hertz) => nearest(frequencyHz, hertz ?? f0)));
    const every = Math.ceil(frequencyHz.length / rows);
    return [...frequencyHz.keys()].filter((index) => index % every === 0 || marked.has(index));
  }
}

const row = (
  { frequencyHz, returnLossDb, vswr, mismatchLossDb, transducerGainDb }: Response,
  index: number,
): TemplateResult =>
  html`<tr>
    <th scope="row" class="number">${formatQuantity(frequencyHz[index]!, 'Hz', 6)}</th>
    <td class="number">${formatFixed(returnLossDb[index]!, 2)}</td>
    <td class="number">${formatFixed(vswr[index]!, 3)}</td>
    <td class="number">${formatFixed(mismatchLossDb[index]!, 3)}</td>
    <td class="number">${formatFixed(transducerGainDb[index]!, 3)}</td>
  </tr>`;

function textOf({ frequencyHz, returnLossDb, vswr, mismatchLossDb, transducerGainDb }: Response): string {
  const head = ['Frequency, Hz', 'Return loss, dB', 'VSWR', 'Mismatch loss, dB', 'Transducer gain, dB'].join('\t');
  const lines = frequencyHz.map((hertz, index) =>
    [hertz, returnLossDb[index], vswr[index], mismatchLossDb[index], transducerGainDb[index]].join('\t'),
  );
  return [head, ...lines].join('\n');
}

declare global {
  interface HTMLElementTagNameMap {
    'response-numbers': ResponseNumbers;
  }
}
