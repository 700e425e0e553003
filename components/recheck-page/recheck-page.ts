import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, state } from 'lit/decorators.js';
import { classMap } from 'lit/directives/class-map.js';
import { formatProblem } from '../../src/quantity/problem.ts';
import type { ComparedFigure } from '../../src/recheck/compare-figures.ts';
import { facts, recheckText, verdictWords } from '../../src/recheck/recheck-words.ts';
import type { Recheck } from '../../src/recheck/recheck.ts';
import type { FromRecheck } from '../../src/workers/recheck-messages.ts';
import { base } from '../base/base.styles.ts';
import { dataTable } from '../base/data-table.ts';
import { table } from '../base/table.styles.ts';
import '../copy-button/copy-button.ts';
import { verdictMark, verdictStyles, type Verdict } from '../verdict-mark/verdict-mark.ts';
import { checkFile } from './check-file.ts';
import { styles } from './recheck-page.styles.ts';
import { rowsOf } from './rows.ts';

type Progress = Extract<FromRecheck, { kind: 'progress' }>;

const doingWords: Readonly<Record<Progress['doing'], string>> = {
  search: 'Searching networks as the record asks',
  parts: 'Working out every network with real parts',
  report: 'Writing the report anew to compare it',
};

const marks: Readonly<Record<Recheck['verdict'], Verdict>> = {
  same: 'meets',
  'within rounding': 'meets',
  differs: 'falls short',
  recomputed: 'not assessed',
};

/** A report or a record is dropped or picked, computed anew in a worker, and compared with what was printed. */
@customElement('recheck-page')
export class RecheckPage extends LitElement {
  static override styles = [base, table, verdictStyles, styles];

  @state() private name = '';
  /** null: nothing is being rechecked. */
  @state() private progress: { readonly words: string; readonly done: number | null } | null = null;
  @state() private refused = '';
  @state() private recheck: Recheck | null = null;
  @state() private over = false;
  private end: () => void = () => undefined;

  override connectedCallback() {
    super.connectedCallback();
    // Anywhere on the page: a file dropped beside the box would open in place of the page.
    addEventListener('dragover', this.drag);
    addEventListener('dragleave', this.leave);
    addEventListener('drop', this.drop);
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    removeEventListener('dragover', this.drag);
    removeEventListener('dragleave', this.leave);
    removeEventListener('drop', this.drop);
    this.end();
  }

  override render() {
    return html`
      <h1>Recheck</h1>
      <p>
        A report (PDF) or a design record (JSON) is read, computed anew with today’s Ferrule, and compared with the
        figures that were printed in it. The file stays on this device.
      </p>
      <div class=${classMap({ drop: true, over: this.over })}>
        <label class="button">
          <input class="unseen" type="file" accept=".pdf,.json,application/pdf,application/json" @change=${this.pick} />
          Choose a file…
        </label>
        <p>or drop it anywhere on this page</p>
      </div>
      <p class="said" role="status">${this.said()}</p>
      ${
        this.progress === null
          ? nothing
          : html`<progress
              max="1"
              .value=${this.progress.done ?? 0}
              aria-label=${`Recheck of ${this.name}`}
            ></progress>`
      }
      ${this.recheck === null ? nothing : this.outcome(this.recheck)}
    `;
  }

  private said(): string | TemplateResult {
    if (this.progress !== null) return `${this.progress.words} …`;
    if (this.refused !== '') return html`<strong>Not rechecked.</strong> ${this.refused}`;
    return this.recheck === null ? '' : `${this.name} is rechecked.`;
  }

  private outcome(recheck: Recheck): TemplateResult {
    const figures = recheck.report?.figures ?? [];
    const of = (outcome: ComparedFigure['outcome']) => figures.filter((each) => each.outcome === outcome);
    return html`
      <h2>Outcome</h2>
      <p class="outcome">${verdictMark(marks[recheck.verdict], verdictWords(recheck))}</p>
      <h2>The document</h2>
      <dl>
        ${facts(recheck).map(
          ([label, words]) =>
            html`<dt>${label}</dt>
              <dd>${words}</dd>`,
        )}
      </dl>
      <p><copy-button label="Copy the outcome as text" .text=${() => recheckText(recheck)}></copy-button></p>
      ${this.figures('Figures that differ', of('differs'))}
      ${this.figures('Figures within rounding', of('within rounding'))}
      ${this.figures('Figures that are the same', of('same'), true)}
    `;
  }

  private figures(title: string, figures: readonly ComparedFigure[], folded = false): TemplateResult | typeof nothing {
    if (figures.length === 0) return nothing;
    const shown = dataTable(title, rowsOf(figures));
    return folded
      ? html`<details>
          <summary>${title}: ${figures.length}</summary>
          ${shown}
        </details>`
      : html`<h2>${title}</h2>
          ${shown}`;
  }

  private check(file: File) {
    this.end();
    this.name = file.name;
    this.recheck = null;
    this.refused = '';
    this.progress = { words: `Reading ${file.name}`, done: null };
    this.end = checkFile(file, this.hear);
  }

  private readonly hear = (message: FromRecheck) => {
    if (message.kind === 'progress') {
      this.progress = { words: doingWords[message.doing], done: message.done };
      return;
    }
    this.progress = null;
    if (message.kind === 'done') this.recheck = message.recheck;
    else this.refused = message.problems.map(formatProblem).join(' ');
  };

  private pick(event: Event) {
    const input = event.target as HTMLInputElement;
    const file = input.files?.[0];
    if (file !== undefined) this.check(file);
    // The same file, fetched anew, can be picked again.
    input.value = '';
  }

  private readonly drag = (event: DragEvent) => {
    event.preventDefault();
    this.over = true;
  };

  private readonly leave = () => {
    this.over = false;
  };

  private readonly drop = (event: DragEvent) => {
    event.preventDefault();
    this.over = false;
    const file = event.dataTransfer?.files[0];
    if (file !== undefined) this.check(file);
  };
}

declare global {
  interface HTMLElementTagNameMap {
    'recheck-page': RecheckPage;
  }
}
