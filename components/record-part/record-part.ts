import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { Dossier } from '../../src/dossier.ts';
import type { FieldName } from '../../src/record/fields.ts';
import { fileName } from '../../src/record/file-name.ts';
import '../area-field/area-field.ts';
import { base } from '../base/base.styles.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { field } from '../base/field.styles.ts';
import '../copy-button/copy-button.ts';
import '../text-field/text-field.ts';
import { save } from '../base/save.ts';
import { exportFile, recordFile, reportFile, type Paper } from './files.ts';
import { styles } from './record-part.styles.ts';

const signers = ['prepared', 'checked', 'approved'] as const;

/**
 * Part 8: what identifies the document, who signs it, and the ways in and out.
 * @fires field-change  identity and sign-off
 * @fires open-file     detail: a File that the user picked
 */
@customElement('record-part')
export class RecordPart extends LitElement {
  static override styles = [base, field, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** The dossier is of an earlier entry: nothing may be issued from it. */
  @property({ type: Boolean }) stale = false;
  /** How far real parts are worked out: nothing may be issued before they all are. */
  @property() realParts: 'none' | 'at work' | 'stopped' | 'whole' = 'none';
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
      </div>
      <h3>Sign-off</h3>
      ${signers.map(
        (signer) => html`
          <fieldset class="signer">
            <legend>${signer.charAt(0).toUpperCase()}${signer.slice(1)}</legend>
            ${this.text(`${signer}-name`, 'Name')} ${this.text(`${signer}-role`, 'Role')}
            ${this.text(`${signer}-date`, 'Date')}
          </fieldset>
        `,
      )}
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
    const problem = Object.values(this.state.problems)[0];
    if (!ready) {
      this.said =
        problem === undefined
          ? 'Nothing is issued while the search is at work.'
          : `Nothing is issued until every entry can be read. ${problem}`;
    }
    return ready;
  }

  private whole(): boolean {
    return !this.stale && (this.realParts === 'none' || this.realParts === 'whole');
  }

  /** Says why nothing is issued while real parts are on their way. */
  private builtReady(): boolean {
    if (this.whole()) return true;
    this.said =
      this.realParts === 'stopped'
        ? 'Nothing is issued until every network is worked out with real parts: work out the rest in part 7.'
        : 'Nothing is issued while real parts are being worked out.';
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
