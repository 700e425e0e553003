import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { Attachments } from '../../src/record/read-termination.ts';
import { base } from '../base/base.styles.ts';
import { field } from '../base/field.styles.ts';

/**
 * The ways in for measured data: a file, or a table pasted as text; and what is at hand.
 * @fires data-file   detail: a File that the user picked
 * @fires data-table  detail: the text pasted
 * @fires data-port   detail: 1 or 2, of the two-port file asked about; null: none
 */
@customElement('measured-data')
export class MeasuredData extends LitElement {
  static override styles = [
    base,
    field,
    css`
      label.button {
        padding: 0.25rem 0.75rem;
        font-size: var(--small);
        color: var(--ink);
      }

      label.button:focus-within {
        outline: 2px solid var(--accent);
        outline-offset: 2px;
      }

      .ask {
        padding: 0.5rem 0.625rem;
        border: 1px solid var(--ink);
      }

      .ask div {
        display: flex;
        flex-wrap: wrap;
        gap: 0.375rem;
        margin-top: 0.375rem;
      }

      .said,
      .hand {
        margin-top: 0.375rem;
        font-size: var(--small);
        line-height: 1.35;
        overflow-wrap: anywhere;
      }

      .hand {
        color: var(--muted);
      }

      details {
        margin-top: 0.375rem;
      }

      summary {
        min-height: 1.5rem;
        font-size: var(--small);
        cursor: pointer;
      }

      textarea {
        min-height: 6rem;
        font-size: var(--small);
        white-space: pre;
        overflow-x: auto;
      }

      details button {
        margin-top: 0.375rem;
        font-size: var(--small);
      }
    `,
  ];

  /** The data at hand. */
  @property({ attribute: false }) attachments: Attachments = new Map();
  /** Outcome of reading a file or table, in one line. */
  @property() said = '';
  /** A two-port file whose port is to be chosen; '' when there is none. */
  @property() twoPort = '';

  @state() private table = '';

  override render() {
    return html`
      ${
        this.twoPort === ''
          ? html`<label class="button">
              <input class="unseen" type="file" accept=".s1p,.s2p,.csv,.txt" @change=${this.pick} />
              Add measured data…
            </label>`
          : this.ask()
      }
      <p class="said" role="status" ?hidden=${this.said === ''}>${this.said}</p>
      ${
        this.attachments.size === 0
          ? nothing
          : html`<p class="hand">
              At hand: ${[...this.attachments.keys()].join(', ')}. The name stands for the data, at the source too.
            </p>`
      }
      <details>
        <summary>Paste a table</summary>
        <label for="table">Frequency, <i>R</i>, <i>X</i>: one sample a line</label>
        <textarea
          id="table"
          spellcheck="false"
          placeholder="150M  9.2  -62.5&#10;151M  9.4  -61"
          .value=${this.table}
          @input=${(event: InputEvent) => (this.table = (event.target as HTMLTextAreaElement).value)}
        ></textarea>
        <button type="button" @click=${this.read}>Read the table</button>
      </details>
    `;
  }

  private ask(): TemplateResult {
    const answer = (port: 1 | 2 | null) => () =>
      this.dispatchEvent(new CustomEvent('data-port', { detail: port, bubbles: true, composed: true }));
    return html`<div class="ask" role="group" aria-label="Port of the file">
      <p class="small">${this.twoPort} has two ports. Which one is the termination?</p>
      <div>
        <button type="button" @click=${answer(1)}>Port 1</button>
        <button type="button" @click=${answer(2)}>Port 2</button>
        <button type="button" @click=${answer(null)}>Neither</button>
      </div>
    </div>`;
  }

  private pick(event: Event) {
    const input = event.target as HTMLInputElement;
    const file = input.files?.[0];
    if (file !== undefined)
      this.dispatchEvent(new CustomEvent('data-file', { detail: file, bubbles: true, composed: true }));
    // The same file, corrected, can be picked again.
    input.value = '';
  }

  private read() {
    this.dispatchEvent(new CustomEvent('data-table', { detail: this.table, bubbles: true, composed: true }));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'measured-data': MeasuredData;
  }
}
