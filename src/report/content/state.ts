import type { DesignRecord } from '../../record/design-record.ts';

type State = DesignRecord['signOff']['state'];

/** How far a document has come: for its title block, and for the head of every sheet. */
export const stateWords: Readonly<
  Record<State, { readonly name: string; readonly mark: string; readonly says: string }>
> = {
  draft: { name: 'Draft', mark: 'DRAFT', says: 'Draft: it may still change.' },
  'for review': { name: 'For review', mark: 'FOR REVIEW', says: 'For review: not yet approved.' },
  issued: { name: 'Issued', mark: 'Issued', says: 'Issued: a change starts the next revision.' },
};
