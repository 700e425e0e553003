/** An entry that a tab wrote, deleted or put back; `version` 0: it is gone. */
export interface Change {
  readonly id: string;
  readonly version: number;
}

export interface Tabs {
  tell(change: Change): void;
  close(): void;
}

/** Tells the site's other tabs of changes, and hears of theirs. */
export function joinTabs(hear: (change: Change) => void): Tabs {
  const channel = new BroadcastChannel('ferrule-records');
  channel.onmessage = ({ data }: MessageEvent<Change>) => hear(data);
  return { tell: (change) => channel.postMessage(change), close: () => channel.close() };
}
