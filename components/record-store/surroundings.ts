import type { Method } from '../../src/record/design-record.ts';
import { openRecordStore, type RecordStore } from './record-store.ts';
import { tabSession, type Session } from './session.ts';
import { joinTabs, type Change, type Tabs } from './tabs.ts';

/** Where what is kept, and what other tabs do, comes from: the browser's own unless a test gives others. */
export interface Surroundings {
  readonly store: RecordStore;
  readonly session: Session;
  readonly join: (hear: (change: Change) => void) => Tabs;
  readonly now: () => number;
}

export const browser = (sheet: Method): Surroundings => ({
  store: openRecordStore(),
  session: tabSession(sheet),
  join: joinTabs,
  now: Date.now,
});
