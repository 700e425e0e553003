import { LitElement, css, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { SectionTable } from '../../src/dossier.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { table } from '../base/table.styles.ts';
import { verdictMark, verdictStyles } from '../verdict-mark/verdict-mark.ts';

const edge = (hertz: number | null): string => (hertz === null ? 'none' : formatQuantity(hertz, 'Hz'));

/** What each number of sections comes to. */
@customElement('sections-table')
export class SectionsTable extends LitElement {
  static override styles = [
    base,
    table,
    verdictStyles,
    css`
      :host {
        margin-bottom: 0.75rem;
      }

      .words {
        margin-bottom: 0.75rem;
      }

      table {
        font-size: var(--small);
      }

      td {
        white-space: nowrap;
      }

      .chosen {
        background: var(--tint);
      }

      th:first-child,
      td:first-child {
        padding-left: 0.375rem;
      }

      .chosen th:first-child {
        box-shadow: inset 3px 0 0 var(--accent);
      }

      .chosen th {
        font-weight: 700;
      }
    `,
  ];

  @property({ attribute: false }) table: SectionTable | null = null;
  /** Id of the network that the document is about. */
  @property() chosen = '';

  override render() {
    if (this.table === null) return nothing;
    return html`
      <p class="words">${this.table.words}</p>
      <div class="scroll" tabindex="0" role="group" aria-label="Number of sections against what they hold">
        <table>
          <thead>
            <tr>
              <th scope="col">Sections</th>
              <th scope="col">Form</th>
              <th scope="col">Shunt arm at</th>
              <th scope="col" class="number">Parts</th>
              <th scope="col" class="number"><i>Q</i> of each</th>
              <th scope="col" class="number">Worst return loss</th>
              <th scope="col" class="number">Half-power from</th>
              <th scope="col" class="number">to</th>
              <th scope="col">The band</th>
            </tr>
          </thead>
          <tbody>
            ${this.table.rows.map(
              (row) => html`
                <tr
                  class=${row.id === this.chosen ? 'chosen' : ''}
                  aria-current=${row.id === this.chosen ? 'true' : nothing}
                >
                  <th scope="row">${row.sections}</th>
                  <td>${row.form}</td>
                  <td>${row.shuntAt}</td>
                  <td class="number">${row.parts}</td>
                  <td class="number">${formatFixed(row.sectionQ, 3)}</td>
                  <td class="number">
                    ${row.worstReturnLossDb === null ? 'no band' : returnLossWords(row.worstReturnLossDb)}
                  </td>
                  <td class="number">${edge(row.halfPower.lowHz)}</td>
                  <td class="number">${edge(row.halfPower.highHz)}</td>
                  <td>
                    ${row.holds === null ? verdictMark('not assessed') : row.holds ? verdictMark('meets', 'held') : verdictMark('falls short', 'not held')}
                  </td>
                </tr>
              `,
            )}
          </tbody>
        </table>
      </div>
    `;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'sections-table': SectionsTable;
  }
}
