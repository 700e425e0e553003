import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import type { RealLadder } from '../../../src/network/real-arm.ts';
import type { AsBuilt, DesignRecord } from '../../../src/record/design-record.ts';
import { revise } from '../../../src/record/revise.ts';
import { boardImpedance, grid } from '../evidence/as-built/fixture.ts';
import { demo } from './records.ts';

/** What an analyser would have measured on a board with these arms, in 50 Ω, with a ripple where a real one has noise. */
export function boardOf(
  { requirement, loads }: DesignRecord,
  ladder: RealLadder,
  { low, high, samples }: { readonly low: number; readonly high: number; readonly samples: number },
): AsBuilt {
  const lines = grid(low, high, samples).map((hz, k) => {
    const z = boardImpedance({ ladder, load: loads[0]!.termination }, requirement.frequencyHz, hz);
    const { re, im } = z.sub(50).div(z.add(50));
    return [hz, re + 4e-4 * Math.cos(k * k), im + 4e-4 * Math.sin(7 * k * k)].join(' ');
  });
  const { measured } = measuredTermination(`# Hz S RI R 50\n${lines.join('\n')}\n`, 'board-7.s1p', 1);
  return { measured, state: null, note: 'Antenna on its bracket' };
}

const signed = (name: string, date: string) => ({ name, role: '', date, remark: '' });

/** Revision A of the tide gauge, as it was issued. */
export const issued: DesignRecord = {
  ...demo('tide-gauge'),
  signOff: {
    state: 'issued',
    prepared: signed('A. Preparer', '2026-12-01'),
    checked: signed('B. Checker', '2026-12-02'),
    approved: signed('C. Approver', '2026-12-03'),
  },
};

const next = revise(issued, { revision: 'B', change: 'Band widened', date: '2027-01-15' });

/** Its revision B, with a wider band. */
export const revisionB: DesignRecord = {
  ...next,
  requirement: { ...next.requirement, bandHz: { low: 150e6, high: 153e6 } },
};
