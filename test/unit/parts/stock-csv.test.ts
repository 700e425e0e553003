import { describe, expect, it } from 'vitest';
import { readStockList } from '../../../src/parts/read-stock-list.ts';
import { stockCsv } from '../../../src/parts/stock-csv.ts';
import { stockTemplate } from '../../../src/parts/stock-template.ts';

describe('stockCsv(parts)', () => {
  it('reads back to the same parts', () => {
    const { parts } = readStockList(stockTemplate, 'template.csv');
    expect(readStockList(stockCsv(parts), 'again.csv').parts).toEqual(parts);
  });

  it('keeps every digit, and quotes what a comma, a mark or a comment sign would break', () => {
    const part = {
      name: '#7 "coil", 5 %',
      kind: 'inductor',
      value: 8.212345678e-8,
      tolerance: { kind: 'relative', value: 0.07 },
      q: 45.5,
      qAtHz: 151.25e6,
      selfResonanceHz: null,
      eslH: null,
      ratedVolts: null,
      ratedAmps: 0.65,
    } as const;
    const csv = stockCsv([part]);
    expect(csv.split('\r\n')[1]).toBe('inductor,"#7 ""coil"", 5 %",82.12345678 nH,7 %,45.5,151.25 MHz,,,,0.65');
    expect(readStockList(csv, 'again.csv').parts).toEqual([part]);
  });
});
