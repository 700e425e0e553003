import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import type { Fields } from '../../../src/record/fields.ts';
import { recordOf } from '../record-of.ts';

const of = (fields: Fields) => design(recordOf({ frequency: '100M', source: '50', ...fields }));

describe('dossier.minimum', () => {
  it('no part, where the ends hold the requirement as they are', () => {
    expect(of({ load: '50', band: '90M..110M', 'return-loss': '30' }).minimum).toBe('No part is needed.');
  });

  it('names the network of fewest parts of those that meet everything', () => {
    const dossier = of({ method: 'cascade', load: '500', band: '90M..110M', 'return-loss': '15' });
    const least = Math.min(...dossier.options.filter(({ meets }) => meets).map(({ arms }) => arms.length));
    const first = dossier.options.find(({ meets, arms }) => meets && arms.length === least)!;
    expect(dossier.minimum).toBe(
      `The smallest network that meets everything has ${String(least)} parts: ${first.title}.`,
    );
  });

  it('tells by how much the best falls short', () => {
    const { options, minimum } = of({ load: '500', band: '90M..110M', 'return-loss': '40' });
    const best = Math.max(...options.map(({ worstReturnLossDb }) => worstReturnLossDb!));
    expect(minimum).toBe(
      `No network holds 40.00 dB over the band: the best reaches ${best.toFixed(2)} dB, ${(40 - best).toFixed(2)} dB short.`,
    );
  });

  it('tells apart a return loss that is held and another requirement that is not', () => {
    const { minimum } = of({ load: '500', band: '99M..101M', 'return-loss': '10', inductors: '1u..2u' });
    expect(minimum).toMatch(/^No network meets everything, though the best holds \d+\.\d\d dB over the band\.$/u);
  });

  it('says that there is no network where Q is below the least', () => {
    const dossier = of({ method: 'pi', load: '1k', q: '2' });
    expect(dossier.minimum).toBe('No network was found.');
    expect(dossier.options).toEqual([]);
    expect(dossier.absent[0]!.why).toMatch(/needs Q ≥ .* = 4\.359/u);
    expect([dossier.chosen, dossier.proposed, dossier.evidence, dossier.responses]).toEqual([null, null, null, []]);
  });
});

describe("design(record) with method 'all'", () => {
  // The order of methods is looked at here, not the fits: they are stopped early.
  const record = recordOf({
    method: 'all',
    frequency: '100M',
    source: '50',
    load: '200',
    band: '90M..110M',
    'return-loss': '25',
  });
  const dossier = design({ ...record, fit: { ...record.fit, steps: 2 } });

  it('lists every method, fewest parts first, and proposes the first that meets everything', () => {
    const sizes = dossier.options.map(({ arms }) => arms.length);
    expect(sizes).toEqual(sizes.toSorted((a, b) => a - b));
    const listed = new Set(dossier.options.map(({ method }) => method));
    for (const method of ['resistive-pair', 'pi', 'tee', 'cascade', 'equal-ripple', 'fitted'] as const) {
      expect(listed).toContain(method);
    }
    const meeting = dossier.options.filter(({ meets }) => meets);
    expect(dossier.proposed).toBe(meeting[0]!.id);
    expect(dossier.minimum).toContain(`has ${String(meeting[0]!.arms.length)} parts`);
    expect(new Set(dossier.options.map(({ id }) => id)).size).toBe(dossier.options.length);
  });
});
