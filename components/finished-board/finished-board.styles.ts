import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
  }

  label.button {
    font-size: var(--size);
    color: var(--ink);
  }

  label.button:focus-within {
    outline: 2px solid var(--accent);
    outline-offset: 2px;
  }

  .actions {
    display: flex;
    flex-wrap: wrap;
    align-items: center;
    gap: 0.5rem 1rem;
    margin-top: 0.625rem;
  }

  .of {
    display: grid;
    grid-template-columns: minmax(0, 1fr) minmax(0, 2fr);
    gap: 0.5rem 1.25rem;
    margin-top: 0.75rem;
  }

  .of > :only-child {
    grid-column: 1 / -1;
  }

  input[type='text'] {
    height: 1.875rem;
  }

  .said {
    margin-top: 0.375rem;
    overflow-wrap: anywhere;
  }

  .results {
    margin-top: 1.25rem;
  }

  .earlier {
    --ink: var(--stale);
    --muted: var(--stale);
    --accent: var(--stale);
    color: var(--stale);
  }

  .results p,
  .intro {
    max-width: 72ch;
  }

  .results p + p {
    margin-top: 0.375rem;
  }

  .headline {
    font-weight: 700;
  }

  figure {
    margin: 1rem 0;
  }

  figure svg {
    display: block;
    width: 100%;
    height: auto;
  }

  .line {
    display: flex;
    flex-wrap: wrap;
    justify-content: space-between;
    align-items: baseline;
    gap: 0 1rem;
    margin-top: 1.25rem;
    padding-bottom: 0.25rem;
  }

  h3 {
    margin-top: 1.25rem;
  }

  .line h3 {
    margin-top: 0;
  }

  .scroll {
    margin-top: 0.5rem;
  }

  .scroll th:first-child {
    min-width: 9.5rem;
  }

  thead .number {
    white-space: normal;
  }

  @container (max-width: 30rem) {
    .of {
      grid-template-columns: minmax(0, 1fr);
    }
  }
`;
