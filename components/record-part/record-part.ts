import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { ticketMarkdown, ticketText } from '../../src/design/ticket.ts';
import type { Dossier } from '../../src/dossier.ts';
import type { EarlierRevision } from '../../src/record/design-record.ts';
import type { FieldName } from '../../src/record/fields.ts';
import { fileName } from '../../src/record/file-name.ts';
import '../area-field/area-field.ts';
import { base } from '../base/base.styles.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { field } from '../base/field.styles.ts';
import { table } from '../base/table.styles.ts';
import '../copy-button/copy-button.ts';
import '../difference-table/difference-table.ts';
import '../sign-off/sign-off.ts';
import '../text-field/text-field.ts';
import { save } from '../base/save.ts';
import { exportFile, recordFile, reportFile, type Paper } from './files.ts';
import { styles } from './record-part.styles.ts';

/**
 * Part 9: what identifies the document, what it changes, who signs it, and the ways in and out.
 * @fires field-change  identity and sign-off
 * @fires open-file     detail: a File that the user picked
 */
@customElement('record-part')
export class RecordPart extends LitElement {
  static override styles = [base, field, table, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** The dossier is of an earlier entry: nothing may be issued from it. */
  @property({ type: Boolean }) stale = false;
  /** How far real parts are worked out: nothing may be issued before they all are. */
  @property() realParts: 'none' | 'at work' | 'stopped' | 'whole' = 'none';
  /** More of the dossier is still to come: real parts, the finished board, what changed. */
  @property({ type: Boolean }) awaited = false;
  /** Earlier revisions, the oldest first. */
  @property({ attribute: false }) history: readonly EarlierRevision[] = [];
  /** The record is issued, and can be read. */
  @property({ type: Boolean }) frozen = false;
  /** Something was changed since it was issued. */
  @property({ type: Boolean }) waiting = false;
  /** Why the next revision can't be started, in one line. */
  @property() revisionSaid = '';
  /** Outcome of opening a file, in one line. */
  @property() opened = '';
  /** Address that holds the whole sheet. */
  @property({ attribute: false }) link: () => string = () => '';

  @state() private paper: Paper = 'a4';
  @state() private said = '';

  override render() {
    return html`
      <div class="identity">
        ${this.text('title', 'Title', 'wide')} ${this.text('number', 'Document number')}
        ${this.text('revision', 'Revision')} ${this.text('date', 'Date of issue')}
        ${this.text('ticket', 'Change ticket')} ${this.text('owner', 'Legal owner')}
        <area-field
          class="wide"
          single
          name="change"
          label="What it changes of the one before, and why"
          .value=${this.state.fields.change ?? ''}
          .problem=${this.state.problems.change ?? ''}
        ></area-field>
      </div>
      ${this.revisions()}
      <sign-off
        .dossier=${this.dossier}
        .state=${this.state}
        .unready=${this.unready()}
        ?frozen=${this.frozen}
        ?waiting=${this.waiting}
        .revisionSaid=${this.revisionSaid}
      ></sign-off>
      <h3>Report and record</h3>
      <div class="actions">
        <fieldset class="paper">
          <legend class="unseen">Paper</legend>
          ${(['a4', 'letter'] as const).map((paper) => this.sheetOf(paper))}
        </fieldset>
        <button type="button" class="main" aria-disabled=${!this.whole()} @click=${this.report}>
          Download the report (PDF)
        </button>
      </div>
      <div class="actions">
        <button type="button" aria-disabled=${this.stale} @click=${this.record}>Download the record (JSON)</button>
        <label class="button">
          <input class="unseen" type="file" accept=".json,application/json" @change=${this.pick} />
          Open a record…
        </label>
        <copy-button label="Copy a link to this sheet" .text=${this.link}></copy-button>
      </div>
      ${this.dossier === null ? nothing : this.ticket(this.dossier)}
      <div class="actions">
        <button type="button" aria-disabled=${!this.whole()} @click=${() => this.export('s2p')}>
          Download the network (.s2p)
        </button>
        <button type="button" aria-disabled=${!this.whole()} @click=${() => this.export('csv')}>
          Download the sweep (CSV)
        </button>
      </div>
      <p class="said" role="status">${this.said || this.opened}</p>
      ${this.dossier === null ? nothing : this.digest(this.dossier.digest)}
    `;
  }

  private text(name: FieldName, label: string, part = ''): TemplateResult {
    const { fields, problems } = this.state;
    return html`<text-field
      class=${part}
      .name=${name}
      .label=${label}
      .value=${fields[name] ?? ''}
      .problem=${problems[name] ?? ''}
    ></text-field>`;
  }

  /** Earlier revisions, and what this one changed of the last of them. */
  private revisions(): TemplateResult | typeof nothing {
    if (this.history.length === 0) return nothing;
    const previous = this.dossier?.record.previous ?? null;
    return html`<h3>Earlier revisions</h3>
      <div class="scroll" tabindex="0" role="group" aria-label="Earlier revisions">
        <table>
          <thead>
            <tr>
              <th scope="col">Revision</th>
              <th scope="col">Date</th>
              <th scope="col">What it changed, and why</th>
              <th scope="col">Digest</th>
            </tr>
          </thead>
          <tbody>
            ${this.history.map(
              ({ revision, date, change, digest }) =>
                html`<tr>
                  <th scope="row">${revision}</th>
                  <td class="value">${date}</td>
                  <td>${change || '–'}</td>
                  <td class="value">${digest.slice(0, 16)}…</td>
                </tr>`,
            )}
          </tbody>
        </table>
      </div>
      ${
        previous === null
          ? nothing
          : html`<difference-table
              .changes=${this.stale ? null : this.dossier!.difference}
              .since=${previous.identity.revision}
              ?awaited=${this.awaited || this.stale}
            ></difference-table>`
      }`;
  }

  /** What is pasted into a change ticket; of figures that aren't those of the entries, nothing is. */
  private ticket(dossier: Dossier): TemplateResult {
    if (!this.whole())
      return html`<p class="ticket muted">The text for the ticket follows when the figures are whole.</p>`;
    return html`<div class="actions ticket">
      <span>For the change ticket:</span>
      <copy-button label="Copy for the ticket" .text=${() => ticketText(dossier)}></copy-button>
      <copy-button label="Copy as Markdown for the ticket" .text=${() => ticketMarkdown(dossier)}></copy-button>
    </div>`;
  }

  private sheetOf(paper: Paper): TemplateResult {
    return html`<label>
      <input type="radio" name="paper" .checked=${paper === this.paper} @change=${() => (this.paper = paper)} />
      ${paper === 'a4' ? 'A4' : 'Letter'}
    </label>`;
  }

  private digest(digest: string): TemplateResult {
    return html`<p class="digest">
      Digest of the record (SHA-256, sign-off left out): <code>${digest.match(/.{8}/gu)?.join(' ')}</code>
      <copy-button label="Copy" .text=${() => digest}></copy-button>
    </p>`;
  }

  private async report() {
    if (!this.ready() || !this.builtReady()) return;
    const { dossier, paper } = this;
    this.said = 'Writing the report…';
    try {
      const file = await reportFile(dossier!, paper);
      save(file, fileName(dossier!.record, 'pdf'));
      this.said = 'The report is written.';
    } catch (error) {
      this.said = `The report could not be written: ${error instanceof Error ? error.message : String(error)}`;
    }
  }

  private record() {
    if (!this.ready()) return;
    save(recordFile(this.dossier!.record), fileName(this.dossier!.record, 'json'));
    this.said = 'The record is saved.';
  }

  private async export(kind: 's2p' | 'csv') {
    if (!this.ready() || !this.builtReady()) return;
    const dossier = this.dossier!;
    const file = await exportFile(dossier, kind);
    if (file === null) this.said = 'There is no network to save.';
    else {
      save(file, fileName(dossier.record, kind));
      this.said = kind === 's2p' ? 'The network is saved as a two-port file.' : 'The sweep is saved.';
    }
  }

  /** Says why nothing is issued while an entry can't be read. */
  private ready(): boolean {
    const ready = this.dossier !== null && !this.stale;
    if (!ready) this.said = this.unreadyWords();
    return ready;
  }

  private whole(): boolean {
    return this.unready() === '';
  }

  /** Why the dossier isn't whole, or isn't that of the entries; '' where it is. */
  private unready(): string {
    if (this.dossier === null || this.stale) {
      return Object.keys(this.state.problems).length > 0 ? 'an entry can’t be read' : 'the search is at work';
    }
    if (this.realParts === 'stopped') return 'not every network is worked out with real parts';
    if (this.realParts === 'at work') return 'real parts are being worked out';
    return this.awaited ? 'the finished board or the revision before is being compared' : '';
  }

  private unreadyWords(): string {
    const problem = Object.values(this.state.problems)[0];
    return problem === undefined
      ? 'Nothing is issued while the search is at work.'
      : `Nothing is issued until every entry can be read. ${problem}`;
  }

  /** Says why nothing is issued while more of it is on its way. */
  private builtReady(): boolean {
    if (this.whole()) return true;
    this.said =
      this.realParts === 'stopped'
        ? 'Nothing is issued until every network is worked out with real parts: work out the rest in part 7.'
        : `Nothing is issued yet: ${this.unready()}.`;
    return false;
  }

  private pick(event: Event) {
    const input = event.target as HTMLInputElement;
    const file = input.files?.[0];
    this.said = '';
    if (file !== undefined) this.dispatchEvent(new CustomEvent('open-file', { detail: file }));
    // The same file, corrected, can be picked again.
    input.value = '';
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'record-part': RecordPart;
  }
}
