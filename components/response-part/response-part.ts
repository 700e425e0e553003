import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { guard } from 'lit/directives/guard.js';
import { frequencySpan } from '../../src/design/words.ts';
import type { Dossier, Option, Response } from '../../src/dossier.ts';
import type { Span } from '../../src/quantity/span.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { plotOf } from '../../src/figures/chart-frame.ts';
import { frequencyAt, frequencyAxis } from '../../src/figures/frequency-axis.ts';
import { gainPlot } from '../../src/figures/gain-plot.ts';
import { reflectionPlane } from '../../src/figures/reflection-plane.ts';
import { returnLossPlot } from '../../src/figures/return-loss-plot.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { drawing } from '../base/drawing.ts';
import { fieldChange } from '../base/field-change.ts';
import { unbroken, withoutLoadedQ } from '../base/words.ts';
import { emptyFieldState, type FieldState } from '../base/field-state.ts';
import '../response-table/response-table.ts';
import '../text-field/text-field.ts';
import { styles } from './response-part.styles.ts';
import { narrower, spanText, wider } from './span-steps.ts';

/** Below this width of the column, px, a chart is drawn with fewer ticks instead of smaller letters. */
const roomy = 560;
const large = { width: 520, height: 200 };
const small = { width: 290, height: 190 };

/**
 * Part 5: return loss and transducer gain over a span that the engineer sets, the half-power band both ways.
 * @fires field-change  `sweep`
 */
@customElement('response-part')
export class ResponsePart extends LitElement {
  static override styles = [base, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;
  @property({ attribute: false }) state: FieldState = emptyFieldState;

  @state() private size = large;
  /** Where the reader reads, Hz; null: nowhere in particular. */
  @state() private atHz: number | null = null;
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

  override render() {
    const option = this.dossier?.options.find(({ id }) => id === this.dossier?.chosen);
    const responses = this.dossier?.responses ?? [];
    const response = responses[0] ?? null;
    const record = this.dossier?.record;
    return html`
      ${this.span(response)}
      ${
        response === null || option === undefined || record === undefined
          ? nothing
          : this.response(responses, option, record.requirement)
      }
    `;
  }

  private response(
    responses: readonly Response[],
    option: Option,
    requirement: DesignRecord['requirement'],
  ): TemplateResult {
    const { size } = this;
    const real = (this.dossier?.record.build ?? null) === null ? null : (option.built?.percentiles ?? 'awaited');
    const of = [responses, size, real];
    const { spanHz } = responses[0]!;
    return html`
      ${this.plot(
        spanHz,
        guard(of, () => drawing(returnLossPlot(responses, requirement, size, real))),
      )}
      ${this.plot(
        spanHz,
        guard(of, () => drawing(gainPlot(responses, requirement, option.halfPower, size))),
      )}
      <response-table
        .responses=${responses}
        .requirement=${requirement}
        .atHz=${this.atHz}
        @read-at=${(event: CustomEvent<number>) => (this.atHz = event.detail)}
      ></response-table>
      ${halfPower(option)}
      <h3>Reflection coefficient in its plane</h3>
      <figure class="plane">${guard(of, () => drawing(reflectionPlane(responses, requirement)))}</figure>
    `;
  }

  /** A chart over which the reading follows the pointer. */
  private plot(spanHz: Span, chart: unknown): TemplateResult {
    const { left, right } = plotOf(this.size);
    const place = this.atHz === null ? -1 : frequencyAxis(spanHz, 2).at(this.atHz);
    const along = (100 * (left + place * (right - left))) / this.size.width;
    const read = (event: PointerEvent) => {
      const { x, width } = (event.currentTarget as HTMLElement).getBoundingClientRect();
      const at = (((event.clientX - x) / width) * this.size.width - left) / (right - left);
      if (at >= 0 && at <= 1) this.atHz = frequencyAt(spanHz, at);
    };
    return html`<figure class="plot" @pointermove=${read} @pointerdown=${read}>
      ${chart}
      <div class="cursor" ?hidden=${place < 0 || place > 1} .style=${`left: ${String(along)}%`}></div>
    </figure>`;
  }

  private span(response: Response | null): TemplateResult {
    const { fields, understood, problems } = this.state;
    return html`<div class="span">
      <text-field
        name="sweep"
        label="Span of the sweep"
        .empty=${response === null ? '' : `Chosen from the band: ${frequencySpan(response.spanHz)}.`}
        .value=${fields.sweep ?? ''}
        .understood=${understood.sweep ?? ''}
        .problem=${problems.sweep ?? ''}
      ></text-field>
      ${response === null ? nothing : this.steps(response.spanHz)}
    </div>`;
  }

  private steps(spanHz: Span): TemplateResult {
    const say = (text: string) => () => this.dispatchEvent(fieldChange('sweep', text));
    const inner = narrower(spanHz, this.dossier!.record.requirement.frequencyHz);
    return html`<div class="steps">
      <button type="button" @click=${say(spanText(wider(spanHz)))}>Wider</button>
      <button type="button" @click=${say(spanText(inner))}>Narrower</button>
      <button type="button" ?hidden=${(this.state.fields.sweep ?? '') === ''} @click=${say('')}>As the band</button>
    </div>`;
  }
}

/** The two figures for one bandwidth, side by side, and how far the quick one can be trusted. */
function halfPower(option: Option): TemplateResult {
  const { bandwidthFromQHz, loadedQ, halfPower: swept } = option;
  const estimate =
    bandwidthFromQHz === null || loadedQ === null ? withoutLoadedQ(option) : formatQuantity(bandwidthFromQHz, 'Hz');
  const measured = swept.bandwidthHz === null ? 'an edge is absent' : formatQuantity(swept.bandwidthHz, 'Hz');
  return html`
    <h3>Half-power bandwidth</h3>
    <div class="both">
      <dl>
        <dt>From the loaded <i>Q</i></dt>
        <dd class="figure">${estimate}</dd>
        <dd>
          ${loadedQ === null ? nothing : html`<i>f</i><sub>0</sub>/<i>Q</i><sub>L</sub>, <i>Q</i><sub>L</sub> = ${formatFixed(loadedQ, 3)}`}
        </dd>
      </dl>
      <dl>
        <dt>From the sweep</dt>
        <dd class="figure">${measured}</dd>
        <dd>${swept.words}</dd>
      </dl>
    </div>
    <p>${unbroken(option.bandwidthNote)}</p>
  `;
}

declare global {
  interface HTMLElementTagNameMap {
    'response-part': ResponsePart;
  }
}
