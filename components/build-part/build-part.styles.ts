import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
  }

  .none {
    margin-top: 0.75rem;
    color: var(--muted);
  }

  /* Results take their room before they are there. */
  .room {
    min-height: 60rem;
  }

  build-progress {
    margin-top: 0.25rem;
  }

  .earlier {
    --ink: var(--stale);
    --muted: var(--stale);
    --accent: var(--stale);
    color: var(--stale);
  }

  .of {
    font-weight: 700;
  }

  .line {
    display: flex;
    flex-wrap: wrap;
    justify-content: space-between;
    align-items: baseline;
    gap: 0 1rem;
    margin-top: 1.5rem;
    padding-bottom: 0.25rem;
  }

  h3,
  legend {
    padding: 0;
    font-weight: 700;
  }

  h3 {
    margin-top: 1.5rem;
  }

  .line h3 {
    margin-top: 0;
  }

  p {
    max-width: 72ch;
  }

  .after {
    margin-top: 0.5rem;
  }

  .sets {
    margin-top: 1.5rem;
  }

  .sets legend {
    margin-bottom: 0.25rem;
  }

  .sets tbody :is(th, td) {
    vertical-align: middle;
  }

  .sets label {
    display: grid;
    grid-template-columns: 1.5rem minmax(8rem, 1fr);
    align-items: center;
    min-height: 1.5rem;
    cursor: pointer;
  }

  input {
    width: 1rem;
    height: 1rem;
    margin: 0;
    accent-color: var(--accent);
  }

  .bar {
    width: 34%;
    min-width: 6rem;
    padding-right: 0;
    vertical-align: middle;
  }

  .bar div {
    height: 0.625rem;
    min-width: 1px;
    border: 1px solid var(--ink);
    background: var(--faint);
  }

  dl {
    margin-top: 0.25rem;
    border-block: 1px solid var(--ink);
  }

  dl div {
    display: grid;
    grid-template-columns: minmax(8rem, 1fr) minmax(0, 2.25fr);
    gap: 0 1rem;
    padding: 0.4rem 0;
  }

  dl + copy-button {
    display: block;
    width: fit-content;
    margin-left: auto;
  }

  dl + copy-button + .line {
    margin-top: 0.5rem;
  }

  thead td {
    border-bottom: 1px solid var(--ink);
  }

  dl div + div {
    border-top: 1px solid var(--hairline);
  }

  dt {
    color: var(--muted);
  }

  @container (max-width: 30rem) {
    dl div {
      grid-template-columns: minmax(0, 1fr);
    }
  }

  @media (pointer: coarse) {
    .sets label {
      min-height: 2.75rem;
    }
  }
`;
