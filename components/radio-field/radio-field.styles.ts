import { css } from 'lit';

export const styles = css`
  legend {
    padding: 0;
    margin-bottom: 0.125rem;
  }

  label {
    display: flex;
    gap: 0.5rem;
    padding: 0.25rem 0;
    min-height: 1.5rem;
    color: var(--ink);
    font-size: var(--size);
    line-height: 1.35;
    cursor: pointer;
  }

  input {
    flex: none;
    width: 1rem;
    height: 1rem;
    min-height: 0;
    margin-top: 0.15em;
    accent-color: var(--accent);
  }

  .note {
    padding-left: 1.5rem;
    min-height: 0;
  }

  .problem {
    padding-left: 0;
  }

  :host([inline]) .choices {
    display: flex;
    flex-wrap: wrap;
    gap: 0 1.25rem;
  }
`;
