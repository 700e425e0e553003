import { formatRead } from '../../src/quantity/format.ts';
import type { Span } from '../../src/quantity/span.ts';

/** Widest span offered by the button: three decades each way is more than a lumped network means anything over. */
const step = Math.SQRT2;

/** The span with its ends moved outwards, each by the same ratio. */
export const wider = ({ low, high }: Span): Span => ({ low: rounded(low / step), high: rounded(high * step) });

/** The span with its ends half as far, as ratios, from the design frequency, Hz; it stays inside. */
export const narrower = ({ low, high }: Span, frequencyHz: number): Span => ({
  low: rounded(Math.sqrt(low * Math.min(frequencyHz, high))),
  high: rounded(Math.sqrt(high * Math.max(frequencyHz, low))),
});

/** Four digits: a span is a view, and its text is read and edited by people. */
const rounded = (hertz: number): number => Number(hertz.toPrecision(4));

/** As it is typed: "107 MHz..214 MHz". */
export const spanText = ({ low, high }: Span): string => `${formatRead(low, 'Hz')}..${formatRead(high, 'Hz')}`;
