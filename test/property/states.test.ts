import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { recordOf } from '../unit/record-of.ts';
import { bandAround, reactive } from './random-loads.ts';

const f0 = 100e6;
const base = recordOf({ frequency: '100M', source: '50', load: '50', 'return-loss': '6' });
const problem = fc.record({
  loads: fc.array(reactive(f0), { minLength: 2, maxLength: 5 }),
  source: fc.oneof(fc.constant(base.source), reactive(f0)),
  band: fc.option(bandAround(f0), { nil: null }),
  method: fc.constantFrom<DesignRecord['method']>('two-element', 'pi', 'cascade'),
});

describe('design(record) of several load states', () => {
  it('gives each state the figures of a design of that state alone, and the option those of the worst', () => {
    fc.assert(
      fc.property(problem, ({ loads, source, band, method }) => {
        const record: DesignRecord = {
          ...base,
          source,
          method,
          sections: 2,
          requirement: { ...base.requirement, bandHz: band },
          loads: loads.map((termination, k) => ({ name: `state ${String(k)}`, termination })),
        };
        const dossier = design(record);
        // The first state's networks are those of all; its own figures are those of a design of it alone.
        const alone = design({ ...record, loads: [{ name: '', termination: loads[0]! }] });
        expect(dossier.options.map(({ id, arms }) => [id, arms])).toEqual(
          alone.options.map(({ id, arms }) => [id, arms]),
        );
        dossier.options.forEach((option, k) => {
          expect(option.states.map(({ name }) => name)).toEqual(record.loads.map(({ name }) => name));
          const { name, ...first } = option.states[0]!;
          expect(name).toBe('state 0');
          expect(alone.options[k]).toMatchObject(first);
          const worst = option.states.find((state) => state.name === option.worstState)!;
          expect({ ...option, name: worst.name }).toMatchObject(worst);
          for (const state of option.states) {
            if (band === null) expect(state.reflection).toBeLessThanOrEqual(worst.reflection);
            else expect(state.worstReturnLossDb).toBeGreaterThanOrEqual(worst.worstReturnLossDb!);
          }
          const returnLoss = option.checks.find(({ subject }) => subject === 'return loss')!;
          expect(returnLoss.reason).toContain(option.worstState);
          const db = option.worstReturnLossDb ?? -20 * Math.log10(worst.reflection);
          expect(returnLoss.verdict).toBe(db >= 6 - 1e-9 ? 'meets' : 'falls short');
        });
        expect(dossier.responses.map(({ state }) => state).toSorted()).toEqual(record.loads.map(({ name }) => name));
        const chosen = dossier.options.find(({ id }) => id === dossier.chosen)!;
        expect(dossier.responses[0]!.state).toBe(chosen.worstState);
      }),
      { numRuns: 60 },
    );
  });

  it('is governed by the state of the lowest ceiling', () => {
    fc.assert(
      fc.property(problem, ({ loads, source, band }) => {
        fc.pre(band !== null);
        const record: DesignRecord = {
          ...base,
          source,
          requirement: { ...base.requirement, bandHz: band },
          loads: loads.map((termination, k) => ({ name: `state ${String(k)}`, termination })),
        };
        const { ceiling } = design(record);
        const each = loads.map(
          (termination) => design({ ...record, loads: [{ name: '', termination }] }).ceiling!.bestReflection,
        );
        expect(ceiling!.bestReflection).toBe(Math.max(...each));
        if (ceiling!.governs === 'load') {
          expect(each[Number(ceiling!.state.split(' ')[1])]).toBe(ceiling!.bestReflection);
        }
      }),
      { numRuns: 40 },
    );
  });
});
