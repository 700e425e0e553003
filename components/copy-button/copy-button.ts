import { LitElement, css, html } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { base } from '../base/base.styles.ts';

/** Puts a text on the clipboard and says so for a moment. */
@customElement('copy-button')
export class CopyButton extends LitElement {
  static override styles = [
    base,
    css`
      :host {
        display: inline-block;
      }

      button {
        min-height: 1.75rem;
        padding: 0;
        border: 0;
        background: none;
        color: var(--accent);
        font-size: var(--small);
        text-decoration: underline;
        text-decoration-thickness: 1px;
        text-underline-offset: 0.2em;
      }
    `,
  ];

  /** What is copied, read only when it is asked for. */
  @property({ attribute: false }) text: () => string = () => '';
  /** Names what is copied: "Copy the parts list". */
  @property() label = 'Copy';

  @state() private said = '';
  private timer = 0;

  override render() {
    return html`<button type="button" @click=${this.copy}>${this.said || this.label}</button>
      <span class="unseen" role="status">${this.said}</span>`;
  }

  override disconnectedCallback() {
    super.disconnectedCallback();
    clearTimeout(this.timer);
  }

  private async copy() {
    try {
      await navigator.clipboard.writeText(this.text());
      this.said = 'Copied';
    } catch {
      this.said = 'The browser refused: select the text instead';
    }
    clearTimeout(this.timer);
    this.timer = window.setTimeout(() => (this.said = ''), 2500);
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'copy-button': CopyButton;
  }
}
