import { LitElement, css, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { differenceMarkdown, differenceText } from '../../src/design/difference-text.ts';
import { changeGroups, type Change } from '../../src/record/change.ts';
import { base } from '../base/base.styles.ts';
import { table } from '../base/table.styles.ts';
import { unbroken } from '../base/words.ts';
import '../copy-button/copy-button.ts';

/** What is otherwise than in the revision before: what, before and after, group by group. */
@customElement('difference-table')
export class DifferenceTable extends LitElement {
  static override styles = [
    base,
    table,
    css`
      .line {
        display: flex;
        flex-wrap: wrap;
        justify-content: space-between;
        align-items: baseline;
        gap: 0 1rem;
        margin-top: 1.25rem;
        padding-bottom: 0.25rem;
      }

      .copies {
        display: flex;
        flex-wrap: wrap;
        gap: 0 1rem;
      }

      .earlier {
        color: var(--stale);
      }

      table {
        min-width: 21rem;
        table-layout: fixed;
      }

      th,
      td {
        overflow-wrap: anywhere;
      }

      tbody .group {
        padding-top: 0.75rem;
        font-weight: 700;
      }
    `,
  ];

  /** null: not worked out yet. */
  @property({ attribute: false }) changes: readonly Change[] | null = null;
  /** The revision before. */
  @property() since = '';
  /** It is still to be worked out. */
  @property({ type: Boolean }) awaited = false;

  /** The last ones that were worked out: they stay in view until the next are. */
  private shown: readonly Change[] | null = null;

  protected override willUpdate() {
    if (this.changes !== null) this.shown = this.changes;
  }

  override render() {
    const { shown } = this;
    // Who has signed which of them is no change of the design.
    const told = shown?.filter(({ group }) => group !== 'sign-off') ?? [];
    return html`
      <div class="line">
        <h3>What changed since revision ${this.since}</h3>
        ${
          told.length === 0
            ? nothing
            : html`<div class="copies">
                <copy-button label="Copy as text" .text=${() => differenceText(told)}></copy-button>
                <copy-button label="Copy as Markdown" .text=${() => differenceMarkdown(told)}></copy-button>
              </div>`
        }
      </div>
      ${this.changes === null ? html`<p class="muted">${this.awaited ? 'Being worked out…' : 'Not worked out.'}</p>` : nothing}
      ${shown === null ? nothing : told.length === 0 ? html`<p>Nothing changed.</p>` : this.table(told)}
    `;
  }

  private table(told: readonly Change[]) {
    const groups = changeGroups.filter((group) => told.some((change) => change.group === group));
    return html`<div
      class=${this.changes === null ? 'scroll earlier' : 'scroll'}
      tabindex="0"
      role="group"
      aria-label="What changed since revision ${this.since}"
    >
      <table>
        <thead>
          <tr>
            <th scope="col">What</th>
            <th scope="col">Before</th>
            <th scope="col">After</th>
          </tr>
        </thead>
        ${groups.map(
          (group) =>
            html`<tbody>
              <tr>
                <th class="group" colspan="3" scope="rowgroup">${group.charAt(0).toUpperCase()}${group.slice(1)}</th>
              </tr>
              ${told
                .filter((change) => change.group === group)
                .map(
                  ({ what, before, after }) =>
                    html`<tr>
                      <th scope="row">${what}</th>
                      <td>${unbroken(before)}</td>
                      <td>${unbroken(after)}</td>
                    </tr>`,
                )}
            </tbody>`,
        )}
      </table>
    </div>`;
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'difference-table': DifferenceTable;
  }
}
