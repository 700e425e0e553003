import type { Check } from '../dossier.ts';
import type { Arm } from '../network/arm.ts';
import type { DcPath } from '../network/dc-path.ts';
import { holds, returnLossDb } from '../network/figures-of-merit.ts';
import type { Worst } from '../network/worst-in-band.ts';
import { impracticable } from '../parts/practicable.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { decibelPair, returnLossWords } from './words.ts';

/** The verdict on all of them, with the reasons why a network falls short; when it meets everything, what it meets. */
export function verdictOf(checks: readonly Check[]): { readonly meets: boolean; readonly reasons: readonly string[] } {
  const short = checks.filter(({ verdict }) => verdict === 'falls short');
  return { meets: short.length === 0, reasons: (short.length === 0 ? checks : short).map(({ reason }) => reason) };
}

/**
 * One verdict per thing required, with its reason in words. What isn't required isn't assessed.
 *
 * @param which of whose return loss it speaks: "with real parts "
 */
export function checksOf(
  { requirement, aim }: DesignRecord,
  arms: readonly Arm[],
  designators: readonly string[],
  worst: Worst,
  state: string,
  dc: DcPath,
  which = '',
): Check[] {
  const checks: Check[] = [];
  const add = (subject: Check['subject'], good: boolean, reason: string): void => {
    checks.push({ subject, verdict: good ? 'meets' : 'falls short', reason });
  };

  if (requirement.returnLossDb !== null) {
    const worstDb = returnLossDb(worst.gammaSquared);
    const [found, asked] = decibelPair(worstDb, requirement.returnLossDb);
    const good = holds(worstDb, requirement.returnLossDb);
    const shown = worstDb > 100 ? returnLossWords(worstDb) : found;
    const kind = aim === 'conjugate' ? '' : ' (reflectionless aim)';
    add(
      'return loss',
      good,
      `return loss${kind} ${which}${shown} at worst (${formatQuantity(worst.atHz, 'Hz', 5)}${state === '' ? '' : `, ${state}`}), ${good ? 'at least' : 'below'} the ${asked} required`,
    );
  }
  if (requirement.blockDc) {
    add(
      'DC block',
      dc.blocked,
      dc.blocked ? 'a series capacitor blocks DC' : 'no series capacitor: DC passes from source to load',
    );
  }
  for (const end of ['source', 'load'] as const) {
    if (requirement.keepDc !== end && requirement.keepDc !== 'both') continue;
    const shorted = end === 'source' ? dc.sourceShorted : dc.loadShorted;
    add(
      `DC at the ${end}`,
      !shorted,
      shorted ? `a shunt inductor shorts the DC at the ${end} to ground` : `DC at the ${end} is not shorted`,
    );
  }
  const out = impracticable(arms, designators, requirement.inductorH, requirement.capacitorF);
  add(
    'part values',
    out.length === 0,
    out.length === 0 ? 'part values are practicable' : `out of the practicable range: ${out.join('; ')}`,
  );
  return checks;
}
