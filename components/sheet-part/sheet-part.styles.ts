import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
  }

  section {
    display: grid;
    grid-template-columns: 3.25rem minmax(0, 1fr);
    padding-top: 0.75rem;
    border-top: 1px solid var(--ink);
  }

  .number {
    display: block;
    font-size: 1.25rem;
    line-height: 1.75rem;
    font-weight: 700;
    color: var(--accent);
  }

  .basis {
    display: flex;
    flex-direction: column;
    margin-top: 0.375rem;
    font-size: var(--small);
  }

  .basis a {
    min-height: 1.5rem;
    color: var(--muted);
  }

  header {
    display: flex;
    flex-wrap: wrap;
    justify-content: space-between;
    align-items: baseline;
    gap: 0 1rem;
    margin-bottom: 1rem;
  }

  h2 {
    font-size: 1.25rem;
    line-height: 1.75rem;
    font-weight: 700;
  }

  h2:focus:not(:focus-visible) {
    outline: none;
  }

  .stale {
    margin: -0.5rem 0 1rem;
    font-weight: 700;
  }

  :host([stale]) ::slotted(*) {
    opacity: 0.55;
  }

  @container (max-width: 36rem) {
    section {
      grid-template-columns: minmax(0, 1fr);
    }

    .margin {
      display: flex;
      align-items: baseline;
      justify-content: space-between;
    }

    .basis {
      flex-direction: row;
      gap: 0.75rem;
      margin: 0;
    }
  }
`;
