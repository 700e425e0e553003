import { formatFigure, type Figure } from './figure.ts';
import { benchFit } from './fit.ts';
import { benchKeystroke } from './keystroke.ts';
import { benchLoad } from './load.ts';
import { benchMonteCarlo } from './monte-carlo.ts';
import { benchReport } from './report.ts';
import { benchSweep } from './sweep.ts';
import { benchTouchstone } from './touchstone.ts';

/** Prints each figure with its budget beside it. Figures are for reading: a miss doesn't fail the command. */
const benches: readonly (() => readonly Figure[] | Promise<readonly Figure[]>)[] = [
  benchSweep,
  benchLoad,
  benchKeystroke,
  benchReport,
  benchTouchstone,
  benchFit,
  benchMonteCarlo,
];

for (const bench of benches) for (const figure of await bench()) console.log(formatFigure(figure));
