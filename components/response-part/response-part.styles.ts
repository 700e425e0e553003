import { css } from 'lit';

export const styles = css`
  :host {
    container-type: inline-size;
  }

  .span {
    display: flex;
    flex-wrap: wrap;
    align-items: flex-start;
    gap: 0.5rem 1.5rem;
    margin-bottom: 1.25rem;
  }

  .span text-field {
    flex: 1 1 16rem;
    max-width: 26rem;
  }

  .steps {
    display: flex;
    flex-wrap: wrap;
    gap: 0.5rem;
    padding-top: 1.125rem;
  }

  figure svg {
    display: block;
    width: 100%;
    height: auto;
  }

  figure + figure {
    margin-top: 1rem;
  }

  .plot {
    position: relative;
    cursor: crosshair;
    touch-action: pan-y;
  }

  .cursor {
    position: absolute;
    top: 14%;
    bottom: 14%;
    border-left: 1px solid var(--accent);
    pointer-events: none;
  }

  .plane {
    max-width: 46rem;
    padding-top: 0.5rem;
  }

  h3 {
    margin-top: 1.5rem;
  }

  .both {
    display: grid;
    grid-template-columns: repeat(auto-fit, minmax(min(100%, 16rem), 1fr));
    gap: 0 2.5rem;
    margin: 0.375rem 0 0.75rem;
  }

  .both dl {
    padding: 0.5rem 0;
    border-top: 1px solid var(--ink);
  }

  .both dt,
  .both dd:not(.figure) {
    color: var(--muted);
    font-size: var(--small);
  }

  .both .figure {
    font-size: 1.25rem;
    line-height: 1.5;
  }

  sub {
    font-size: 0.75em;
    line-height: 0;
  }
`;
