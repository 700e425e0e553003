import type { Dossier, Option } from '../../src/dossier.ts';
import { frequencySpan, returnLossWords } from '../../src/design/words.ts';
import { formatFixed } from '../../src/quantity/format.ts';
import type { Span } from '../../src/quantity/span.ts';
import { builtPartWords, partWords, unbroken } from '../base/words.ts';
import type { Settled } from './settle.ts';

/** What the sheet came to, in two or three sentences. */
export function outcome(dossier: Dossier): string {
  const { options, chosen, record } = dossier;
  const shown = options.find(({ id }) => id === chosen);
  if (shown === undefined) return 'No network of these forms matches these terminations.';
  const meeting = options.filter(({ meets }) => meets).length;
  const by = { engineer: 'Chosen', proposal: 'Proposed', nearest: 'Nearest' }[dossier.chosenBy];
  const parts = shown.built === null ? partWords(shown) : builtPartWords(shown.built);
  const values =
    parts.length === 0 || parts.length > 4
      ? ''
      : ` (${parts.map((words) => words.replaceAll(' ', '\u00a0')).join(', ')})`;
  const band = record.requirement.bandHz;
  const held = band === null ? '' : heldWords(shown, band);
  return unbroken(`${howMany(meeting, options.length)} ${by}: ${lowerFirst(shown.title)}${values}.${held}`);
}

/** How well the band is held, with real parts where there are such. */
function heldWords({ worstReturnLossDb, built }: Option, band: Span): string {
  const worst = built?.worstReturnLossDb ?? worstReturnLossDb;
  if (worst === null) return '';
  const made = built?.yield ?? null;
  const over =
    made === null ? `from ${frequencySpan(band)}` : `over the band, its yield ${formatFixed(made.value * 100, 1)} %`;
  return ` Its return loss is ${returnLossWords(worst)} at worst ${over}.`;
}

function howMany(meeting: number, all: number): string {
  if (all === 1) return meeting === 1 ? 'The one network meets everything asked.' : 'The one network falls short.';
  if (meeting === 0) return `None of ${String(all)} networks meets everything asked.`;
  return `${String(meeting)} of ${String(all)} networks ${meeting === 1 ? 'meets' : 'meet'} everything asked.`;
}

/** "Series L" in the middle of a sentence is "series L"; a Pi or T stays one. */
const lowerFirst = (text: string): string =>
  /^(?:Pi|T):/u.test(text) ? text : text.charAt(0).toLowerCase() + text.slice(1);

/** What is given, in one line, from what was understood. */
export function givenLine({ understood }: Settled): string {
  const { frequency, source, load, band } = understood;
  const ends = [source, load].filter((text) => text !== undefined).join(' to ');
  return [frequency, ends, band, understood['return-loss']]
    .filter((text) => text !== undefined && text !== '')
    .join(', ');
}
