import { LitElement, css, html, nothing, type TemplateResult } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { FitStep } from '../../src/design/fitted.ts';
import { returnLossWords } from '../../src/design/words.ts';
import { base } from '../base/base.styles.ts';
import { unbroken } from '../base/words.ts';

/**
 * How far a search has come, with a way to stop it; afterwards, that it was stopped, with a way to go on.
 * @fires search-stop
 * @fires search-on
 */
@customElement('search-progress')
export class SearchProgress extends LitElement {
  static override styles = [
    base,
    css`
      :host {
        position: sticky;
        z-index: 1;
        top: 0;
      }

      div {
        display: grid;
        grid-template-columns: minmax(0, 1fr) auto;
        align-items: center;
        gap: 0.25rem 1.25rem;
        margin-bottom: 1.75rem;
        padding: 0.625rem 0.75rem;
        border: 1px solid var(--ink);
        background: var(--paper);
      }

      p {
        max-width: none;
      }

      button {
        grid-row: span 2;
      }

      p:only-of-type + button {
        grid-row: auto;
      }

      progress {
        width: 100%;
        height: 0.5rem;
        appearance: none;
        border: 0;
        background: var(--faint);
        accent-color: var(--accent);
      }

      progress::-webkit-progress-bar {
        background: var(--faint);
      }

      progress::-webkit-progress-value {
        background: var(--accent);
      }

      progress::-moz-progress-bar {
        background: var(--accent);
      }
    `,
  ];

  /** null: nothing is being searched. */
  @property({ attribute: false }) step: FitStep | null = null;
  /** Steps after which the engineer stopped the search, as the field holds them; '' when it went to its end. */
  @property() stoppedAfter = '';

  override render() {
    if (this.step !== null) return this.progress(this.step);
    if (this.stoppedAfter === '') return nothing;
    return html`<div>
      <p>Search stopped after ${this.stoppedAfter} steps: the best up to there is shown.</p>
      <button type="button" @click=${this.say('search-on')}>Search to the end</button>
    </div>`;
  }

  private progress({ done, elements, bestDb }: FitStep): TemplateResult {
    const best = bestDb === null ? '' : `; best so far ${returnLossWords(bestDb)}`;
    const words = unbroken(`Searching, ${String(Math.floor(done * 100))} %: ${String(elements)} elements${best}`);
    return html`<div>
      <p id="words">${words}</p>
      <button type="button" @click=${this.say('search-stop')}>Stop, keep the best</button>
      <progress max="1" .value=${done} aria-labelledby="words"></progress>
    </div>`;
  }

  private readonly say = (name: 'search-stop' | 'search-on') => () => this.dispatchEvent(new CustomEvent(name));
}

declare global {
  interface HTMLElementTagNameMap {
    'search-progress': SearchProgress;
  }
}
