import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
    /* A part out of view costs no layout while someone types in another. */
    content-visibility: auto;
    contain-intrinsic-block-size: auto 50rem;
    /* Room for focus rings at the edge. */
    overflow-clip-margin: 6px;
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
    align-items: flex-start;
    margin-top: 0.375rem;
    font-size: var(--small);
  }

  .basis a {
    min-height: 1.5rem;
    color: var(--muted);
    text-decoration-color: var(--hairline);
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

  /* Read out always, seen only where the margin is gone. */
  .inline {
    position: absolute;
    width: 1px;
    height: 1px;
    overflow: hidden;
    clip-path: inset(50%);
  }

  .stale {
    margin: -0.5rem 0 1rem;
    font-weight: 700;
  }

  :host([stale]) ::slotted(*) {
    --ink: var(--stale);
    --muted: var(--stale);
    --accent: var(--stale);
    --limit: var(--stale);
    color: var(--stale);
  }

  @container (max-width: 36rem) {
    section {
      grid-template-columns: minmax(0, 1fr);
    }

    .number {
      display: none;
    }

    .inline {
      position: static;
      clip-path: none;
      margin-right: 0.375rem;
      color: var(--accent);
    }

    .margin {
      order: 1;
    }

    .basis {
      flex-flow: row wrap;
      gap: 0 1rem;
      margin-top: 1rem;
    }
  }
`;
