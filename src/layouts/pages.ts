import type { Method } from '../record/design-record.ts';

/** The pages in the order of the masthead; `path` is relative to the base of the site. */
export const pages = [
  { path: '', name: 'Complex terminations', method: 'two-element' },
  { path: 'resistive/', name: 'Resistive pair', method: 'resistive-pair' },
  { path: 'sections/', name: 'Several sections', method: 'cascade' },
  { path: 'records/', name: 'Kept records', method: null },
  { path: 'recheck/', name: 'Recheck', method: null },
  { path: 'basis/', name: 'Basis of calculation', method: null },
] as const satisfies readonly { path: string; name: string; method: Method | null }[];
