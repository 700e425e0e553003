/** Outcome of reading a typed text: a value, or why not and what would do. */
export type Reading<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly why: string; readonly would: string };

export const read = <T>(value: T): Reading<T> => ({ ok: true, value });
export const refuse = (why: string, would: string): Reading<never> => ({ ok: false, why, would });
