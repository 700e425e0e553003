import type { FitStep } from '../design/fitted.ts';
import type { Dossier, Option } from '../dossier.ts';
import type { Problem } from '../quantity/problem.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** What the page asks of the worker; `id` counts the page's requests. */
export type ToWorker =
  | { readonly kind: 'design'; readonly id: number; readonly record: DesignRecord }
  | { readonly kind: 'stop'; readonly id: number };

/** What the worker says. */
export type FromWorker =
  | { readonly kind: 'progress'; readonly id: number; readonly step: FitStep }
  /** Everything with exact values, where real parts are still to come. */
  | { readonly kind: 'exact'; readonly id: number; readonly dossier: Dossier }
  /** One option as judged with real parts: `done` of `of` are. */
  | {
      readonly kind: 'option';
      readonly id: number;
      readonly option: Option;
      readonly done: number;
      readonly of: number;
    }
  | { readonly kind: 'done'; readonly id: number; readonly dossier: Dossier }
  | { readonly kind: 'refused'; readonly id: number; readonly problems: readonly Problem[] };
