/** The part of a sheet's address after # that opens what is kept: `kept=` and its id. It means something on this device alone. */
export const keptAddress = (id: string): string => `kept=${id}`;

/** @returns null where the address names nothing that is kept */
export const keptIdIn = (hash: string): string | null => /^#?kept=([0-9a-f]{32})$/u.exec(hash)?.[1] ?? null;
