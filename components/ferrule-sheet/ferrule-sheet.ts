import { LitElement, html, nothing, type PropertyValues, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { guard } from 'lit/directives/guard.js';
import { isResistive } from '../../src/network/termination-at.ts';
import type { Method } from '../../src/record/design-record.ts';
import { fieldsOf, type FieldName, type Fields } from '../../src/record/fields.ts';
import { InputError, formatProblem } from '../../src/quantity/problem.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { base } from '../base/base.styles.ts';
import type { FieldChange } from '../base/field-change.ts';
import type { ContentsEntry } from '../contents-rule/contents-rule.ts';
import '../contents-rule/contents-rule.ts';
import '../evidence-part/evidence-part.ts';
import '../given-part/given-part.ts';
import '../network-part/network-part.ts';
import '../options-part/options-part.ts';
import '../record-part/record-part.ts';
import '../response-part/response-part.ts';
import '../sheet-part/sheet-part.ts';
import '../title-block/title-block.ts';
import { pathOf, readAddress, writeAddress } from './address.ts';
import { styles } from './ferrule-sheet.styles.ts';
import { givenLine, outcome } from './outcome.ts';
import { judge, parts, type Part } from './parts.ts';
import { settle, type Settled } from './settle.ts';

/** Pauses after the last keystroke, ms: before the address is written, and before the outcome is said aloud. */
const pause = { address: 150, voice: 1200 } as const;
/** More of a file than this can't be a record, bytes. */
const mostRead = 5_000_000;

/** A whole calculation sheet. Holds what is typed, has it computed, and hands the result to the parts. */
@customElement('ferrule-sheet')
export class FerruleSheet extends LitElement {
  static override styles = [base, styles];

  @property() method: Method = 'two-element';
  /** Of the sheet, as in the masthead. */
  @property() name = '';
  /** What the sheet opens with when its address holds nothing. */
  @property({ type: Object }) demo: Fields = {};

  @state() private settled!: Settled;
  /** What the parts after the options show: the same, one frame later, so that the options answer a keystroke at once. */
  @state() private following!: Settled;
  @state() private said = '';
  @state() private opened = '';
  @state() private dragging = false;
  private addressTimer = 0;
  private voiceTimer = 0;
  private frame = 0;
  private entries: readonly ContentsEntry[] = [];

  override connectedCallback() {
    super.connectedCallback();
    addEventListener('hashchange', this.readHash);
    addEventListener('dragover', this.dragOver);
    addEventListener('dragleave', this.dragLeave);
    addEventListener('drop', this.drop);
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    removeEventListener('hashchange', this.readHash);
    removeEventListener('dragover', this.dragOver);
    removeEventListener('dragleave', this.dragLeave);
    removeEventListener('drop', this.drop);
    clearTimeout(this.addressTimer);
    clearTimeout(this.voiceTimer);
    cancelAnimationFrame(this.frame);
  }

  protected override willUpdate(changed: PropertyValues) {
    if (changed.has('demo')) this.readHash();
    if (changed.has('following')) {
      this.entries = parts.map((part, index) => ({
        number: index + 1,
        name: part.name,
        ...judge(part, this.following),
      }));
    }
  }

  protected override updated() {
    if (this.following === this.settled) return;
    cancelAnimationFrame(this.frame);
    this.frame = requestAnimationFrame(() => setTimeout(() => (this.following = this.settled)));
  }

  override render() {
    return html`
      <div class=${this.dragging ? 'sheet dragging' : 'sheet'} @field-change=${this.change}>
        <given-part
          class="given"
          .method=${this.method}
          .state=${this.settled}
          .summary=${givenLine(this.settled)}
          .judged=${judge(parts[0]!, this.settled)}
          .basis=${parts[0]!.basis(this.method)}
          .realSource=${this.settled.dossier !== null && isResistive(this.settled.dossier.record.source)}
        ></given-part>
        <div class="document">
          ${guard([this.following, this.name], () => this.renderTitle())}
          ${parts.map((part, index) => (part.name === 'Given' ? nothing : this.renderPart(part, index + 1)))}
        </div>
        <contents-rule class="contents" .entries=${this.entries} @reveal-part=${this.reveal}></contents-rule>
        <p class="unseen" role="status">${this.said}</p>
      </div>
    `;
  }

  private renderTitle(): TemplateResult {
    const { fields, dossier, stale } = this.following;
    const { title = '', number = '', revision = '', date = '', ticket = '' } = fields;
    return html`<title-block
      .sheet=${this.name}
      .identity=${{ title, number, revision, date, ticket }}
      .outcome=${dossier === null ? 'Nothing is computed yet: correct the entries that are marked.' : outcome(dossier)}
      ?stale=${stale && dossier !== null}
    ></title-block>`;
  }

  private renderPart(part: Part, number: number): TemplateResult {
    const shown = part.name === 'Options' ? this.settled : this.following;
    const { verdict, words } = judge(part, shown);
    return html`<sheet-part
      .number=${number}
      .name=${part.name}
      .basis=${part.basis(this.method)}
      .verdict=${verdict}
      .words=${words}
      ?stale=${shown.stale && shown.dossier !== null && part.name !== 'Record and report'}
      >${this.renderBody(part, shown)}</sheet-part
    >`;
  }

  private renderBody({ name }: Part, shown: Settled): TemplateResult | typeof nothing {
    const { dossier } = shown;
    switch (name) {
      case 'Given':
        return nothing;
      case 'Options':
        return html`<options-part .dossier=${dossier} .state=${shown} .notice=${shown.notice}></options-part>`;
      case 'Network':
        return html`<network-part .dossier=${dossier}></network-part>`;
      case 'Response':
        return html`<response-part .dossier=${dossier} .state=${shown}></response-part>`;
      case 'Evidence':
        return html`<evidence-part .dossier=${dossier}></evidence-part>`;
      case 'Record and report':
        return html`<record-part
          .dossier=${dossier}
          .state=${shown}
          .stale=${shown.stale}
          .opened=${this.opened}
          .link=${this.link}
          @open-file=${(event: CustomEvent<File>) => this.open(event.detail)}
        ></record-part>`;
    }
  }

  private readonly readHash = () => {
    const fields = readAddress(location.hash);
    // An address that names a place in the page, and no sheet, must not take what is typed away.
    if (fields === null && location.hash !== '' && this.hasUpdated) this.writeHash();
    else this.take(fields ?? this.demo);
  };

  private take(fields: Fields) {
    // A sheet serves several methods; an address that asks for one of another sheet gets this sheet's own.
    const method = pathOf(fields.method) === pathOf(this.method) ? fields.method : this.method;
    this.settled = settle({ ...fields, method: method ?? this.method }, null);
    this.following = this.settled;
  }

  private change(event: CustomEvent<FieldChange>) {
    const { name, value } = event.detail;
    this.opened = '';
    this.settled = settle({ ...this.settled.fields, [name]: value }, this.settled);
    clearTimeout(this.addressTimer);
    this.addressTimer = window.setTimeout(this.writeHash, pause.address);
    clearTimeout(this.voiceTimer);
    this.voiceTimer = window.setTimeout(() => (this.said = this.voice(name)), pause.voice);
  }

  private readonly writeHash = () => {
    clearTimeout(this.addressTimer);
    history.replaceState(history.state, '', `#${writeAddress(this.settled.fields)}`);
  };

  private readonly link = () => {
    this.writeHash();
    return location.href;
  };

  /** What is said after a pause in typing: the problem of the field just typed in, or the outcome. */
  private voice(name: FieldName): string {
    const { problems, stale, dossier, notice } = this.settled;
    const problem = problems[name] ?? Object.values(problems)[0];
    if (stale || dossier === null) return problem ?? '';
    return `${notice} ${outcome(dossier)}`.trim();
  }

  private reveal(event: CustomEvent<number>) {
    const { number } = { number: event.detail };
    const given = this.renderRoot.querySelector('given-part');
    if (number === 1) given?.scrollIntoView({ block: 'start' });
    else this.renderRoot.querySelectorAll('sheet-part')[number - 2]?.reveal();
  }

  private readonly dragOver = (event: DragEvent) => {
    if (!event.dataTransfer?.types.includes('Files')) return;
    event.preventDefault();
    this.dragging = true;
  };

  private readonly dragLeave = (event: DragEvent) => {
    if (event.relatedTarget === null) this.dragging = false;
  };

  private readonly drop = (event: DragEvent) => {
    const file = event.dataTransfer?.files[0];
    if (file === undefined) return;
    event.preventDefault();
    this.dragging = false;
    void this.open(file);
  };

  /** Reads a record from a file; the sheet stays as it is when the file holds none. */
  private async open(file: File) {
    try {
      const record = readRecord(await file.slice(0, mostRead).text());
      const fields = fieldsOf(record);
      if (pathOf(record.method) !== pathOf(this.method)) {
        location.assign(`${import.meta.env.BASE_URL}${pathOf(record.method)}#${writeAddress(fields)}`);
        return;
      }
      this.take(fields);
      this.writeHash();
      this.opened = `Opened ${file.name}: ${record.identity.title}, revision ${record.identity.revision}.`;
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      const [first, ...others] = error.problems;
      const more = others.length === 0 ? '' : ` (and ${String(others.length)} more)`;
      this.opened = `${file.name} can’t be opened. ${first === undefined ? '' : formatProblem(first)}${more}`;
    }
    this.said = this.opened;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'ferrule-sheet': FerruleSheet;
  }
}
