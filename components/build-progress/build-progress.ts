import { LitElement, css, html, nothing } from 'lit';
import { customElement, property } from 'lit/decorators.js';
import type { Dossier } from '../../src/dossier.ts';
import { base } from '../base/base.styles.ts';
import { progressWords } from './progress-words.ts';

/**
 * How many networks are worked out with real parts, with a way to stop and to go on. Always as high, so that nothing
 * below moves while someone types.
 * @fires build-stop
 * @fires build-on
 */
@customElement('build-progress')
export class BuildProgress extends LitElement {
  static override styles = [
    base,
    css`
      div {
        display: flex;
        align-items: center;
        gap: 0 1rem;
        min-height: 2.75rem;
        color: var(--muted);
        font-size: var(--small);
        line-height: 1.35;
      }

      p {
        max-width: none;
      }

      button {
        min-height: 2rem;
        padding: 0.125rem 0.625rem;
        font-size: var(--small);
        white-space: nowrap;
      }

      @media (pointer: coarse) {
        button {
          min-height: 2.75rem;
        }
      }
    `,
  ];

  @property({ attribute: false }) dossier: Dossier | null = null;
  /** There is nothing to go on with. */
  @property({ type: Boolean }) idle = false;
  @property() realParts: 'none' | 'at work' | 'stopped' | 'whole' = 'none';

  override render() {
    if (this.dossier === null || this.realParts === 'none') return nothing;
    return html`<div>
      <p>${progressWords(this.dossier.options, this.realParts)}</p>
      ${
        this.realParts === 'at work'
          ? html`<button type="button" @click=${this.say('build-stop')}>Stop</button>`
          : this.realParts === 'stopped' && !this.idle
            ? html`<button type="button" @click=${this.say('build-on')}>Work out the rest</button>`
            : nothing
      }
    </div>`;
  }

  private readonly say = (name: 'build-stop' | 'build-on') => () =>
    this.dispatchEvent(new CustomEvent(name, { bubbles: true, composed: true }));
}

declare global {
  interface HTMLElementTagNameMap {
    'build-progress': BuildProgress;
  }
}
