import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import type { FieldName } from '../../src/record/fields.ts';
import { circuitModels } from '../../src/network/circuit-model.ts';
import type { Dossier } from '../../src/dossier.ts';
import { isOneImpedance, type Termination } from '../../src/network/termination.ts';
import type { Attachments } from '../../src/record/read-termination.ts';
import type { Method } from '../../src/record/design-record.ts';
import { base } from '../base/base.styles.ts';
import { basisLinks } from '../base/basis-links.ts';
import type { Choice } from '../base/choice.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import '../area-field/area-field.ts';
import '../choice-field/choice-field.ts';
import '../radio-field/radio-field.ts';
import '../text-field/text-field.ts';
import { verdictMark, verdictStyles, type Verdict } from '../verdict-mark/verdict-mark.ts';
import { aims, behaviours, blocks, keeps } from './choices.ts';
import { styles } from './given-part.styles.ts';

const partsFields = ['inductors', 'capacitors', 'power'] as const;

/** Whether how an end varies is the engineer's to say: models and measured data say it themselves. */
const variesByChoice = (terminations: readonly (Termination | undefined)[] | undefined): boolean =>
  terminations === undefined || terminations.some((each) => each === undefined || isOneImpedance(each));

const terminationHelp = html`<details class="help">
  <summary>What an end can be</summary>
  <p>An impedance at the design frequency: 9.4-j61, 50∠-30°.</p>
  <p>A circuit model, its parts in this order:</p>
  <ul>
    ${Object.entries(circuitModels).map(([name, { symbols }]) => html`<li>${name} <i>${symbols.join(' ')}</i></li>`)}
  </ul>
  <p>
    as in rc-series 12 8.2p. Measured data, by name. Several states of the load, one a line: in hand = 12-j40. The worst
    one governs.
  </p>
</details>`;

/** Part 1: what is asked for. On a narrow screen it folds into one line. */
@customElement('given-part')
export class GivenPart extends LitElement {
  static override styles = [base, verdictStyles, styles];

  @property({ type: Number }) number = 1;
  /** Of the sheet: the first of those that it serves. */
  @property() method: Method = 'two-element';
  @property({ attribute: false }) state: FieldState = emptyFieldState;
  /** Of the texts, or of earlier ones that could be read. */
  @property({ attribute: false }) dossier: Dossier | null = null;
  /** With a real source both aims are the same. */
  @property({ type: Boolean }) realSource = false;
  /** The measured data at hand. */
  @property({ attribute: false }) attachments: Attachments = new Map();
  /** Outcome of reading measured data, in one line. */
  @property() dataSaid = '';
  /** A two-port file whose port is to be chosen; '' when there is none. */
  @property() twoPort = '';
  /** What is given, in one line. */
  @property() summary = '';
  /** Whether it can be read. */
  @property({ attribute: false }) judged: { readonly verdict: Verdict; readonly words: string } = {
    verdict: 'meets',
    words: '',
  };
  /** Numbers in the basis of calculation that it rests on. */
  @property({ attribute: false }) basis: readonly string[] = [];

  @state() private unfolded = false;
  @state() private partsOpen = false;

  /** What can't be read is never out of sight; what was opened stays open while it is corrected. */
  protected override willUpdate() {
    const { problems } = this.state;
    if (partsFields.some((name) => problems[name] !== undefined)) this.partsOpen = true;
  }

  override render() {
    const { verdict, words } = this.judged;
    return html`
      <section aria-labelledby="heading">
        <h2 id="heading"><span class="number" aria-hidden="true">${this.number}</span> Given</h2>
        <p class="basis" aria-label="Basis of calculation">${basisLinks(this.basis)}</p>
        <button
          type="button"
          class="fold"
          aria-expanded=${this.unfolded ? 'true' : 'false'}
          aria-controls="form"
          @click=${() => (this.unfolded = !this.unfolded)}
        >
          <span class="summary">
            <span class="number">${this.number}</span> Given
            <span class="line">${verdict === 'meets' ? this.summary : verdictMark(verdict, words)}</span>
          </span>
          <span class="act">${this.unfolded ? 'Close' : 'Change'}</span>
        </button>
        <div id="form" class=${this.unfolded ? 'form unfolded' : 'form'}>
          ${this.interface()} ${this.requirement()} ${this.parts()}
        </div>
      </section>
    `;
  }

  private interface(): TemplateResult {
    const pair = this.method === 'resistive-pair';
    const record = this.dossier?.record;
    const { fields, understood, problems } = this.state;
    return html`
      <div class="group">
        ${this.text('frequency', 'Design frequency', 'f0')}
        ${this.text('source', pair ? 'Source resistance' : 'Source impedance', pair ? 'RS' : 'ZS')}
        ${pair || !variesByChoice([record?.source]) ? nothing : this.behaviour('source-behaviour', 'Source')}
        <area-field
          name="load"
          single
          .label=${pair ? 'Load resistance' : 'Load impedance'}
          .symbol=${pair ? 'RL' : 'ZL'}
          .value=${fields.load ?? ''}
          .understood=${understood.load ?? ''}
          .problem=${problems.load ?? ''}
        ></area-field>
        ${
          pair || !variesByChoice(record?.loads.map(({ termination }) => termination))
            ? nothing
            : this.behaviour('load-behaviour', 'Load')
        }
        ${
          pair
            ? nothing
            : html`${terminationHelp}
                <measured-data
                  .attachments=${this.attachments}
                  .said=${this.dataSaid}
                  .twoPort=${this.twoPort}
                ></measured-data>`
        }
        ${pair && problems.method !== undefined ? html`<p class="problem">${problems.method}</p>` : nothing}
        <radio-field
          name="aim"
          label="Aim: the network presents to the source"
          .choices=${aims}
          .value=${fields.aim ?? ''}
          .note=${this.realSource ? 'The source is real: both are the same.' : ''}
          .problem=${problems.aim ?? ''}
        ></radio-field>
      </div>
    `;
  }

  private requirement(): TemplateResult {
    return html`
      <h3>Required</h3>
      <div class="group">
        ${this.text('band', 'Band to hold', '', 'None: the design frequency alone.')}
        ${this.text('return-loss', 'Return loss over the band, at least', '', 'Not required.')}
        ${this.choice('block-dc', 'DC from source to load', blocks)}
        ${this.choice('keep-dc', 'DC fed to an end', keeps)}
      </div>
    `;
  }

  private parts(): TemplateResult {
    const { understood } = this.state;
    return html`<details
      ?open=${this.partsOpen}
      @toggle=${(event: Event) => (this.partsOpen = (event.target as HTMLDetailsElement).open)}
    >
      <summary>
        Parts and power
        <span class="muted"
          >${[understood.inductors, understood.capacitors, understood.power].filter(Boolean).join('; ')}</span
        >
      </summary>
      <div class="group">
        ${this.text('inductors', 'Practicable inductors')} ${this.text('capacitors', 'Practicable capacitors')}
        ${this.text('power', 'Available power', '', 'Not stated.')}
      </div>
    </details>`;
  }

  private behaviour(name: FieldName, end: string): TemplateResult {
    return this.choice(name, 'away from', behaviours, end, 'f0');
  }

  private text(name: FieldName, label: string, symbol = '', empty = ''): TemplateResult {
    const { fields, understood, problems } = this.state;
    return html`<text-field
      .name=${name}
      .label=${label}
      .symbol=${symbol}
      .empty=${empty}
      .value=${fields[name] ?? ''}
      .understood=${understood[name] ?? ''}
      .problem=${problems[name] ?? ''}
    ></text-field>`;
  }

  private choice(name: FieldName, label: string, choices: readonly Choice[], of = '', symbol = ''): TemplateResult {
    return html`<choice-field
      .name=${name}
      .label=${label}
      .symbol=${symbol}
      .of=${of}
      .choices=${choices}
      .value=${this.state.fields[name] ?? ''}
      .problem=${this.state.problems[name] ?? ''}
    ></choice-field>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'given-part': GivenPart;
  }
}
