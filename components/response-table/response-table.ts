import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Response } from '../../src/dossier.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { decibels } from '../base/words.ts';
import { nearest } from './nearest.ts';

/**
 * The response in numbers: at one frequency that the reader sets, into every state of the load, and as a table that
 * unfolds.
 * @fires read-at  detail: the frequency that the reader went to, Hz
 */
@customElement('response-table')
export class ResponseTable extends LitElement {
  static override styles = [
    base,
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

      output span {
        display: block;
      }

      summary {
        min-height: 1.5rem;
        font-weight: 700;
        cursor: pointer;
      }

      @container (max-width: 30rem) {
        .reading {
          grid-template-columns: minmax(0, 1fr);
        }
      }
    `,
  ];

  /** One a load state, one at least, over the same frequencies. */
  @property({ attribute: false }) responses!: readonly Response[];
  @property({ attribute: false }) requirement!: DesignRecord['requirement'];
  /** Frequency of the reading, Hz; null: the design frequency. */
  @property({ attribute: false }) atHz: number | null = null;

  @state() private open = false;

  override render() {
    const { frequencyHz } = this.responses[0]!;
    const index = nearest(frequencyHz, this.atHz ?? this.requirement.frequencyHz);
    const words = this.responses.map((response) => reading(response, index));
    const frequency = formatQuantity(frequencyHz[index]!, 'Hz', 6);
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
          aria-valuetext="${frequency}: ${words.join('; ')}"
          @input=${this.move}
        />
        <output for="at" aria-live="off">
          ${words.length === 1 ? `${frequency}: ${words.join('')}` : html`${frequency}: ${words.map((each) => html`<span>${each}</span>`)}`}
        </output>
      </div>
      <details @toggle=${this.toggle}>
        <summary>The numbers</summary>
        ${this.open ? this.numbers() : nothing}
      </details>
    `;
  }

  private numbers(): TemplateResult {
    return html`<response-numbers .responses=${this.responses} .requirement=${this.requirement}></response-numbers>`;
  }

  private toggle(event: Event) {
    this.open = (event.target as HTMLDetailsElement).open;
    if (this.open) void import('../response-numbers/response-numbers.ts');
  }

  private move(event: Event) {
    const hertz = this.responses[0]!.frequencyHz[Number((event.target as HTMLInputElement).value)]!;
    this.dispatchEvent(new CustomEvent('read-at', { detail: hertz }));
  }
}

function reading({ state, returnLossDb, vswr, mismatchLossDb, transducerGainDb }: Response, index: number): string {
  const words = [
    `return loss ${returnLossWords(returnLossDb[index]!)}`,
    `VSWR ${formatFixed(vswr[index]!, 3)}`,
    `mismatch loss ${decibels(mismatchLossDb[index]!, 3)}`,
    `transducer gain ${decibels(transducerGainDb[index]!, 3)}`,
  ].join(', ');
  return state === '' ? words : `${state}: ${words}`;
}

declare global {
  interface HTMLElementTagNameMap {
    'response-table': ResponseTable;
  }
}
