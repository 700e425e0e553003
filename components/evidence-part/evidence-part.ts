import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Dossier, Evidence } from '../../src/dossier.ts';
import { formatFixed, formatImpedance, formatRead } from '../../src/quantity/format.ts';
import { base } from '../base/base.styles.ts';
import { table } from '../base/table.styles.ts';
import { unbroken } from '../base/words.ts';
import { verdictMark, verdictStyles } from '../verdict-mark/verdict-mark.ts';
import { powerOfTen } from './power-of-ten.ts';

/** Part 5: independent routes to the same numbers, what was assumed, what the work refers to. */
@customElement('evidence-part')
export class EvidencePart extends LitElement {
  static override styles = [
    base,
    table,
    verdictStyles,
    css`
      .scroll + .scroll,
      h3 {
        margin-top: 1.5rem;
      }

      p {
        margin-bottom: 0.75rem;
      }

      tr.words {
        border: 0;
      }

      .words td {
        padding-top: 0;
        color: var(--muted);
        font-size: var(--small);
        line-height: 1.4;
      }

      tr:first-child > * {
        padding-bottom: 0.125rem;
      }

      thead tr:first-child > * {
        padding-bottom: 0.4rem;
      }

      .assumptions {
        margin-top: 0.375rem;
      }

      .assumptions li {
        display: grid;
        grid-template-columns: 2.25rem minmax(0, 1fr);
        max-width: 76ch;
        margin-top: 0.25rem;
      }

      .assumptions span {
        color: var(--muted);
      }

      dl div {
        max-width: 76ch;
        margin-top: 0.375rem;
      }

      dd {
        color: var(--muted);
        font-size: var(--small);
      }

      sup {
        font-size: 0.75em;
        line-height: 0;
      }
    `,
  ];

  @property({ attribute: false }) dossier: Dossier | null = null;

  override render() {
    if (this.dossier === null) return nothing;
    const { evidence, assumptions, references } = this.dossier;
    return html`
      ${evidence === null ? nothing : routes(evidence)}
      <h3>Assumptions</h3>
      <ol class="assumptions">
        ${assumptions.map((text, index) => html`<li><span>A${index + 1}</span> ${unbroken(text)}</li>`)}
      </ol>
      <h3>Referred to</h3>
      <dl>
        ${references.map(
          ({ title, appliedFor }) =>
            html`<div>
              <dt>${title}</dt>
              <dd>${appliedFor}</dd>
            </div>`,
        )}
      </dl>
    `;
  }
}

function routes({ frequenciesHz, routes, checks }: Evidence): TemplateResult {
  const [design = '', ...ends] = frequenciesHz.map((hertz) => formatRead(hertz, 'Hz'));
  return html`
    <p>
      Each route computes on its own. Figures at ${unbroken(design)}; compared
      there${ends.length === 0 ? '' : unbroken(` and at ${ends.join(' and ')}`)}.
    </p>
    <div class="scroll" tabindex="0" role="group" aria-label="Routes">
      <table>
        <thead>
          <tr>
            <th scope="col">Route</th>
            <th scope="col" class="number">Seen from the source</th>
            <th scope="col" class="number">Transducer gain</th>
          </tr>
        </thead>
        ${routes.map(
          ({ name, how, seen, transducerGain }) => html`
            <tbody>
              <tr>
                <th scope="row">${name}</th>
                <td class="number">${seen === null ? 'not by this route' : formatImpedance(seen.r, seen.x, 10)}</td>
                <td class="number">
                  ${transducerGain === null ? 'not by this route' : formatFixed(transducerGain, 12)}
                </td>
              </tr>
              <tr class="words">
                <td colspan="3">${how}</td>
              </tr>
            </tbody>
          `,
        )}
      </table>
    </div>
    <div class="scroll" tabindex="0" role="group" aria-label="Spread of the routes">
      <table>
        <thead>
          <tr>
            <th scope="col">Compared</th>
            <th scope="col" class="number">Spread</th>
            <th scope="col" class="number">Tolerance</th>
            <th scope="col">Outcome</th>
          </tr>
        </thead>
        ${checks.map(
          ({ subject, spread, tolerance, pass, note }) => html`
            <tbody>
              <tr>
                <th scope="row">${subject}</th>
                <td class="number">${powerOfTen(spread)}</td>
                <td class="number">${powerOfTen(tolerance)}</td>
                <td>${pass ? verdictMark('meets', 'pass') : verdictMark('falls short', 'fail')}</td>
              </tr>
              <tr class="words">
                <td colspan="4">${note}</td>
              </tr>
            </tbody>
          `,
        )}
      </table>
    </div>
  `;
}

declare global {
  interface HTMLElementTagNameMap {
    'evidence-part': EvidencePart;
  }
}
