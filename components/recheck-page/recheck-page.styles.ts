import { css } from 'lit';

export const styles = css`
  :host {
    max-width: 60rem;
    padding-top: 1.75rem;
  }

  h1 {
    margin: 0 0 0.75rem;
    font-size: 1.875rem;
    line-height: 1.2;
  }

  h2 {
    margin: 2rem 0 0.5rem;
    font-size: 1.125rem;
  }

  .drop {
    margin-top: 1.25rem;
    padding: 1.5rem 1rem;
    border: 1px dashed var(--field);
    background: var(--tint);
  }

  .drop.over {
    outline: 3px dashed var(--accent);
    outline-offset: -3px;
  }

  .drop p {
    margin-top: 0.625rem;
    color: var(--muted);
    font-size: var(--small);
  }

  label.button:focus-within {
    outline: 2px solid var(--accent);
    outline-offset: 2px;
  }

  .said {
    min-height: 1.5em;
    max-width: none;
    margin-top: 1rem;
    overflow-wrap: anywhere;
  }

  progress {
    display: block;
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

  .outcome {
    font-size: 1.125rem;
  }

  dl {
    display: grid;
    grid-template-columns: max-content minmax(0, 1fr);
    gap: 0.25rem 1.5rem;
  }

  dt {
    color: var(--muted);
  }

  dd {
    overflow-wrap: anywhere;
  }

  summary {
    min-height: 1.75rem;
    margin-top: 1.25rem;
    cursor: pointer;
  }

  @media (max-width: 40rem) {
    dl {
      grid-template-columns: minmax(0, 1fr);
      gap: 0;
    }

    dd {
      margin-bottom: 0.5rem;
    }

    td,
    th {
      padding-right: 0.75rem;
    }

    tbody th {
      min-width: 8rem;
    }
  }
`;
