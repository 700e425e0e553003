import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, state } from 'lit/decorators.js';
import { repeat } from 'lit/directives/repeat.js';
import { InputError } from '../../src/quantity/problem.ts';
import type { Method } from '../../src/record/design-record.ts';
import { fileName } from '../../src/record/file-name.ts';
import { base } from '../base/base.styles.ts';
import { field } from '../base/field.styles.ts';
import { save } from '../base/save.ts';
import { pathOf } from '../ferrule-sheet/address.ts';
import { inOneLine } from '../record-store/collection.ts';
import { documentsOf, matches, noteOf, textOf, type KeptDocument } from '../record-store/documents.ts';
import { sheets, type Entry } from '../record-store/entry.ts';
import { openRecordStore } from '../record-store/record-store.ts';
import { Shelf, type Removed } from '../record-store/shelf.ts';
import { joinTabs, type Tabs } from '../record-store/tabs.ts';
import { whyNotKept } from '../record-store/trouble.ts';
import type { EntryAct } from './kept-entry.ts';
import './kept-entry.ts';
import { importFiles } from './import-files.ts';
import { styles } from './kept-records.styles.ts';
import { collectionName, nameOf, numberWords, titleWords } from './words.ts';

const sheetOf = (method: Method): Method => sheets.find((sheet) => pathOf(sheet) === pathOf(method)) ?? 'two-element';

/** Everything kept in this browser: found, opened, copied, renamed, deleted, taken elsewhere and back. */
@customElement('kept-records')
export class KeptRecords extends LitElement {
  static override styles = [base, field, styles];

  /** null: not read yet */
  @state() private entries: readonly Entry[] | null = null;
  @state() private search = '';
  /** Outcome of what was done last. */
  @state() private said = '';
  /** What of an import can't be used, a line each. */
  @state() private refused: readonly string[] = [];
  /** What was deleted since the page was opened, the last one first. */
  @state() private removed: readonly Removed[] = [];
  /** Why nothing can be kept here; '' where it can. */
  @state() private trouble = '';
  private readonly store = openRecordStore();
  private tabs!: Tabs;
  private shelf!: Shelf;

  override connectedCallback() {
    super.connectedCallback();
    this.tabs = joinTabs(() => void this.read());
    this.shelf = new Shelf(this.store, this.tabs, sheetOf);
    void this.read();
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    this.tabs.close();
    this.store.close();
  }

  override render() {
    return html`
      <div class="tools" ?hidden=${this.trouble !== ''}>
        <p class="search">
          <label for="search">Search number, title, revision, date, ticket, owner, state</label>
          <input id="search" type="search" autocomplete="off" spellcheck="false" @input=${this.find} />
        </p>
        <button type="button" aria-disabled=${this.entries?.length === 0} @click=${this.exportAll}>Export all</button>
        <label class="button">
          <input class="unseen" type="file" multiple accept=".json,application/json" @change=${this.pick} />
          Import…
        </label>
      </div>
      <p class="said" role="status">${this.trouble || this.said}</p>
      ${
        this.refused.length === 0
          ? nothing
          : html`<ul class="refused" aria-label="Refused">
              ${this.refused.map((line) => html`<li>${line}</li>`)}
            </ul>`
      }
      ${this.removed.length === 0 ? nothing : this.deleted()}
      <div @entry-act=${(event: CustomEvent<EntryAct>) => void this.attempt(() => this.act(event.detail))}>
        ${this.entries === null ? nothing : this.list(this.entries)}
      </div>
    `;
  }

  private list(entries: readonly Entry[]): TemplateResult {
    if (entries.length === 0) {
      return html`<p class="none">
        Nothing is kept yet. What you type in a sheet is kept here from the first letter on; so is every revision that
        is issued, and what you import.
      </p>`;
    }
    const found = entries.filter((entry) => matches(entry, this.search));
    if (found.length === 0) return html`<p class="none">Nothing that is kept matches this search.</p>`;
    const all = documentsOf(entries);
    return html`<ol>
      ${repeat(
        documentsOf(found),
        ({ key }) => key,
        (one) => this.document(one, all.find(({ key }) => key === one.key)?.entries ?? []),
      )}
    </ol>`;
  }

  /** @param all entries of the document, those that the search leaves out too */
  private document({ number, title, entries }: KeptDocument, all: readonly Entry[]): TemplateResult {
    return html`<li class="document">
      <h2><span class="id">${numberWords(number)}</span> ${titleWords(title)}</h2>
      <ul>
        ${repeat(
          entries,
          ({ id }) => id,
          (entry) =>
            html`<li>
              <kept-entry
                id=${`entry-${entry.id}`}
                .entry=${entry}
                .ownTitle=${textOf(entry, 'title') === title ? '' : titleWords(textOf(entry, 'title'))}
                .note=${noteOf(entry, all)}
              ></kept-entry>
            </li>`,
        )}
      </ul>
    </li>`;
  }

  private deleted(): TemplateResult {
    return html`<section class="deleted" aria-label="Deleted">
      <h2>Deleted since this page was opened</h2>
      <ul>
        ${repeat(
          this.removed,
          ({ entry }) => entry.id,
          (one) =>
            html`<li>
              <span>${nameOf(one.entry)}: ${titleWords(textOf(one.entry, 'title'))}</span>
              <button
                type="button"
                id=${`undo-${one.entry.id}`}
                aria-label=${`Undo: ${nameOf(one.entry)}`}
                @click=${() => void this.attempt(() => this.undo(one))}
              >
                Undo
              </button>
            </li>`,
        )}
      </ul>
    </section>`;
  }

  private find(event: InputEvent) {
    this.search = (event.target as HTMLInputElement).value;
  }

  private async read() {
    try {
      this.entries = await this.store.list();
      this.trouble = '';
    } catch (error) {
      this.trouble = whyNotKept(error);
    }
  }

  /** Says what went wrong; the list shows what is kept in any case. */
  private async attempt(act: () => Promise<void>) {
    this.said = '';
    this.refused = [];
    try {
      await act();
    } catch (error) {
      this.said = error instanceof InputError ? inOneLine(error.problems) : whyNotKept(error);
    }
    await this.read();
  }

  private async act(asked: EntryAct) {
    const { act, entry } = asked;
    switch (act) {
      case 'duplicate': {
        const copy = await this.shelf.duplicate(entry.id);
        this.said = copy === null ? gone(entry) : `${nameOf(entry)} is duplicated.`;
        if (copy !== null) await this.moveTo(`entry-${copy.id}`);
        return;
      }
      case 'rename':
        this.said = (await this.shelf.rename(entry, asked.title, asked.number))
          ? `Renamed: ${numberWords(asked.number)}, ${titleWords(asked.title)}.`
          : `${nameOf(entry)} was changed in another tab meanwhile, and isn’t renamed: look at it as it is now.`;
        await this.moveTo(`entry-${entry.id}`);
        return;
      case 'save': {
        const file = await this.shelf.one(entry.id);
        if (file === null) this.said = gone(entry);
        else this.hand(file.text, file.record === null ? collectionName(Date.now()) : fileName(file.record, 'json'));
        return;
      }
      case 'delete': {
        const removed = await this.shelf.remove(entry.id);
        if (removed !== null) this.removed = [removed, ...this.removed];
        this.said = removed === null ? gone(entry) : `${nameOf(entry)} is deleted.`;
        await this.moveTo(`undo-${entry.id}`);
      }
    }
  }

  private async undo(one: Removed) {
    await this.shelf.restore(one);
    this.removed = this.removed.filter((each) => each !== one);
    this.said = `${nameOf(one.entry)} is back.`;
    await this.moveTo(`entry-${one.entry.id}`);
  }

  private readonly exportAll = () =>
    void this.attempt(async () => {
      if (this.entries?.length === 0) this.said = 'Nothing is kept that could be exported.';
      else this.hand(await this.shelf.all(), collectionName(Date.now()));
    });

  private pick(event: Event) {
    const input = event.target as HTMLInputElement;
    const files = [...(input.files ?? [])];
    void this.attempt(async () => {
      const { said, refused } = await importFiles(this.shelf, files);
      this.said = said;
      this.refused = refused;
    });
    // The same file, corrected, can be picked again.
    input.value = '';
  }

  private hand(text: string, name: string) {
    save(new Blob([text], { type: 'application/json' }), name);
    this.said = `Saved as ${name}.`;
  }

  /** What has the focus may be gone; it goes on from where the outcome is. */
  private async moveTo(id: string) {
    await this.read();
    await this.updateComplete;
    const target = this.renderRoot.querySelector<LitElement | HTMLElement>(`#${id}`);
    if (target instanceof LitElement) await target.updateComplete;
    target?.focus();
  }
}

const gone = (entry: Entry): string => `${nameOf(entry)} was deleted in another tab meanwhile.`;

declare global {
  interface HTMLElementTagNameMap {
    'kept-records': KeptRecords;
  }
}
