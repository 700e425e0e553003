import type { FitStep } from '../design/fitted.ts';
import type { Dossier } from '../dossier.ts';
import type { Problem } from '../quantity/problem.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** What the page asks of the worker; `id` counts the page's requests. */
export type ToWorker =
  | { readonly kind: 'design'; readonly id: number; readonly record: DesignRecord }
  | { readonly kind: 'stop'; readonly id: number };

/** What the worker says. */
export type FromWorker =
  | { readonly kind: 'progress'; readonly id: number; readonly step: FitStep }
  | { readonly kind: 'done'; readonly id: number; readonly dossier: Dossier }
  | { readonly kind: 'refused'; readonly id: number; readonly problems: readonly Problem[] };
