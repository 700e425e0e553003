import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
  }

  h3 {
    margin: 1.25rem 0 0.375rem;
  }

  .signer {
    display: grid;
    grid-template-columns: 5.5rem minmax(0, 1.4fr) minmax(0, 1.4fr) minmax(0, 1fr);
    gap: 0.25rem 1.25rem;
    align-items: start;
  }

  .signer + .signer {
    margin-top: 0.5rem;
  }

  .signer legend {
    float: left;
    padding: 1.375rem 0 0;
  }

  .signer .remark {
    grid-column: 2 / -1;
  }

  .deviation + .deviation {
    margin-top: 0.5rem;
  }

  .deviation p {
    max-width: none;
  }

  ul {
    padding-left: 1.25rem;
    list-style: disc outside;
  }

  li + li {
    margin-top: 0.125rem;
  }

  .lacks:focus-visible {
    outline-offset: 4px;
  }

  .state {
    display: flex;
    flex-wrap: wrap;
    align-items: end;
    gap: 0.5rem 1.5rem;
    margin-top: 0.75rem;
  }

  .outcome {
    min-height: 1.5em;
    margin-top: 0.375rem;
  }

  @container (max-width: 34rem) {
    .signer {
      grid-template-columns: minmax(0, 1fr) minmax(0, 1fr);
      margin-bottom: 0.5rem;
    }

    .signer legend {
      float: none;
      padding: 0;
      font-weight: 700;
    }

    .signer .remark {
      grid-column: 1 / -1;
    }
  }

  @container (max-width: 20rem) {
    .signer {
      grid-template-columns: minmax(0, 1fr);
    }
  }
`;
