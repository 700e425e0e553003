import type { Caution, Option } from '../dossier.ts';
import { branchesOf } from '../evidence/branch.ts';
import { solveNodal } from '../evidence/nodal.ts';
import { terminationAt } from '../network/termination-at.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** Cautions of the chosen network and of the work: safety first, then rules of thumb. */
export function cautionsOf(record: DesignRecord, chosen: Option | undefined): Caution[] {
  const { powerW, frequencyHz } = record.requirement;
  const safety: string[] = [];
  if (powerW !== null && chosen !== undefined) {
    const source = terminationAt(record.source, frequencyHz, frequencyHz);
    const volts = Math.max(
      ...record.loads.flatMap(({ termination }) => {
        const load = terminationAt(termination, frequencyHz, frequencyHz);
        return solveNodal(branchesOf(chosen.arms, frequencyHz), source, load, powerW).nodes.map((node) => node.abs());
      }),
    );
    safety.push(
      `With ${formatQuantity(powerW, 'W', 3)} available, a node of this network reaches ${formatQuantity(volts, 'V', 3)} peak to ground at the design frequency into the loads as given; another load can raise it. RF voltage burns skin at contact: switch off before touching.`,
    );
  } else {
    safety.push('RF voltage burns skin at contact: switch off before touching a network that carries power.');
  }
  safety.push(
    'Capacitors hold charge after switch-off; discharge them before work.',
    'Human exposure to fields, and any transmission, are subject to local codes and licences: transmit into a dummy load unless licensed, and leave the assessment to qualified people.',
  );
  return [
    ...safety.map((text): Caution => ({ kind: 'safety', text })),
    ...(chosen?.cautions ?? []).map((text): Caution => ({ kind: 'practice', text })),
  ];
}
