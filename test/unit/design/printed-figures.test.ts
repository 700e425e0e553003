import { describe, expect, it } from 'vitest';
import { printedFigures } from '../../../src/design/printed-figures.ts';
import { design } from '../../../src/design.ts';
import { dossierOf, measuredStates } from '../report/records.ts';

const dossier = dossierOf('tide-gauge');
const figures = printedFigures(dossier);
const valueOf = (name: string) => figures.find((figure) => figure.name === name)?.value;

describe('printedFigures(dossier)', () => {
  it('names every figure once', () => {
    const names = printedFigures(design(measuredStates)).map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    expect(new Set(figures.map(({ name }) => name)).size).toBe(figures.length);
  });

  it('holds what the dossier holds, in SI units', () => {
    const option = dossier.options.find(({ id }) => id === dossier.chosen)!;
    expect(valueOf('network chosen')).toBe(option.id);
    expect(figures).toContainEqual({
      name: `${option.id}: worst return loss`,
      value: option.worstReturnLossDb,
      unit: 'dB',
    });
    expect(figures).toContainEqual({ name: 'chosen network: C1', value: option.arms[0]!.value, unit: 'F' });
    expect(valueOf('evidence: passes')).toBe(true);
  });

  it('has real parts with their yield and stress where they were asked for', () => {
    const { id, built } = dossier.options.find((option) => option.id === dossier.chosen)!;
    expect(valueOf(`${id}, real parts: worst return loss`)).toBe(built!.worstReturnLossDb);
    expect(valueOf(`${id}, real parts: yield`)).toBe(built!.yield!.value);
    expect(valueOf(`${id}, real parts: peak voltage across C1`)).toBe(built!.stress!.parts[0]!.voltsPeak);
    expect(
      printedFigures(dossierOf('tide-gauge', () => ({ build: null }))).some(({ name }) => /real/u.test(name)),
    ).toBe(false);
  });

  it('tells load states apart, and of no network nothing but what was sought', () => {
    const names = printedFigures(design(measuredStates)).map(({ name }) => name);
    expect(names.some((name) => name.endsWith(': worst return loss, in hand'))).toBe(true);
    expect(printedFigures({ ...dossier, options: [], chosen: null, evidence: null, ceiling: null })).toEqual([
      { name: 'network chosen', value: null, unit: '' },
      { name: 'networks considered', value: 0, unit: '' },
    ]);
  });
});
