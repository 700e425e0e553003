import { modelWords, namesModel, readModel } from '../network/read-model.ts';
import { isMeasured, isModel, type MeasuredTermination, type Termination } from '../network/termination.ts';
import { formatImpedanceRead, formatQuantity } from '../quantity/format.ts';
import { readImpedance } from '../quantity/read-impedance.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';
import type { LoadState } from './design-record.ts';

/** Measured data at hand, by the name that stands for them in a field. */
export type Attachments = ReadonlyMap<string, MeasuredTermination>;

/**
 * A termination as typed: an impedance, a circuit model (`rc-series 12 8.2p`), or the name of measured data.
 *
 * @param behaviour what an impedance does away from the design frequency, as typed: checked with the record
 */
export function readTermination(text: string, behaviour: string, attachments: Attachments): Reading<Termination> {
  const given = text.trim();
  const measured = attachments.get(given);
  if (measured !== undefined) return read(measured);
  if (/\.s\d+p\b/iu.test(given) || given.startsWith('table')) {
    return refuse('its data are not here', 'open the file again');
  }
  if (namesModel(given)) return readModel(given);
  const z = readImpedance(given);
  return z.ok ? read({ ...z.value, behaviour: behaviour as 'series' }) : z;
}

/** One load state a line, each with a name if it likes: `in hand = 12-j40`. */
export function readLoads(text: string, behaviour: string, attachments: Attachments): Reading<readonly LoadState[]> {
  const lines = text.split(/\r?\n/u).filter((line) => line.trim() !== '');
  const states: LoadState[] = [];
  for (const [k, line] of (lines.length === 0 ? [''] : lines).entries()) {
    const named = /^([^=]*)=(.*)$/su.exec(line);
    const name = named?.[1]?.trim() ?? '';
    const reading = readTermination(named?.[2] ?? line, behaviour, attachments);
    if (!reading.ok) {
      const which = name === '' ? `state ${String(k + 1)}` : name;
      return lines.length > 1 ? refuse(`${which}: ${reading.why}`, reading.would) : reading;
    }
    states.push({
      name: name === '' && lines.length > 1 ? `state ${String(k + 1)}` : name,
      termination: reading.value,
    });
  }
  return read(states);
}

/** What was understood, for the field and for the report: "9.4 − j61 Ω". */
export function terminationWords(termination: Termination): string {
  if (isMeasured(termination)) {
    const { name, samples, frequencyHz } = termination.measured;
    const [low, high] = [frequencyHz[0]!, frequencyHz[frequencyHz.length - 1]!];
    return `${name}, ${String(samples)} samples, ${formatQuantity(low, 'Hz')} to ${formatQuantity(high, 'Hz')}`;
  }
  if (isModel(termination)) return modelWords(termination);
  return formatImpedanceRead(termination.r, termination.x);
}

/** Measured data that a record carries, by name. */
export function attachmentsOf(terminations: readonly Termination[]): Attachments {
  return new Map(terminations.filter(isMeasured).map((t) => [t.measured.name, t]));
}

/** A few letters for a drawing: "9.4 − j61 Ω", "rc-series", "measured". */
export function terminationLabel(termination: Termination): string {
  if (isMeasured(termination)) return 'measured';
  if (isModel(termination)) return termination.model;
  return formatImpedanceRead(termination.r, termination.x);
}

/** The same for load states: how many there are, where it isn't one. */
export const loadLabel = (loads: readonly LoadState[]): string =>
  loads.length === 1 ? terminationLabel(loads[0]!.termination) : `${String(loads.length)} states`;
