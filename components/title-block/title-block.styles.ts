import { css } from 'lit';

export const styles = css`
  .sheet {
    color: var(--muted);
    font-size: var(--small);
  }

  h1 {
    margin: 0.125rem 0 0.625rem;
    font-size: clamp(1.375rem, 1rem + 1.6vw, 1.875rem);
    line-height: 1.2;
    font-weight: 700;
    letter-spacing: -0.01em;
    text-wrap: balance;
    overflow-wrap: anywhere;
  }

  dl {
    display: flex;
    flex-wrap: wrap;
    gap: 0.25rem 2rem;
    font-size: var(--small);
  }

  dl div {
    display: flex;
    gap: 0.5em;
  }

  dt {
    color: var(--muted);
  }

  dd {
    overflow-wrap: anywhere;
  }

  .stale {
    margin-top: 1rem;
    font-weight: 700;
  }

  .stale + .outcome {
    margin-top: 0;
    color: var(--stale);
  }

  .outcome {
    margin-top: 1rem;
    font-size: 1.0625rem;
    line-height: 1.5;
  }
`;
