import { formatFigure, type Figure } from './figure.ts';
import { benchSweep } from './sweep.ts';

/** Prints each figure with its budget beside it. Figures are for reading: a miss doesn't fail the command. */
const benches: readonly (() => readonly Figure[] | Promise<readonly Figure[]>)[] = [benchSweep];

for (const bench of benches) for (const figure of await bench()) console.log(formatFigure(figure));
