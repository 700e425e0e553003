import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { StockList } from '../../src/parts/stock.ts';
import type { FieldName } from '../../src/record/fields.ts';
import { base } from '../base/base.styles.ts';
import type { Choice } from '../base/choice.ts';
import { fieldChange } from '../base/field-change.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import { field } from '../base/field.styles.ts';
import '../choice-field/choice-field.ts';
import { save } from '../base/save.ts';
import '../text-field/text-field.ts';
import { styles } from './build-fields.styles.ts';
import { distributionChoices, originChoices, pairChoices } from './choices.ts';
import { foldWords } from './fold-words.ts';

const kinds = ['inductor', 'capacitor'] as const;
/** What parts are taken from when real ones are asked for. */
const usual = 'E24';

interface Fold {
  readonly name: string;
  readonly fields: readonly FieldName[];
  readonly content: () => TemplateResult;
}

/**
 * What real parts are taken from, and what is asked of the network built of them.
 * @fires field-change  of the build, and the parts' Q
 * @fires stock-file    detail: a File that the user picked
 */
@customElement('build-fields')
export class BuildFields extends LitElement {
  static override styles = [base, field, styles];

  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** Stock lists at hand, by name. */
  @property({ attribute: false }) stocked: ReadonlyMap<string, StockList> = new Map();
  /** Outcome of reading a stock list: a line, or one for each problem. */
  @property({ attribute: false }) said: readonly string[] = [];

  /** Folds that were opened. */
  @state() private open: readonly string[] = [];

  private readonly folds: readonly Fold[] = [
    {
      name: 'Loss and strays',
      fields: ['q-slope-inductor', 'q-slope-capacitor', 'self-resonance', 'esl', 'stray', 'lead'],
      content: () => html`
        ${this.text('q-slope-inductor', 'Slope of the inductors’ Q', '', '0: the same at every frequency.')}
        ${this.text('q-slope-capacitor', 'Slope of the capacitors’ Q', '', '0: the same at every frequency.')}
        ${this.text('self-resonance', 'Self-resonance of inductors', '', 'Above all frequencies of interest.')}
        ${this.text('esl', 'Series inductance of capacitors')} ${this.text('stray', 'Stray capacitance of every node')}
        ${this.text('lead', 'Lead inductance of shunt arms')}
      `,
    },
    {
      name: 'Spread and yield',
      fields: ['distribution', 'source-spread', 'load-spread', 'samples', 'seed', 'least-yield'],
      content: () => html`
        ${this.choice('distribution', 'Values are distributed', distributionChoices)}
        ${this.text('source-spread', 'Spread of the source')} ${this.text('load-spread', 'Spread of the load')}
        ${this.text('samples', 'Networks drawn')} ${this.text('seed', 'Seed of the draw')}
        ${this.text('least-yield', 'Yield, at least', '', 'Not required.')}
      `,
    },
    {
      name: 'Stress and ratings',
      fields: ['mismatch', 'derating', 'rated-voltage', 'rated-current', 'rated-heat'],
      content: () => html`
        ${this.text('mismatch', 'Load mismatched up to a VSWR of', '', 'The loads as given alone.')}
        ${this.text('derating', 'Part of a rating that may be used')}
        ${this.text('rated-voltage', 'Rated voltage, peak', '', 'Not known.')}
        ${this.text('rated-current', 'Rated current, RMS', '', 'Not known.')}
        ${this.text('rated-heat', 'Rated heat', '', 'Not known.')}
      `,
    },
    {
      name: 'Winding of coils',
      fields: ['wire', 'former', 'gap'],
      content: () => html`
        ${this.text('wire', 'Wire, diameter or AWG 20')} ${this.text('former', 'Diameter of the form')}
        ${this.text('gap', 'Gap between turns')}
      `,
    },
  ];

  /** What can't be read is never out of sight. */
  protected override willUpdate() {
    const wrong = this.folds.filter(
      ({ name, fields }) => !this.open.includes(name) && fields.some((each) => this.state.problems[each] !== undefined),
    );
    if (wrong.length > 0) this.open = [...this.open, ...wrong.map(({ name }) => name)];
  }

  override render() {
    const asked = this.asked();
    return html`
      <fieldset class="asked">
        <legend class="label">Parts</legend>
        ${this.answer(true, 'real: on sale, with loss and tolerance', asked)}
        ${this.answer(false, 'exact and ideal', !asked)}
      </fieldset>
      ${asked ? html`<div class="kinds">${kinds.map((kind) => this.kind(kind))}</div>` : this.qualities()}
      ${asked ? html`${this.stock()} ${this.folds.map((fold) => this.fold(fold))}` : nothing}
    `;
  }

  private asked(): boolean {
    const { fields } = this.state;
    return ['series-inductor', 'series-capacitor', 'stock'].some((name) => (fields[name as FieldName] ?? '') !== '');
  }

  private answer(asked: boolean, words: string, checked: boolean): TemplateResult {
    const say = () => {
      for (const kind of kinds) this.say(`series-${kind}`, asked ? usual : '');
      if (!asked) this.say('stock', '');
    };
    return html`<label class="answer">
      <input type="radio" name="asked" .checked=${checked} @change=${say} />
      <span>${words}</span>
    </label>`;
  }

  private kind(kind: 'inductor' | 'capacitor'): TemplateResult {
    const { fields } = this.state;
    const series = fields[`series-${kind}`] ?? '';
    const from = series === '' ? ((fields.stock ?? '') === '' ? 'exact' : 'stock') : series;
    const name = kind === 'inductor' ? 'Inductors' : 'Capacitors';
    return html`<fieldset class="kind">
      <legend>${name}</legend>
      <choice-field
        .name=${`series-${kind}` as const}
        .of=${name}
        label="from"
        .choices=${originChoices[kind]}
        .value=${from}
        .problem=${this.state.problems[`series-${kind}`] ?? ''}
      ></choice-field>
      ${this.text(`tolerance-${kind}`, 'Tolerance', name)} ${this.text(`q-${kind}`, 'Q at f0', name)}
    </fieldset>`;
  }

  /** Even exact values have their loss stated. */
  private qualities(): TemplateResult {
    return html`<div class="group">
      ${this.text('q-inductor', 'Q of inductors, for the loss stated')}
      ${this.text('q-capacitor', 'Q of capacitors, for the loss stated')}
    </div>`;
  }

  private stock(): TemplateResult {
    const { fields, problems } = this.state;
    const name = fields.stock ?? '';
    const [first, ...lines] = this.said;
    return html`<div class="stock">
      ${this.choice('pairs', 'An arm may be', pairChoices)}
      <div>
        <p class="label">
          Stock list${name === '' ? nothing : html`: <strong>${name}</strong>${this.listWords(name)}`}
        </p>
        <div class="actions">
          <label class="button">
            <input class="unseen" type="file" accept=".csv,.tsv,.txt,text/csv" @change=${this.pick} />
            ${name === '' ? 'Add a stock list…' : 'Take another…'}
          </label>
          <button type="button" @click=${this.template}>Download a template (CSV)</button>
          ${name === '' ? nothing : html`<button type="button" @click=${this.leave}>Leave it out</button>`}
        </div>
        ${problems.stock === undefined ? nothing : html`<p class="note problem">${problems.stock}</p>`}
        <div class="said" role="status">
          ${first === undefined ? nothing : html`<p>${first}</p>`}
          ${
            lines.length === 0
              ? nothing
              : html`<ul tabindex="0" aria-label="Problems of the stock list">
                  ${lines.map((line) => html`<li>${line}</li>`)}
                </ul>`
          }
        </div>
      </div>
    </div>`;
  }

  private listWords(name: string): string {
    const list = this.stocked.get(name);
    return list === undefined ? '' : `, ${String(list.parts.length)} parts`;
  }

  private fold({ name, fields, content }: Fold): TemplateResult {
    const open = this.open.includes(name);
    const toggle = (event: Event) => {
      const now = (event.target as HTMLDetailsElement).open;
      if (now !== this.open.includes(name))
        this.open = now ? [...this.open, name] : this.open.filter((each) => each !== name);
    };
    const words = foldWords(fields, this.state);
    return html`<details ?open=${open} @toggle=${toggle}>
      <summary>${name} <span class="muted">${words}</span></summary>
      ${open ? html`<div class="group">${content()}</div>` : nothing}
    </details>`;
  }

  private text(name: FieldName, label: string, of = '', empty = ''): TemplateResult {
    const { fields, understood, problems } = this.state;
    return html`<text-field
      .name=${name}
      .label=${label}
      .of=${of}
      .empty=${empty}
      .value=${fields[name] ?? ''}
      .understood=${understood[name] ?? ''}
      .problem=${problems[name] ?? ''}
    ></text-field>`;
  }

  private choice(name: FieldName, label: string, choices: readonly Choice[]): TemplateResult {
    return html`<choice-field
      .name=${name}
      .label=${label}
      .choices=${choices}
      .value=${this.state.fields[name] ?? ''}
      .problem=${this.state.problems[name] ?? ''}
    ></choice-field>`;
  }

  private say(name: FieldName, value: string) {
    this.dispatchEvent(fieldChange(name, value));
  }

  private pick(event: Event) {
    const input = event.target as HTMLInputElement;
    const file = input.files?.[0];
    if (file !== undefined)
      this.dispatchEvent(new CustomEvent('stock-file', { detail: file, bubbles: true, composed: true }));
    // The same file, corrected, can be picked again.
    input.value = '';
  }

  private async template() {
    const { stockTemplate } = await import('../../src/parts/stock-template.ts');
    save(new Blob([stockTemplate], { type: 'text/csv' }), 'stock-list.csv');
  }

  /** Parts that came from it are exact until something else is said. */
  private leave() {
    for (const kind of kinds) {
      if ((this.state.fields[`series-${kind}`] ?? 'stock') === 'stock') this.say(`series-${kind}`, 'exact');
    }
    this.say('stock', '');
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'build-fields': BuildFields;
  }
}
