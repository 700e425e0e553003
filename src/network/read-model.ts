import { formatRead } from '../quantity/format.ts';
import { readQuantity } from '../quantity/read-quantity.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';
import type { Unit } from '../quantity/unit.ts';
import { circuitModels, type CircuitModel, type CircuitModelName } from './circuit-model.ts';

const isModel = (name: string): name is CircuitModelName => Object.hasOwn(circuitModels, name);

/** Whether a text is meant as a circuit model: a model's name, or a word with values after it. */
export function namesModel(text: string): boolean {
  const [name = '', ...cells] = text.trim().split(/\s+/u);
  return (
    isModel(name.toLowerCase()) ||
    (/^[a-z]+(-[a-z]+)*$/iu.test(name) && name.length > 1 && /^[.\d]/u.test(cells[0] ?? ''))
  );
}

/** Reads a circuit model in its plain form, name and values: `rc-series 12 8.2p`. */
export function readModel(text: string): Reading<CircuitModel> {
  const [name = '', ...cells] = text.trim().split(/\s+/u);
  const model = name.toLowerCase();
  if (!isModel(model)) {
    return refuse(
      `"${name}" is no circuit model`,
      `give one of ${Object.keys(circuitModels).join(', ')}, as in rc-series 12 8.2p`,
    );
  }
  const { symbols, units } = circuitModels[model];
  const would = `write it as ${model} ${symbols.join(' ')}`;
  if (cells.length !== symbols.length) {
    return refuse(`${String(cells.length)} values where ${String(symbols.length)} belong`, would);
  }
  const values: number[] = [];
  for (const [k, cell] of cells.entries()) {
    const unit = units[k]!;
    const reading = unit === '' ? plainNumber(cell) : readQuantity(cell, unit as Unit);
    if (!reading.ok) return refuse(`${symbols[k]!} "${cell}": ${reading.why}`, would);
    if (!(reading.value > 0)) return refuse(`${symbols[k]!} must be above zero`, would);
    values.push(reading.value);
  }
  return read({ model, values });
}

function plainNumber(text: string): Reading<number> {
  const value = Number(text.replace(',', '.'));
  return Number.isFinite(value) && text !== '' ? read(value) : refuse('not a number', 'give one');
}

/** "rc-series: R 12 Ω, C 8.2 pF" */
export function modelWords({ model, values }: CircuitModel): string {
  const { symbols, units } = circuitModels[model];
  const parts = values.map((value, k) => {
    const unit = units[k]!;
    return `${symbols[k]!} ${unit === '' ? String(value) : formatRead(value, unit as Unit)}`;
  });
  return `${model}: ${parts.join(', ')}`;
}
