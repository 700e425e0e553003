import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { guard } from 'lit/directives/guard.js';
import { live } from 'lit/directives/live.js';
import type { AsBuiltFigures, Dossier } from '../../src/dossier.ts';
import {
  asBuiltWords,
  attachedWords,
  causeWords,
  outsideWords,
  remedyWords,
  verdictWords,
} from '../../src/evidence/as-built-words.ts';
import { finishedBoardPlot } from '../../src/figures/finished-board-plot.ts';
import type { AsBuilt } from '../../src/record/design-record.ts';
import { base } from '../base/base.styles.ts';
import { dataTable } from '../base/data-table.ts';
import { drawing } from '../base/drawing.ts';
import { field } from '../base/field.styles.ts';
import { rowsText } from '../base/rows.ts';
import { table } from '../base/table.styles.ts';
import { unbroken } from '../base/words.ts';
import '../copy-button/copy-button.ts';
import { verdictMark, verdictStyles } from '../verdict-mark/verdict-mark.ts';
import { styles } from './finished-board.styles.ts';
import { causeRows } from './rows.ts';

/** Below this width of the column, px, the chart is drawn with fewer ticks instead of smaller letters. */
const roomy = 560;
const large = { width: 520, height: 200 };
const small = { width: 290, height: 190 };

const verdicts = {
  meets: 'The finished board meets the requirement.',
  'falls short': 'The finished board falls short of the requirement.',
  'not assessed': 'The finished board is not assessed against the requirement.',
} as const;

/** A measurement compared with the network of a dossier. */
interface Shown {
  readonly figures: AsBuiltFigures;
  readonly dossier: Dossier;
}

/**
 * Part 8: what was measured on the finished board, over what was predicted of it, and why the two differ.
 * @fires board-file    detail: a File that the user picked
 * @fires board-change  detail: the board as measured and described now; null: none
 */
@customElement('finished-board')
export class FinishedBoard extends LitElement {
  static override styles = [base, field, table, verdictStyles, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) board: AsBuilt | null = null;
  /** It waits for the next revision. */
  @property({ type: Boolean }) waiting = false;
  /** Figures are still to come. */
  @property({ type: Boolean }) awaited = false;
  /** Outcome of reading the file, in one line. */
  @property() said = '';

  @state() private size = large;
  /** The last comparison worked out: it stays in view until the next is. */
  private shown: Shown | null = null;
  private readonly watch = new ResizeObserver(([entry]) => {
    if (entry !== undefined) this.size = entry.contentRect.width < roomy ? small : large;
  });

  override connectedCallback() {
    super.connectedCallback();
    this.watch.observe(this);
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.watch.disconnect();
  }

  protected override willUpdate() {
    const figures = this.dossier?.asBuilt ?? null;
    if (this.board === null) this.shown = null;
    else if (figures !== null && figures !== this.shown?.figures) this.shown = { figures, dossier: this.dossier! };
  }

  override render() {
    const { board } = this;
    return html`
      <p class="intro">
        What the analyser measured on the finished board, looking in from the source side with the load attached, is
        laid over what is predicted of it here.
      </p>
      ${board === null ? nothing : this.describe(board)}
      <div class="actions">
        <label class="button">
          <input class="unseen" type="file" accept=".s1p" @change=${this.pick} />
          ${board === null ? 'Measured on the finished board…' : 'Another measurement…'}
        </label>
        ${board === null ? nothing : html`<button type="button" @click=${() => this.say(null)}>Leave it out</button>`}
      </div>
      <p class="said" role="status">${this.said}</p>
      ${board === null ? nothing : this.results(board)}
    `;
  }

  /** What the engineer says of the measurement. */
  private describe(board: AsBuilt): TemplateResult {
    const loads = this.dossier?.record.loads ?? [];
    const known = board.state === null || loads.some(({ name }) => name === board.state);
    return html`<p class="said">
        <strong>${board.measured.name}</strong>, ${String(board.measured.samples)} samples, SHA-256
        ${board.measured.sha256.slice(0, 16)}…
      </p>
      <div class="of">
        ${
          loads.length < 2
            ? nothing
            : html`<div>
                <label for="state">Load state attached</label>
                <select
                  id="state"
                  @change=${(event: Event) => {
                    const { value } = event.target as HTMLSelectElement;
                    this.say({ ...board, state: value === '' ? null : value });
                  }}
                >
                  <option value="" .selected=${board.state === null}>not said: the nearest is taken</option>
                  ${known ? nothing : html`<option .value=${board.state!} selected>${board.state}</option>`}
                  ${loads.map(
                    ({ name }) => html`<option .value=${name} .selected=${name === board.state}>${name}</option>`,
                  )}
                </select>
              </div>`
        }
        <div>
          <label for="note">Note on the board measured</label>
          <input
            id="note"
            type="text"
            autocomplete="off"
            .value=${live(board.note)}
            @input=${(event: InputEvent) => this.say({ ...board, note: (event.target as HTMLInputElement).value })}
          />
        </div>
      </div>`;
  }

  private results(board: AsBuilt): TemplateResult | typeof nothing {
    if (this.waiting) return html`<p class="muted">It is compared once the next revision is started.</p>`;
    const { shown } = this;
    const earlier = shown !== null && (this.awaited || shown.figures.sha256 !== board.measured.sha256);
    if (shown === null) {
      return html`<p class="muted">${this.awaited ? 'Being compared…' : 'There is no network to compare it with.'}</p>`;
    }
    const { figures, dossier } = shown;
    const [measured = '', compared = ''] = asBuiltWords(figures);
    const { requiredDb, verdict } = figures.verdict;
    return html`<div class=${earlier ? 'results earlier' : 'results'}>
      ${earlier ? html`<p>Of the entry before, until this one is compared:</p>` : nothing}
      <p class="headline">
        ${requiredDb === null ? 'No return loss is required of it.' : verdictMark(verdict, verdicts[verdict])}
      </p>
      ${verdictWords(figures.verdict).map((words) => html`<p>${unbroken(words)}</p>`)} ${this.plot(figures, dossier)}
      <p>${unbroken(`${measured} ${compared} ${attachedWords(figures)}`)}</p>
      ${
        figures.outside === null || figures.overlay.frequencyHz.length === 0
          ? nothing
          : html`<p>${unbroken(outsideWords(figures.outside))}</p>`
      }
      ${causes(figures)}
    </div>`;
  }

  private plot(figures: AsBuiltFigures, { record, responses, options, chosen }: Dossier): unknown {
    const spanHz = responses[0]?.spanHz;
    if (spanHz === undefined || figures.overlay.frequencyHz.length === 0) return nothing;
    const real = options.find(({ id }) => id === chosen)?.built?.percentiles ?? null;
    return html`<figure>
      ${guard([figures, this.size], () =>
        drawing(finishedBoardPlot(figures, record.requirement, spanHz, real, this.size)),
      )}
    </figure>`;
  }

  private pick(event: Event) {
    const input = event.target as HTMLInputElement;
    const file = input.files?.[0];
    if (file !== undefined) {
      this.dispatchEvent(new CustomEvent('board-file', { detail: file, bubbles: true, composed: true }));
    }
    // The same file, measured anew, can be picked again.
    input.value = '';
  }

  private say(board: AsBuilt | null) {
    this.dispatchEvent(new CustomEvent('board-change', { detail: board, bubbles: true, composed: true }));
  }
}

function causes(figures: AsBuiltFigures): TemplateResult | typeof nothing {
  const words = causeWords(figures);
  if (words.length === 0) return nothing;
  const rows = causeRows(figures);
  const remedy = remedyWords(figures);
  const told = figures.conclusion !== 'as predicted' && rows.rows.length > 0;
  return html`<div class="line">
      <h3>Why it differs</h3>
      ${told ? html`<copy-button label="Copy the causes" .text=${() => rowsText(rows)}></copy-button>` : nothing}
    </div>
    ${words.map((sentence) => html`<p>${unbroken(sentence)}</p>`)}
    ${told ? dataTable('Single causes that would explain it', rows) : nothing}
    ${
      remedy === ''
        ? nothing
        : html`<h3>Remedy</h3>
            <p>${unbroken(remedy)}</p>`
    }`;
}

declare global {
  interface HTMLElementTagNameMap {
    'finished-board': FinishedBoard;
  }
}
