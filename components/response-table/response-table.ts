import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Response } from '../../src/dossier.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { table } from '../base/table.styles.ts';
import { decibels } from '../base/words.ts';
import '../copy-button/copy-button.ts';

/** About so many rows are shown; all of them are copied. */
const rows = 40;

/** The response in numbers: at one frequency that the reader sets, and as a table that unfolds. */
@customElement('response-table')
export class ResponseTable extends LitElement {
  static override styles = [
    base,
    table,
    css`
      .reading {
        display: grid;
        grid-template-columns: minmax(0, 14rem) minmax(0, 1fr);
        gap: 0.25rem 1.5rem;
        align-items: center;
        margin: 1.25rem 0 0.75rem;
      }

      .reading label {
        font-weight: 700;
      }

      input {
        width: 100%;
        min-height: 1.5rem;
        margin: 0;
        accent-color: var(--accent);
      }

      output {
        grid-column: 1 / -1;
      }

      summary {
        min-height: 1.5rem;
        font-weight: 700;
        cursor: pointer;
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

      @container (max-width: 30rem) {
        .reading {
          grid-template-columns: minmax(0, 1fr);
        }
      }
    `,
  ];

  @property({ attribute: false }) response!: Response;
  @property({ attribute: false }) requirement!: DesignRecord['requirement'];

  /** Frequency of the reading, Hz; null: the design frequency. */
  @state() private readAtHz: number | null = null;
  @state() private open = false;

  override render() {
    const { frequencyHz } = this.response;
    const index = nearest(frequencyHz, this.readAtHz ?? this.requirement.frequencyHz);
    const words = this.reading(index);
    return html`
      <div class="reading">
        <label for="at">Read at one frequency</label>
        <input
          id="at"
          type="range"
          min="0"
          max=${frequencyHz.length - 1}
          step="1"
          .value=${String(index)}
          aria-valuetext=${words}
          @input=${this.move}
        />
        <output for="at" aria-live="off">${words}</output>
      </div>
      <details @toggle=${(event: Event) => (this.open = (event.target as HTMLDetailsElement).open)}>
        <summary>The numbers</summary>
        ${this.open ? this.table() : nothing}
      </details>
    `;
  }

  private move(event: Event) {
    this.readAtHz = this.response.frequencyHz[Number((event.target as HTMLInputElement).value)] ?? null;
  }

  private reading(index: number): string {
    const { frequencyHz, returnLossDb, vswr, mismatchLossDb, transducerGainDb } = this.response;
    return [
      formatQuantity(frequencyHz[index]!, 'Hz', 6),
      `return loss ${returnLossWords(returnLossDb[index]!)}`,
      `VSWR ${formatFixed(vswr[index]!, 3)}`,
      `mismatch loss ${decibels(mismatchLossDb[index]!, 3)}`,
      `transducer gain ${decibels(transducerGainDb[index]!, 3)}`,
    ].join(', ');
  }

  private table(): TemplateResult {
    return html`
      <copy-button label="Copy every line" .text=${() => this.text()}></copy-button>
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
            ${this.shown().map((index) => this.row(index))}
          </tbody>
        </table>
      </div>
    `;
  }

  /** Every so many lines, and those of the design frequency and the band's ends. */
  private shown(): readonly number[] {
    const { frequencyHz } = this.response;
    const { frequencyHz: f0, bandHz } = this.requirement;
    const marked = new Set([f0, bandHz?.low, bandHz?.high].map((hertz) => nearest(frequencyHz, hertz ?? f0)));
    const every = Math.ceil(frequencyHz.length / rows);
    return [...frequencyHz.keys()].filter((index) => index % every === 0 || marked.has(index));
  }

  private row(index: number): TemplateResult {
    const { frequencyHz, returnLossDb, vswr, mismatchLossDb, transducerGainDb } = this.response;
    return html`<tr>
      <th scope="row" class="number">${formatQuantity(frequencyHz[index]!, 'Hz', 6)}</th>
      <td class="number">${formatFixed(returnLossDb[index]!, 2)}</td>
      <td class="number">${formatFixed(vswr[index]!, 3)}</td>
      <td class="number">${formatFixed(mismatchLossDb[index]!, 3)}</td>
      <td class="number">${formatFixed(transducerGainDb[index]!, 3)}</td>
    </tr>`;
  }

  private text(): string {
    const { frequencyHz, returnLossDb, vswr, mismatchLossDb, transducerGainDb } = this.response;
    const head = ['Frequency, Hz', 'Return loss, dB', 'VSWR', 'Mismatch loss, dB', 'Transducer gain, dB'].join('\t');
    const lines = frequencyHz.map((hertz, index) =>
      [hertz, returnLossDb[index], vswr[index], mismatchLossDb[index], transducerGainDb[index]].join('\t'),
    );
    return [head, ...lines].join('\n');
  }
}

/** Index of the frequency nearest to one that is asked for, Hz. */
function nearest(frequencyHz: readonly number[], hertz: number): number {
  let best = 0;
  frequencyHz.forEach((each, index) => {
    if (Math.abs(each - hertz) < Math.abs(frequencyHz[best]! - hertz)) best = index;
  });
  return best;
}

declare global {
  interface HTMLElementTagNameMap {
    'response-table': ResponseTable;
  }
}
