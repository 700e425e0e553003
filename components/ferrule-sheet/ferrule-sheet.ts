import { LitElement, html, nothing, type PropertyValues, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { guard } from 'lit/directives/guard.js';
import { isResistive } from '../../src/network/termination-at.ts';
import type { AsBuilt, DesignRecord, Method } from '../../src/record/design-record.ts';
import type { FitStep } from '../../src/design/fitted.ts';
import type { Dossier } from '../../src/dossier.ts';
import { fieldsOf, type FieldName, type Fields } from '../../src/record/fields.ts';
import { keptOf } from '../../src/record/kept.ts';
import { InputError, formatProblem } from '../../src/quantity/problem.ts';
import { readDraft } from '../../src/record/draft.ts';
import { attachmentsOf, type Attachments } from '../../src/record/read-termination.ts';
import type { DraftKeeper, Recalled } from '../record-store/draft-keeper.ts';
import type { Opened } from '../record-store/entry.ts';
import type { Keeping } from '../record-store/keeping.ts';
import type { FromWorker } from '../../src/workers/messages.ts';
import { base } from '../base/base.styles.ts';
import type { FieldChange } from '../base/field-change.ts';
import { serves } from '../base/methods.ts';
import { count } from '../base/words.ts';
import '../build-progress/build-progress.ts';
import '../ceiling-part/ceiling-part.ts';
import type { ContentsEntry } from '../contents-rule/contents-rule.ts';
import '../given-part/given-part.ts';
import '../options-part/options-part.ts';
import '../sheet-part/sheet-part.ts';
import '../title-block/title-block.ts';
import { pathOf, readAddress, writeAddress } from './address.ts';
import { alongWith } from './along-with.ts';
import { holdsData, recall, remember, tableName, withState } from './attachments.ts';
import { styles } from './ferrule-sheet.styles.ts';
import { changedFields, isFrozen, waitingFor, type Waiting } from './frozen.ts';
import { keptFor, noneKept, recallKept, rememberKept, withStock, type KeptOf } from './kept.ts';
import type { LongWork } from './long-work.ts';
import { givenLine, outcome } from './outcome.ts';
import { judge, parts, type Part } from './parts.ts';
import {
  type Settled,
  exact,
  finished,
  goingOn,
  ground,
  lostChoice,
  lostNotice,
  refused,
  retyped,
  settle,
  stopped,
  withOption,
  withoutChoice,
} from './settle.ts';
import { today } from './today.ts';

/**
 * Pauses after the last keystroke, ms: before the address is written, before the outcome is said aloud, before work
 * begins that takes long, and before real parts are worked out.
 */
const pause = { address: 150, voice: 1200, work: 250, build: 150 } as const;
/** More of a file than this can't be a record, bytes. */
const mostRead = 50_000_000;
/** More than this isn't read as measured data, bytes. */
const mostMeasured = 200_000_000;
/** The heading of a stock list stands within so many bytes, after its comments. */
const mostHeading = 20_000;
const tooLarge = { field: 'list', read: '', why: 'it is larger than 50 MB', would: 'give the parts in question' };

const waits =
  'This revision is issued and frozen: what is changed waits for the next one, for which a reason is asked.';

/**
 * A whole calculation sheet. Holds what is typed, has it computed, and hands the result to the parts. Longer than others
 * because it is the one element with state: address, files dropped, search at work and voice all answer to it.
 */
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
  /** How far the search has come; null while none is seen to be at work. */
  @state() private progress: FitStep | null = null;
  @state() private attachments: Attachments = new Map();
  @state() private dataSaid = '';
  @state() private kept: KeptOf = noneKept;
  /** Outcome of reading a stock list: a line, or one for each problem. */
  @state() private stockSaid: readonly string[] = [];
  /** Since the record was issued; null: nothing. */
  @state() private waiting: Waiting | null = null;
  /** Why the next revision can't be started, in one line. */
  @state() private revisionSaid = '';
  /** Outcome of reading what was measured on the finished board, in one line. */
  @state() private boardSaid = '';
  /** How it stands with keeping what is typed; null: nothing is kept yet. */
  @state() private keeping: Keeping | null = null;
  /** What was typed last time, to go on with; null: nothing is offered. */
  @state() private offer: Recalled | null = null;
  /** Fetched after the first result. */
  private keeper: DraftKeeper | null = null;
  /** Something was typed since the document was opened. */
  private touched = false;
  /** A file of which a port is to be chosen. */
  @state() private twoPort: { readonly name: string; readonly text: string } | null = null;
  /** Fetched with the first record that takes long. */
  private work: LongWork | null = null;
  private workTimer = 0;
  private stopping = false;
  /** Work was told of, and its outcome is waited for. */
  private awaited = false;
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
    clearTimeout(this.workTimer);
    this.work?.end();
    this.keeper?.close();
    cancelAnimationFrame(this.frame);
  }

  protected override willUpdate(changed: PropertyValues) {
    if (changed.has('demo')) {
      this.attachments = recall();
      this.kept = recallKept();
      this.readHash();
    }
    if (changed.has('following')) {
      this.entries = parts.map((part, index) => ({
        number: index + 1,
        name: part.name,
        ...judge(part, this.following),
      }));
    }
  }

  /** What stands below is fetched once the first result is painted. */
  protected override firstUpdated() {
    requestAnimationFrame(() =>
      setTimeout(() => {
        void import('./later.ts').then(({ groundsOf, DraftKeeper, keptIdIn }) => {
          this.settled = ground(this.settled, groundsOf);
          const keeper = new DraftKeeper(this.method, (keeping) => (this.keeping = keeping));
          void this.recallWith(keeper, keptIdIn(location.hash));
        });
      }),
    );
  }

  protected override updated() {
    if (this.following === this.settled) return;
    cancelAnimationFrame(this.frame);
    this.frame = requestAnimationFrame(() => setTimeout(() => (this.following = this.settled)));
  }

  override render() {
    return html`
      <div
        class=${this.dragging ? 'sheet dragging' : 'sheet'}
        @field-change=${(event: CustomEvent<FieldChange>) => this.change(event.detail)}
        @data-file=${(event: CustomEvent<File>) => this.addFile(event.detail)}
        @data-table=${(event: CustomEvent<string>) => this.addData(event.detail, tableName(this.attachments), 1)}
        @data-port=${this.answerPort}
        @stock-file=${(event: CustomEvent<File>) => this.addStock(event.detail)}
        @board-file=${(event: CustomEvent<File>) => this.addBoard(event.detail)}
        @board-change=${(event: CustomEvent<AsBuilt | null>) => this.setBoard(event.detail)}
        @revision-start=${(event: CustomEvent<string>) => this.startRevision(event.detail)}
        @revision-back=${this.putBack}
        @build-stop=${this.stopBuild}
        @build-on=${this.goOn}
      >
        <given-part
          class="given"
          .method=${this.method}
          .state=${this.settled}
          .dossier=${this.settled.dossier}
          .attachments=${this.attachments}
          .dataSaid=${this.dataSaid}
          .twoPort=${this.twoPort?.name ?? ''}
          .summary=${givenLine(this.settled)}
          .judged=${judge(parts[0]!, this.settled)}
          .basis=${parts[0]!.basis(this.settled.fields.method)}
          .realSource=${this.settled.dossier !== null && isResistive(this.settled.dossier.record.source)}
        ></given-part>
        ${this.waiting === null ? nothing : this.renderWaiting(this.waiting)}
        <div class="document">
          ${guard([this.following, this.name, this.progress === null], () => this.renderTitle())}
          <kept-line
            .keeping=${this.keeping}
            .offer=${this.offer}
            @kept-other=${this.showOther}
            @kept-go-on=${this.goOnWithKept}
            @kept-leave=${() => (this.offer = null)}
          ></kept-line>
          <search-progress
            .step=${this.settled.pending === null ? null : this.progress}
            .stoppedAfter=${this.settled.dossier?.record.fit.steps === null ? '' : (this.settled.fields.steps ?? '')}
            @search-stop=${this.stopSearch}
            @search-on=${() => this.change({ name: 'steps', value: '' })}
          ></search-progress>
          <build-progress
            .dossier=${this.settled.dossier}
            .realParts=${this.settled.realParts}
            ?idle=${this.settled.building === null}
          ></build-progress>
          ${parts.map((part, index) => (part.name === 'Given' ? nothing : this.renderPart(part, index + 1)))}
        </div>
        <contents-rule class="contents" .entries=${this.entries} @reveal-part=${this.reveal}></contents-rule>
        <p class="unseen" role="status">${this.said}</p>
      </div>
    `;
  }

  private renderWaiting({ issued, board }: Waiting): TemplateResult {
    const { fields } = this.settled;
    return html`<start-revision
      class="waiting"
      floating
      .issued=${issued.revision ?? ''}
      .typed=${fields.revision ?? ''}
      .entries=${changedFields(issued, fields).length}
      ?board=${board !== undefined}
      .said=${this.revisionSaid}
    ></start-revision>`;
  }

  private renderTitle(): TemplateResult {
    const { fields, dossier, pending } = this.following;
    const { title = '', number = '', revision = '', date = '', ticket = '' } = fields;
    const none =
      pending === null
        ? 'Nothing is computed yet: correct the entries that are marked.'
        : 'Nothing is computed yet: the search is at work.';
    return html`<title-block
      .sheet=${this.name}
      .identity=${{ title, number, revision, date, ticket }}
      .outcome=${dossier === null ? none : outcome(dossier)}
      .stale=${dossier === null ? '' : this.staleWords(this.following)}
    ></title-block>`;
  }

  /** Why the figures shown aren't those of the texts; '' when they are, or will be before anyone could read it. */
  private staleWords({ stale, pending }: Settled): string {
    if (!stale) return '';
    if (pending === null) return 'Of the last entry that could be read.';
    return this.progress === null ? '' : 'Of the entry before: the search is at work.';
  }

  private renderPart(part: Part, number: number): TemplateResult {
    const shown = part.name === 'Options' ? this.settled : this.following;
    const { verdict, words } = judge(part, shown);
    return html`<sheet-part
      .number=${number}
      .name=${part.name}
      .basis=${part.basis(this.settled.fields.method)}
      .verdict=${verdict}
      .words=${words}
      .stale=${shown.dossier === null || part.name === 'Record and report' ? '' : this.staleWords(shown)}
      >${this.renderBody(part, shown)}</sheet-part
    >`;
  }

  private renderBody({ name }: Part, shown: Settled): TemplateResult | typeof nothing {
    const { dossier } = shown;
    switch (name) {
      case 'Given':
        return nothing;
      case 'Ceiling':
        return html`<ceiling-part .dossier=${dossier}></ceiling-part>`;
      case 'Options':
        return html`<options-part
          .sheet=${this.method}
          .dossier=${dossier}
          .state=${shown}
          .notice=${shown.notice}
        ></options-part>`;
      case 'Network':
        return html`<network-part .dossier=${dossier}></network-part>`;
      case 'Response':
        return html`<response-part .dossier=${dossier} .state=${shown}></response-part>`;
      case 'Evidence':
        return html`<evidence-part .dossier=${dossier}></evidence-part>`;
      case 'Build':
        return html`<build-part
          .dossier=${dossier}
          .state=${shown}
          .realParts=${shown.realParts}
          ?idle=${shown.building === null}
          .stocked=${this.kept.stock}
          .said=${this.stockSaid}
        ></build-part>`;
      case 'Finished board':
        return html`<finished-board
          .dossier=${dossier}
          .board=${this.waiting?.board === undefined ? this.kept.asBuilt : this.waiting.board}
          ?waiting=${this.waiting?.board !== undefined}
          ?awaited=${shown.stale || shown.building !== null}
          .said=${this.boardSaid}
        ></finished-board>`;
      case 'Record and report':
        return html`<record-part
          .dossier=${dossier}
          .state=${shown}
          .stale=${shown.stale}
          .realParts=${shown.realParts}
          ?awaited=${shown.building !== null}
          .history=${this.kept.history}
          ?frozen=${this.frozen}
          ?waiting=${this.waiting !== null}
          .revisionSaid=${this.revisionSaid}
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
    else {
      this.beginOther();
      this.take(fields ?? this.demo);
    }
  };

  /** Another document is shown from now on. */
  private beginOther() {
    this.touched = false;
    this.offer = null;
    this.keeper?.begin();
  }

  /** What is typed is kept from now on; what was kept before is shown, or offered where the address holds another sheet. */
  private async recallWith(keeper: DraftKeeper, id: string | null) {
    this.keeper = keeper;
    if (this.touched) {
      this.keepTyped();
      return;
    }
    const shown = this.settled.fields;
    const found = id === null ? await keeper.recall(readAddress(location.hash)) : await keeper.open(id);
    // Whoever was quicker goes on with what was typed.
    if (this.settled.fields !== shown) return;
    if (found === null) {
      if (id !== null) this.opened = 'What this address opens isn’t kept in this browser any more.';
    } else if ('own' in found && !found.own) this.offer = found as Recalled;
    else this.showKept(found);
  }

  private showKept(found: Opened) {
    this.attach(found.attachments);
    this.keep({ ...found.kept, document: found.fields.number ?? '' });
    this.take(found.fields);
    this.touched = true;
    this.offer = null;
    this.writeHash();
  }

  private readonly goOnWithKept = async () => {
    const found = this.offer === null ? null : await this.keeper?.open(this.offer.entry.id);
    if (found === null || found === undefined) this.offer = null;
    else this.showKept(found);
  };

  private readonly showOther = async () => {
    const found = await this.keeper?.openOther();
    if (found !== null && found !== undefined) this.showKept(found);
  };

  /** An issued record is kept as a frozen revision; any other as it is typed. */
  private keepTyped() {
    this.touched = true;
    this.offer = null;
    const { fields } = this.settled;
    this.keeper?.keep(fields, this.kept, this.attachments);
    if (fields.state !== 'issued') return;
    const { record } = readDraft(fields, this.attachments, this.kept);
    if (record !== null) void this.keepIssued(record);
  }

  private async keepIssued(record: DesignRecord) {
    const problem = (await this.keeper?.saveIssued(record)) ?? null;
    if (problem !== null) this.opened = this.said = formatProblem(problem);
  }

  private take(fields: Fields) {
    // A sheet serves several methods; an address that asks for one of another sheet gets this sheet's own.
    const method = serves(this.method, fields.method) ? fields.method : this.method;
    this.keep(keptFor(this.kept, fields));
    this.waiting = null;
    this.boardSaid = '';
    this.revisionSaid = '';
    this.settleTo(settle({ ...fields, method }, null, this.attachments, this.kept));
    this.following = this.settled;
  }

  /** @param delay before a search begins, ms */
  private settleTo(settled: Settled, delay = 0) {
    clearTimeout(this.workTimer);
    this.work?.drop();
    this.stopping = false;
    this.settled = settled;
    const { pending, building } = settled;
    if (pending === null) this.progress = null;
    const record = pending ?? building;
    if (record === null) return;
    this.workTimer = window.setTimeout(() => void this.begin(record), pending === null ? pause.build : delay);
  }

  private async begin(record: DesignRecord) {
    const { LongWork } = await import('./long-work.ts');
    this.work ??= new LongWork((message) => this.hear(message));
    const { pending, building } = this.settled;
    if (record === (pending ?? building)) this.work.start(record);
  }

  private hear(message: FromWorker) {
    const { pending } = this.settled;
    switch (message.kind) {
      case 'progress':
        if (pending !== null) this.progress = message.step;
        return;
      case 'exact':
        if (pending !== null) this.settled = exact(this.settled, message.dossier, this.noticeOf(message.dossier));
        return;
      case 'option':
        this.settled = withOption(this.settled, message.option);
        return;
      case 'refused':
        if (pending !== null && lostChoice(message.problems)) this.work?.start(withoutChoice(pending));
        else {
          this.settled = refused(this.settled, message.problems);
          this.progress = null;
        }
        return;
      case 'done':
        this.finish(message.dossier);
    }
  }

  private finish(dossier: Dossier) {
    const searching = this.progress !== null;
    const steps = this.progress?.steps;
    this.settled = finished(this.settled, dossier, this.noticeOf(dossier));
    this.progress = null;
    if (searching || this.awaited) this.said = outcome(dossier);
    this.awaited = false;
    // With the number of steps in it the record gives the same networks again.
    if (this.stopping && steps !== undefined) this.change({ name: 'steps', value: String(steps) }, 0);
  }

  /** Why a dossier that was waited for isn't of the network chosen; otherwise as it is said already. */
  private noticeOf(dossier: Dossier): string {
    const { pending, notice } = this.settled;
    if (pending === null) return notice;
    return pending.selection.option === dossier.record.selection.option ? '' : lostNotice(dossier);
  }

  private stopSearch() {
    this.stopping = true;
    this.work?.stop();
  }

  private stopBuild() {
    clearTimeout(this.workTimer);
    this.work?.stop();
    this.settled = stopped(this.settled);
  }

  private goOn() {
    const { building } = this.settled;
    if (building === null) return;
    this.settled = goingOn(this.settled);
    void this.begin(building);
  }

  private change({ name, value }: FieldChange, delay: number = name === 'choice' ? 0 : pause.work) {
    this.changeAll({ ...alongWith({ name, value }, this.settled.dossier), [name]: value }, name, delay);
  }

  /** @param name of the field that was typed in */
  private changeAll(changed: Fields, name: FieldName, delay: number = pause.work) {
    this.opened = '';
    const fields = { ...this.settled.fields, ...changed };
    if (this.frozen) {
      this.wait({}, fields);
      return;
    }
    // A document that is numbered anew is the same document.
    if (name === 'number') this.keep({ ...this.kept, document: changed.number ?? '' });
    this.settleTo(settle(fields, this.settled, this.attachments, this.kept), delay);
    this.keepTyped();
    clearTimeout(this.addressTimer);
    this.addressTimer = window.setTimeout(this.writeHash, pause.address);
    clearTimeout(this.voiceTimer);
    this.awaited = false;
    this.voiceTimer = window.setTimeout(() => (this.said = this.voice(name)), pause.voice);
  }

  private get frozen(): boolean {
    return this.waiting !== null || isFrozen(this.settled);
  }

  /** An issued record stays as it is: what is typed stands in its field, and waits for the next revision. */
  private wait(more: Partial<Waiting>, fields: Fields) {
    this.waiting = waitingFor({ issued: this.settled.fields, ...this.waiting, ...more }, fields);
    this.settled = retyped(this.settled, fields, this.attachments, this.kept);
    this.revisionSaid = '';
    clearTimeout(this.voiceTimer);
    this.voiceTimer = window.setTimeout(() => (this.said = this.waiting === null ? '' : waits), pause.voice);
  }

  private putBack() {
    if (this.waiting === null) return;
    this.settled = retyped(this.settled, this.waiting.issued, this.attachments, this.kept);
    this.waiting = null;
    this.boardSaid = '';
    this.revisionSaid = '';
  }

  private async startRevision(change: string) {
    const { startNext } = await import('./next.ts');
    const typed = this.settled.fields;
    const waiting = this.waiting ?? { issued: typed };
    const draft = readDraft(waiting.issued, this.attachments, this.kept);
    const next = startNext(draft, waiting, typed, change, today());
    if ('problem' in next) {
      this.revisionSaid = formatProblem(next.problem);
      return;
    }
    const { stock } = this.kept;
    this.keep({ ...next.kept, stock, document: next.fields.number ?? '' });
    this.waiting = null;
    this.revisionSaid = '';
    this.settleTo(settle(next.fields, this.settled, this.attachments, this.kept));
    this.beginOther();
    this.keepTyped();
    this.writeHash();
    this.said = `Revision ${next.fields.revision ?? ''} is started, as a draft.`;
  }

  private async addBoard(file: File) {
    const { readBoard } = await import('./board.ts');
    const { measured, words } = await readBoard(file);
    this.boardSaid = measured === null ? words : '';
    if (measured !== null) this.setBoard({ measured, state: null, note: '' });
    this.said = words;
  }

  private setBoard(board: AsBuilt | null) {
    if (board === null) this.boardSaid = '';
    if (this.frozen) {
      this.wait({ board }, this.settled.fields);
      return;
    }
    this.keep({ ...this.kept, asBuilt: board });
    this.settleTo(settle(this.settled.fields, this.settled, this.attachments, this.kept), pause.work);
    this.keepTyped();
  }

  private readonly writeHash = () => {
    clearTimeout(this.addressTimer);
    history.replaceState(history.state, '', `#${writeAddress(this.waiting?.issued ?? this.settled.fields)}`);
  };

  private readonly link = () => {
    this.writeHash();
    return location.href;
  };

  /** What is said after a pause in typing: the problem of the field just typed in, or the outcome. */
  private voice(name: FieldName): string {
    const { problems, stale, dossier, notice, pending, realParts } = this.settled;
    if (pending !== null) return 'The search is at work.';
    if (realParts === 'at work') {
      this.awaited = true;
      return 'Real parts are being worked out.';
    }
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
    void this.takeFile(file);
  };

  /** A file of any kind that the sheet can use. */
  private async takeFile(file: File) {
    const { isStockList } = await import('./stock.ts');
    if (!holdsData(file.name)) await this.open(file);
    else if (isStockList(await file.slice(0, mostHeading).text())) await this.addStock(file);
    else await this.addFile(file);
  }

  /** Reads a stock list and takes parts from it, of the kinds that it has; what is typed stays where it can't be read. */
  private async addStock(file: File) {
    const { readStockList, stockFields, stockProblems, stockWords } = await import('./stock.ts');
    try {
      if (file.size > mostRead) throw new InputError(tooLarge);
      const list = readStockList(await file.text(), file.name);
      this.keep(withStock(this.kept, list));
      this.stockSaid = [stockWords(list)];
      this.changeAll(stockFields(list), 'stock');
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      this.stockSaid = stockProblems(file.name, error.problems);
    }
  }

  private keep(kept: KeptOf) {
    if (kept === this.kept) return;
    this.kept = kept;
    rememberKept(kept);
  }

  /** Takes measured data from a file, once it is known of which port. */
  private async addFile(file: File) {
    this.twoPort = null;
    if (file.size > mostMeasured) {
      this.dataSaid = `${file.name} can’t be read: it is larger than 200 MB; keep the band that matters`;
      return;
    }
    const text = await file.text();
    this.dataSaid = '';
    if (/\.s2p$/iu.test(file.name)) this.twoPort = { name: file.name, text };
    else await this.addData(text, file.name, 1);
  }

  private async answerPort(event: CustomEvent<1 | 2 | null>) {
    const file = this.twoPort;
    this.twoPort = null;
    if (file !== null && event.detail !== null) await this.addData(file.text, file.name, event.detail);
  }

  /** Reads measured data and adds them as a state of the load; what is typed stays. */
  private async addData(text: string, name: string, port: 1 | 2) {
    const { measuredTermination } = await import('../../src/measured/measured-termination.ts');
    try {
      const data = measuredTermination(text, name, port);
      const known = data.measured.name;
      this.attach(new Map([[known, data]]));
      const before = this.settled.fields.load ?? '';
      const load = withState(before, known);
      const more = load !== before && before.trim() !== '';
      this.dataSaid = `${known}: ${count(data.measured.samples, 'sample')}${more ? ', added as a state of the load. Delete the other line to match to it alone.' : '.'}`;
      this.change({ name: 'load', value: load });
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      this.dataSaid = `${name} can’t be read. ${formatProblem(error.problems[0]!)}`;
    }
  }

  private attach(data: Attachments) {
    this.attachments = new Map([...this.attachments, ...data]);
    remember(this.attachments);
  }

  /** Reads a record from a file; the sheet stays as it is when the file holds none. */
  private async open(file: File) {
    const { readRecord } = await import('../../src/record/read-record.ts');
    try {
      const record = readRecord(await file.slice(0, mostRead).text());
      const fields = fieldsOf(record);
      const ends = [record.source, ...record.loads.map(({ termination }) => termination)];
      this.attach(attachmentsOf(ends));
      const { stock, ...rest } = keptOf(record);
      this.keep({ ...rest, stock: new Map([...this.kept.stock, ...stock]), document: record.identity.number });
      // The sheet of two resistances has room for nothing else.
      const fits = this.method !== 'resistive-pair' || ends.every(isResistive);
      if (!serves(this.method, record.method) || !fits) {
        location.assign(`${import.meta.env.BASE_URL}${pathOf(record.method)}#${writeAddress(fields)}`);
        return;
      }
      this.beginOther();
      this.take(fields);
      this.keepTyped();
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
