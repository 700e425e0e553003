import type { StockList } from '../parts/stock.ts';
import type { AsBuilt, DesignRecord, EarlierRevision } from './design-record.ts';

/** What a record carries that no field's text can hold. */
export interface Kept {
  /** Stock lists at hand, by the name that stands for them in a field. */
  readonly stock: ReadonlyMap<string, StockList>;
  readonly history: readonly EarlierRevision[];
  readonly previous: DesignRecord | null;
  readonly asBuilt: AsBuilt | null;
}

export const nothingKept: Kept = { stock: new Map(), history: [], previous: null, asBuilt: null };

export const keptOf = ({ build, history, previous, asBuilt }: DesignRecord): Kept => ({
  stock: new Map(build === null || build.stock === null ? [] : [[build.stock.name, build.stock]]),
  history,
  previous,
  asBuilt,
});
