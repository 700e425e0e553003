/** How it stands with keeping what is typed, in words for the page; '' where nothing needs saying. */
export interface Keeping {
  readonly state: 'nothing typed' | 'kept' | 'not kept' | 'changed elsewhere' | 'kept apart';
  readonly words: string;
}

export const nothingTyped: Keeping = { state: 'nothing typed', words: '' };

export const keptNow: Keeping = { state: 'kept', words: '' };

export const notKept = (why: string): Keeping => ({ state: 'not kept', words: why });

export const changedElsewhere: Keeping = {
  state: 'changed elsewhere',
  words:
    'This document was changed in another tab. Go on here, and what you type is kept apart as a document of its own.',
};

export const keptApart: Keeping = {
  state: 'kept apart',
  words:
    'This document was changed in another tab meanwhile. Both are kept: what you typed here, apart from the other.',
};

export const goneElsewhere: Keeping = {
  state: 'kept apart',
  words: 'This document was deleted or issued in another tab meanwhile. What you typed here is kept apart.',
};
