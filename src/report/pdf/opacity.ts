import type { Sheet } from '../page/paginate.ts';

/** Name of the graphics state in which fills are as opaque as this, 0 to 1. */
export const opacityName = (opacity: number): string => `O${String(Math.round(opacity * 100))}`;

/** The graphics states (ISO 32000-1, 8.4.5) that the figures of sheets need, by their names. */
export function opacityStates(sheets: readonly Sheet[]): Record<string, { readonly ca: number }> {
  const shapes = sheets.flatMap(({ items }) =>
    items.flatMap((item) => (item.kind === 'figure' ? item.figure.shapes : [])),
  );
  const opacities = shapes.flatMap((shape) =>
    shape.kind === 'path' && shape.fillOpacity !== undefined ? [shape.fillOpacity] : [],
  );
  return Object.fromEntries([...new Set(opacities)].map((opacity) => [opacityName(opacity), { ca: opacity }]));
}
