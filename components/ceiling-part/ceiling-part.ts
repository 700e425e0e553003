import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import { returnLossWords } from '../../src/design/words.ts';
import type { Ceiling, Dossier } from '../../src/dossier.ts';
import { returnLossDb } from '../../src/network/figures-of-merit.ts';
import { formatFixed, formatQuantity } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { table } from '../base/table.styles.ts';
import { unbroken } from '../base/words.ts';

/** Part 2: what no lossless network can beat over the band, whatever it is made of. */
@customElement('ceiling-part')
export class CeilingPart extends LitElement {
  static override styles = [
    base,
    table,
    css`
      .words {
        margin-bottom: 1rem;
      }

      .columns {
        display: grid;
        grid-template-columns: repeat(auto-fit, minmax(min(100%, 17rem), 1fr));
        gap: 1rem 2.5rem;
        align-items: start;
      }

      td,
      tbody th {
        padding-block: 0.2rem;
      }

      .needed {
        background: var(--tint);
      }

      .needed th {
        font-weight: 700;
        box-shadow: inset 3px 0 0 var(--accent);
      }

      th:first-child {
        padding-left: 0.5rem;
      }

      td:last-child {
        white-space: nowrap;
      }

      .beyond {
        color: var(--muted);
      }

      dl {
        border-block: 1px solid var(--ink);
      }

      dl div {
        padding: 0.4rem 0;
      }

      dl div + div {
        border-top: 1px solid var(--hairline);
      }

      dt {
        color: var(--muted);
        font-size: var(--small);
      }

      dd {
        line-height: 1.4;
      }

      dd::first-letter {
        text-transform: uppercase;
      }
    `,
  ];

  @property({ attribute: false }) dossier: Dossier | null = null;

  override render() {
    if (this.dossier === null) return nothing;
    const { ceiling, noCeiling, record } = this.dossier;
    if (ceiling === null) return html`<p>${unbroken(noCeiling)}</p>`;
    return html`
      <p class="words">
        ${ceiling.estimate ? html`<strong>An estimate.</strong> ` : nothing}${unbroken(ceiling.words)}
      </p>
      <div class="columns">${this.figures(ceiling, record.requirement.returnLossDb)} ${basis(ceiling)}</div>
    `;
  }

  private figures({ perResonators, bestReflection, needs, estimate }: Ceiling, asked: number | null): TemplateResult {
    const about = estimate ? 'about ' : '';
    const row = (name: string, reflection: number, needed: boolean, beyond: boolean) =>
      html`<tr class=${needed ? 'needed' : beyond ? 'beyond' : ''} aria-current=${needed ? 'true' : nothing}>
        <th scope="row">${name}</th>
        <td class="number">${about}${returnLossWords(returnLossDb(reflection ** 2))}</td>
        <td class="number">${reflection < 5e-5 ? '< 0.0001' : formatFixed(reflection, 4)}</td>
        ${asked === null ? nothing : html`<td>${needed ? 'the least' : beyond ? 'too few' : ''}</td>`}
      </tr>`;
    return html`<table>
      <thead>
        <tr>
          <th scope="col">Resonators, the end’s own counted</th>
          <th scope="col" class="number">Best return loss</th>
          <th scope="col" class="number">|Γ|</th>
          ${asked === null ? nothing : html`<th scope="col">For ${formatQuantity(asked, 'dB')}</th>`}
        </tr>
      </thead>
      <tbody>
        ${perResonators.map((reflection, k) =>
          row(String(k + 1), reflection, needs === k + 1, asked !== null && (needs === null || k + 1 < needs)),
        )}
        ${row('any number', bestReflection, false, asked !== null && returnLossDb(bestReflection ** 2) < asked)}
      </tbody>
    </table>`;
  }
}

/** Four digits, without a prefix. */
const plain = (value: number): string => String(Number(value.toPrecision(4)));

function basis({ governs, state, q, fractionalWidth, basis: words, estimate }: Ceiling): TemplateResult {
  const rows = [
    ['Governs', state === '' ? `the ${governs}` : `the ${governs}, ${state}`],
    ['Q of that end, and the band’s width over its centre', `${plain(q)} and ${plain(fractionalWidth)}`],
    [estimate ? 'Estimated from' : 'Worked out from', unbroken(words)],
  ];
  return html`<dl>
    ${rows.map(
      ([name, value]) =>
        html`<div>
          <dt>${name}</dt>
          <dd>${value}</dd>
        </div>`,
    )}
  </dl>`;
}

declare global {
  interface HTMLElementTagNameMap {
    'ceiling-part': CeilingPart;
  }
}
