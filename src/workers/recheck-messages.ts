import type { Problem } from '../quantity/problem.ts';
import type { Recheck } from '../recheck/recheck.ts';

/** A file to recheck, and where the typefaces of reports are. */
export interface ToRecheck {
  readonly name: string;
  readonly bytes: Uint8Array;
  readonly fonts: { readonly regular: string; readonly bold: string };
}

export type FromRecheck =
  | { readonly kind: 'progress'; readonly doing: 'search' | 'parts' | 'report'; readonly done: number }
  | { readonly kind: 'done'; readonly recheck: Recheck }
  | { readonly kind: 'refused'; readonly problems: readonly Problem[] };
