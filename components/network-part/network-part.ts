import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { drawnArms } from '../../src/design/drawn-arms.ts';
import { loadLabel, terminationLabel } from '../../src/record/read-termination.ts';
import type { Built, Dossier, Option } from '../../src/dossier.ts';
import { schematic } from '../../src/figures/schematic.ts';
import { formatFixed, formatImpedance } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { drawing } from '../base/drawing.ts';
import { realFigure } from '../base/real-figure.ts';
import { table } from '../base/table.styles.ts';
import { orderedValue, partValue, unbroken, withoutLoadedQ } from '../base/words.ts';
import '../copy-button/copy-button.ts';
import { styles } from './network-part.styles.ts';

/** Part 4: the chosen network, its parts, what the source sees, and what to be careful of. */
@customElement('network-part')
export class NetworkPart extends LitElement {
  static override styles = [base, table, styles];

  @property({ attribute: false }) dossier: Dossier | null = null;

  override render() {
    const option = this.dossier?.options.find(({ id }) => id === this.dossier?.chosen);
    if (this.dossier === null || option === undefined) return nothing;
    const { source, loads } = this.dossier.record;
    return html`
      <div class="drawing" tabindex="0" role="group" aria-label="Schematic">
        ${drawing(schematic(drawnArms(option), option.designators, terminationLabel(source), loadLabel(loads)))}
      </div>
      <div class="columns">
        <div>
          <div class="line">
            <h3>Parts</h3>
            ${
              option.arms.length === 0
                ? nothing
                : html`<copy-button label="Copy the parts list" .text=${() => partsText(option)}></copy-button>`
            }
          </div>
          ${
            option.arms.length === 0
              ? html`<p>No part is needed: the source sees the load as it is.</p>`
              : parts(option, this.dossier.record.build !== null)
          }
        </div>
        <div>
          <div class="line">
            <h3>At the design frequency</h3>
            <copy-button label="Copy the figures" .text=${() => this.figuresText(option)}></copy-button>
          </div>
          <dl>
            ${this.figures(option).map(
              ([name, value]) =>
                html`<div>
                  <dt>${name}</dt>
                  <dd>${value}</dd>
                </div>`,
            )}
          </dl>
        </div>
      </div>
      ${this.cautions(option)}
    `;
  }

  private figures(option: Option): readonly (readonly [string, string])[] {
    const { aim } = this.dossier!.record;
    return [
      ['Seen from the source', formatImpedance(option.seen.r, option.seen.x)],
      ['Transducer gain', formatFixed(option.transducerGain, 6)],
      [`|Γ|, ${aim} aim`, formatFixed(option.reflection, 6)],
      ['Loaded Q', option.loadedQ === null ? withoutLoadedQ(option) : formatFixed(option.loadedQ, 3)],
      ['DC path', option.dc.words],
    ];
  }

  private figuresText(option: Option): string {
    return this.figures(option)
      .map((row) => row.join('\t'))
      .join('\n');
  }

  private cautions(option: Option): TemplateResult {
    const safety = this.dossier!.cautions.filter(({ kind }) => kind === 'safety').map(({ text }) => text);
    const practice = this.dossier!.cautions.filter(({ kind }) => kind === 'practice').map(({ text }) => text);
    const list = [...safety, ...new Set([...practice, ...option.cautions])];
    return html`<h3>Cautions</h3>
      <ul class="cautions">
        ${list.map((text) => html`<li>${unbroken(text)}</li>`)}
      </ul>`;
  }
}

/** @param real  real parts are asked for */
const parts = (option: Option, real: boolean): TemplateResult =>
  html`<div class="scroll" tabindex="0" role="group" aria-label="Parts">
    <table>
      <thead>
        <tr>
          <th scope="col">Part</th>
          <th scope="col">Arm</th>
          <th scope="col">Kind</th>
          <th scope="col" class="number">${real ? 'Exact value' : 'Value'}</th>
          ${real ? html`<th scope="col" class="number">To order</th>` : nothing}
        </tr>
      </thead>
      <tbody>
        ${option.arms.map(
          (arm, index) =>
            html`<tr>
              <th scope="row">${option.designators[index]}</th>
              <td>${arm.arm}</td>
              <td>${arm.part}</td>
              <td class="number">${partValue(arm)}</td>
              ${real ? html`<td class="number">${realFigure(option, (built) => ordered(built, index))}</td>` : nothing}
            </tr>`,
        )}
      </tbody>
    </table>
  </div>`;

/** "8.2 pF", or "8.2 pF + 1 pF in parallel" */
function ordered({ parts: all }: Built, armIndex: number): string {
  const its = all.filter((part) => part.armIndex === armIndex);
  const pair = its[0]?.pair ?? null;
  return `${its.map(orderedValue).join(' + ')}${pair === null ? '' : ` ${pair}`}`;
}

/** For a spreadsheet: one part a line, source side first, columns by tabs. */
const partsText = ({ arms, designators, built }: Option): string =>
  arms
    .map((arm, index) =>
      [designators[index], arm.arm, arm.part, partValue(arm), ...(built === null ? [] : [ordered(built, index)])].join(
        '\t',
      ),
    )
    .join('\n');

declare global {
  interface HTMLElementTagNameMap {
    'network-part': NetworkPart;
  }
}
