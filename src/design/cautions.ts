import type { BuiltPart, Caution, Option } from '../dossier.ts';
import { branchesOf } from '../evidence/branch.ts';
import { solveNodal } from '../evidence/nodal.ts';
import { terminationAt } from '../network/termination-at.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** Heat in one part above which it is said to burn, W (common practice). */
const hot = 0.5;

/** Cautions of the chosen network and of the work: safety first, then rules of thumb. */
export function cautionsOf(record: DesignRecord, chosen: Option | undefined): Caution[] {
  const safety = [
    voltage(record, chosen),
    ...heat(chosen),
    'Capacitors hold charge after switch-off; discharge them before work.',
    'Human exposure to fields, and any transmission, are subject to local codes and licences: transmit into a dummy load unless licensed, and leave the assessment to qualified people.',
  ];
  return [
    ...safety.map((text): Caution => ({ kind: 'safety', text })),
    ...(chosen?.cautions ?? []).map((text): Caution => ({ kind: 'practice', text })),
    ...(chosen?.built?.parts ?? []).flatMap((part) => nearResonance(part, record.requirement.frequencyHz)),
    ...(chosen?.built?.coils ?? [])
      .filter(({ caution }) => caution !== '' && record.build?.inductor.origin === 'wound')
      .map(({ designator, caution }): Caution => ({ kind: 'practice', text: `${designator}: ${caution}` })),
  ];
}

function voltage(record: DesignRecord, chosen: Option | undefined): string {
  const { powerW, frequencyHz } = record.requirement;
  if (powerW === null || chosen === undefined) {
    return 'RF voltage burns skin at contact: switch off before touching a network that carries power.';
  }
  const source = terminationAt(record.source, frequencyHz, frequencyHz);
  const volts = Math.max(
    ...record.loads.flatMap(({ termination }) => {
      const load = terminationAt(termination, frequencyHz, frequencyHz);
      return solveNodal(branchesOf(chosen.arms, frequencyHz), source, load, powerW).nodes.map((node) => node.abs());
    }),
  );
  const mismatched = Math.max(0, ...(chosen.built?.stress?.parts ?? []).map((part) => part.mismatched?.voltsPeak ?? 0));
  const raised =
    mismatched > 0
      ? `a mismatched load raises it, to ${formatQuantity(mismatched, 'V', 3)} peak across a part at the VSWR stated`
      : 'another load can raise it';
  return `With ${formatQuantity(powerW, 'W', 3)} available, a node of this network reaches ${formatQuantity(volts, 'V', 3)} peak to ground at the design frequency into the loads as given; ${raised}. RF voltage burns skin at contact: switch off before touching.`;
}

/** A part within three times the design frequency of its self-resonance isn't the value that it is sold as. */
function nearResonance({ designator, part, selfResonanceHz }: BuiltPart, f0: number): readonly Caution[] {
  if (selfResonanceHz === null || selfResonanceHz > 3 * f0) return [];
  const resonance = formatQuantity(selfResonanceHz, 'Hz');
  // Below resonance L/(1 − (f/f_SR)²), and C likewise, is what the part looks like.
  const more = 100 / (1 - (f0 / selfResonanceHz) ** 2) - 100;
  const text =
    selfResonanceHz <= f0
      ? `${designator} resonates by itself at ${resonance}, not above the design frequency: there it is no ${part}.`
      : `${designator} resonates by itself at ${resonance}: at the design frequency it looks ${formatFixed(more, 0)} % larger than it is sold as, which the figures take in and its tolerance does not.`;
  return [{ kind: 'practice', text }];
}

function heat(chosen: Option | undefined): readonly string[] {
  const parts = chosen?.built?.stress?.parts ?? [];
  const hottest = parts.reduce((most, { watts, mismatched }) => Math.max(most, watts, mismatched?.watts ?? 0), 0);
  if (hottest < hot) return [];
  const part = parts.find(({ watts, mismatched }) => Math.max(watts, mismatched?.watts ?? 0) === hottest)!;
  return [
    `${part.designator} turns up to ${formatQuantity(hottest, 'W', 3)} into heat: it and the board about it burn at a touch, and stay hot after switch-off.`,
  ];
}
