import { LitElement, html, nothing } from 'lit';
import { customElement, property, state } from 'lit/decorators.js';
import { nextRevision } from '../../src/record/next-revision.ts';
import { base } from '../base/base.styles.ts';
import { field } from '../base/field.styles.ts';
import { styles } from './start-revision.styles.ts';

/** Keeps the page's lower end free for what lies over it. */
function reserve(height: string) {
  const { style } = document.documentElement;
  style.scrollPaddingBottom = height;
  style.setProperty('--covered', height);
}

/** Where the keyboard's focus is, inside of elements too. */
function focused(): Element | null {
  let at = document.activeElement;
  while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
  return at;
}

/**
 * An issued record is frozen; this starts the revision after it, once its reason is given.
 * @fires revision-start  detail: what the revision changes, and why
 * @fires revision-back   what was changed since is to be as it was issued
 */
@customElement('start-revision')
export class StartRevision extends LitElement {
  static override styles = [base, field, styles];

  /** The revision issued. */
  @property() issued = '';
  /** The revision as typed now: another than the one issued is the next. */
  @property() typed = '';
  /** Entries changed since it was issued. */
  @property({ type: Number }) entries = 0;
  /** So was the finished board. */
  @property({ type: Boolean }) board = false;
  /** It lies over the page's lower end. */
  @property({ type: Boolean, reflect: true }) floating = false;
  /** Why it can't be started, in one line. */
  @property() said = '';

  @state() private reason = '';
  @state() private asked = '';

  override disconnectedCallback() {
    super.disconnectedCallback();
    if (this.floating) reserve('');
  }

  /** What was being typed in stays in view. */
  protected override firstUpdated() {
    if (!this.floating) return;
    reserve(`${String(this.offsetHeight)}px`);
    focused()?.scrollIntoView({ block: 'nearest' });
  }

  override render() {
    const next = this.typed === this.issued ? nextRevision(this.issued) : this.typed;
    const problem = this.asked || this.said;
    return html`
      <section aria-label="Next revision">
        <p>
          <strong>Revision ${this.issued} is issued and frozen.</strong>
          ${this.changed() === '' ? 'A change starts the next one.' : `${this.changed()} for revision ${next}.`}
        </p>
        <div class="reason">
          <label for="reason">What revision ${next} changes, and why</label>
          <textarea
            id="reason"
            rows="2"
            .value=${this.reason}
            aria-describedby="note"
            aria-invalid=${problem === '' ? nothing : 'true'}
            @input=${this.type}
          ></textarea>
          <p id="note" class=${problem === '' ? 'note' : 'note problem'} role="status">${problem}</p>
        </div>
        <div class="actions">
          <button type="button" class="main" @click=${this.start}>Start revision ${next}</button>
          ${
            this.changed() === ''
              ? nothing
              : html`<button type="button" @click=${() => this.say('revision-back')}>
                  Leave revision ${this.issued} as issued
                </button>`
          }
        </div>
      </section>
    `;
  }

  /** "2 changed entries and the finished board wait" */
  private changed(): string {
    const entries =
      this.entries === 0 ? '' : `${String(this.entries)} changed ${this.entries === 1 ? 'entry' : 'entries'}`;
    const what = [entries, this.board ? 'the finished board' : ''].filter((words) => words !== '').join(' and ');
    if (what === '') return '';
    const words = what.charAt(0).toUpperCase() + what.slice(1);
    return `${words} ${this.entries + (this.board ? 1 : 0) === 1 ? 'waits' : 'wait'}`;
  }

  private type(event: InputEvent) {
    this.reason = (event.target as HTMLTextAreaElement).value;
    this.asked = '';
  }

  private start() {
    if (this.reason.trim() === '') {
      this.asked = 'A revision needs its reason: say what it changes and why.';
      this.renderRoot.querySelector('textarea')?.focus();
      return;
    }
    this.say('revision-start', this.reason.trim());
  }

  private say(name: string, detail?: string) {
    this.dispatchEvent(new CustomEvent(name, { detail, bubbles: true, composed: true }));
  }
}

declare global {
  interface HTMLElementTagNameMap {
    'start-revision': StartRevision;
  }
}
