import { css } from 'lit';

export const styles = css`
  .sheet {
    display: grid;
    grid-template-columns: 17.5rem minmax(0, 1fr) 9.5rem;
    gap: 0 clamp(1.75rem, 3vw, 3rem);
    padding-top: 1.5rem;
  }

  .given,
  .contents {
    position: sticky;
    top: 0;
    align-self: start;
    max-height: 100vh;
    overflow-y: auto;
    padding-block: 0.5rem 1rem;
    scrollbar-width: thin;
    scrollbar-color: var(--hairline) transparent;
  }

  .given {
    /* Room for the focus ring, which the scrolling box would cut off. */
    margin-inline: -4px;
    padding-inline: 4px;
  }

  /* In view wherever something was changed; what stands lowest can still be scrolled out from behind it. */
  .waiting {
    position: fixed;
    z-index: 2;
    inset: auto 0 0;
    max-height: 60vh;
    overflow-y: auto;
    padding: 0.75rem max(1rem, calc((100vw - 72rem) / 2));
    border-top: 2px solid var(--ink);
    background: var(--paper);
  }

  .waiting ~ .document {
    padding-bottom: 12rem;
  }

  .sheet:has(.waiting) > :is(.given, .contents) {
    max-height: calc(100vh - var(--covered, 9rem));
  }

  title-block {
    margin-bottom: 2rem;
    padding-left: 3.25rem;
  }

  search-progress {
    margin-left: 3.25rem;
  }

  build-progress {
    margin: -1.75rem 0 1rem;
    padding-left: 3.25rem;
  }

  /* Until a part is fetched it keeps about the room that it will take. */
  :is(network-part, response-part, evidence-part, build-part, record-part):not(:defined) {
    display: block;
    min-height: 40rem;
  }

  sheet-part {
    margin-bottom: 2.75rem;
    scroll-margin-top: 1rem;
  }

  .dragging {
    outline: 3px dashed var(--accent);
    outline-offset: -3px;
  }

  @media (max-width: 74.99rem) {
    .sheet {
      grid-template-columns: 16.5rem minmax(0, 1fr);
    }

    .contents {
      display: none;
    }
  }

  @media (max-width: 56.24rem) {
    .sheet {
      grid-template-columns: minmax(0, 1fr);
      padding-top: 0;
    }

    .given {
      z-index: 1;
      padding-block: 0;
      background: var(--paper);
    }

    .document {
      padding-top: 1.25rem;
    }
  }

  @media (max-width: 40rem) {
    title-block {
      padding-left: 0;
    }

    search-progress {
      margin-left: 0;
    }

    build-progress {
      padding-left: 0;
    }
  }

  @media (max-width: 56.24rem) and (max-height: 30rem) {
    .given {
      position: static;
      max-height: none;
    }

    .waiting {
      position: static;
      max-height: none;
    }
  }
`;
