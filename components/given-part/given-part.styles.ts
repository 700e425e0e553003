import { css } from 'lit';

export const styles = css`
  h2 {
    margin-bottom: 0.75rem;
    font-size: 1.25rem;
    line-height: 1.75rem;
  }

  h3 {
    margin: 1.25rem 0 0.5rem;
    padding-top: 0.625rem;
    border-top: 1px solid var(--hairline);
  }

  section {
    position: relative;
  }

  .basis {
    position: absolute;
    top: 0.25rem;
    right: 0;
    font-size: var(--small);
  }

  .basis a {
    margin-left: 0.5rem;
    color: var(--muted);
    text-decoration-color: var(--hairline);
  }

  .problem {
    font-size: var(--small);
    line-height: 1.35;
    overflow-wrap: anywhere;
  }

  .number {
    margin-right: 0.5rem;
    color: var(--accent);
    font-weight: 700;
  }

  .group {
    display: grid;
    gap: 0.5rem;
  }

  details.help {
    margin: 0;
    padding: 0;
    border: 0;
    font-size: var(--small);
    line-height: 1.4;
  }

  details.help summary {
    font-weight: 400;
  }

  details.help ul {
    margin: 0.25rem 0 0.25rem 0.75rem;
  }

  choice-field + text-field,
  choice-field + area-field,
  area-field + choice-field,
  choice-field + radio-field {
    margin-top: 0.5rem;
  }

  choice-field + choice-field {
    margin-top: 0.375rem;
  }

  details {
    margin-top: 1rem;
    padding-top: 0.625rem;
    border-top: 1px solid var(--hairline);
  }

  summary {
    min-height: 1.5rem;
    font-weight: 700;
    cursor: pointer;
  }

  summary .muted {
    display: block;
    padding-left: 1rem;
    font-size: var(--small);
    font-weight: 400;
  }

  details[open] summary {
    margin-bottom: 0.5rem;
  }

  /* Until it is fetched it keeps the room that it will take. */
  measured-data:not(:defined) {
    display: block;
    min-height: 4.125rem;
  }

  .fold {
    display: none;
  }

  @media (max-width: 56.24rem) {
    section {
      border: 0;
      padding: 0;
    }

    h2 {
      position: absolute;
      width: 1px;
      height: 1px;
      overflow: hidden;
      clip-path: inset(50%);
    }

    .basis {
      position: static;
      display: none;
    }

    .fold {
      display: flex;
      justify-content: space-between;
      gap: 1rem;
      width: 100%;
      min-height: 3rem;
      padding: 0.5rem 0;
      border: 0;
      border-bottom: 1px solid var(--ink);
      border-radius: 0;
      text-align: left;
    }

    .summary {
      min-width: 0;
      font-weight: 700;
    }

    .line {
      display: block;
      font-size: var(--small);
      font-weight: 400;
    }

    .act {
      flex: none;
      color: var(--accent);
      text-decoration: underline;
      text-underline-offset: 0.2em;
    }

    .form {
      display: none;
      padding-bottom: 1rem;
    }

    .form.unfolded {
      display: block;
      border-bottom: 1px solid var(--ink);
    }
  }
`;
