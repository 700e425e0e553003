import type { StockList } from '../../src/parts/stock.ts';
import type { Fields } from '../../src/record/fields.ts';
import { nothingKept, type Kept } from '../../src/record/kept.ts';

const key = 'ferrule-kept';

/** What a sheet carries that its address doesn't, and the document that it belongs to. */
export interface KeptOf extends Kept {
  /** Document number, as typed: history and measurement are that document's alone, stock lists serve any. */
  readonly document: string;
}

export const noneKept: KeptOf = { ...nothingKept, document: '' };

/** What of it goes with these texts: an earlier revision of the document has a shorter history of its own. */
export const keptFor = (kept: KeptOf, { number = '', revision = '' }: Fields): KeptOf =>
  number === kept.document && kept.history.every((earlier) => earlier.revision.trim() !== revision.trim())
    ? kept
    : { ...nothingKept, stock: kept.stock, document: number };

/** With a stock list more, or a newer one of the same name. */
export const withStock = (kept: KeptOf, list: StockList): KeptOf => ({
  ...kept,
  stock: new Map([...kept.stock, [list.name, list]]),
});

/** What this tab was given before a reload or on another sheet. */
export function recallKept(): KeptOf {
  try {
    const text = sessionStorage.getItem(key);
    if (text === null) return noneKept;
    const { stock, ...rest } = JSON.parse(text) as Omit<KeptOf, 'stock'> & { stock: [string, StockList][] };
    return { ...rest, stock: new Map(stock) };
  } catch {
    return noneKept;
  }
}

/** Keeps it for as long as the tab is open; where there is no room, it lasts as long as the page. */
export function rememberKept(kept: KeptOf): void {
  try {
    sessionStorage.setItem(key, JSON.stringify({ ...kept, stock: [...kept.stock] }));
  } catch {
    sessionStorage.removeItem(key);
  }
}
