import { LitElement, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { loadLabel, terminationLabel } from '../../src/record/read-termination.ts';
import type { Dossier, Option } from '../../src/dossier.ts';
import { schematic } from '../../src/figures/schematic.ts';
import { formatFixed, formatImpedance } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { drawing } from '../base/drawing.ts';
import { table } from '../base/table.styles.ts';
import { partValue, unbroken, withoutLoadedQ } from '../base/words.ts';
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
        ${drawing(schematic(option.arms, option.designators, terminationLabel(source), loadLabel(loads)))}
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
          ${option.arms.length === 0 ? html`<p>No part is needed: the source sees the load as it is.</p>` : parts(option)}
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

function parts(option: Option): TemplateResult {
  return html`<table>
    <thead>
      <tr>
        <th scope="col">Part</th>
        <th scope="col">Arm</th>
        <th scope="col">Kind</th>
        <th scope="col" class="number">Value</th>
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
          </tr>`,
      )}
    </tbody>
  </table>`;
}

/** For a spreadsheet: one part a line, source side first, columns by tabs. */
const partsText = (option: Option): string =>
  option.arms.map((arm, index) => [option.designators[index], arm.arm, arm.part, partValue(arm)].join('\t')).join('\n');

declare global {
  interface HTMLElementTagNameMap {
    'network-part': NetworkPart;
  }
}
