import type { BrowserContext, Page } from 'playwright-core';
import { build } from 'vite';
import type { DraftKeeper } from '../../components/record-store/draft-keeper.ts';
import type { Carried } from '../../components/record-store/entry.ts';
import type { Keeping } from '../../components/record-store/keeping.ts';
import { root } from '../../src/cli/project.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import type { Fields } from '../../src/record/fields.ts';

/** What stands for a sheet in a page under test: a keeper, and all that it said. */
interface Sheet {
  readonly keeper: DraftKeeper;
  readonly said: Keeping[];
  readonly carried: Carried;
}

interface Scope {
  readonly kept: { readonly DraftKeeper: typeof DraftKeeper };
  sheet?: Sheet;
}

/** Gives every page of the context the keeper as a sheet would have it, from its next load on. */
export async function addKeeper(context: BrowserContext): Promise<void> {
  const built = await build({
    configFile: false,
    root,
    logLevel: 'error',
    build: {
      write: false,
      lib: { entry: `${root}components/record-store/draft-keeper.ts`, formats: ['iife'], name: 'kept' },
    },
  });
  const [bundle] = [built].flat();
  if (bundle === undefined || !('output' in bundle)) throw new Error('nothing was bundled');
  await context.addInitScript(`${bundle.output[0].code}\nglobalThis.kept = kept;`);
}

/** Opens the page anew with a keeper in it. */
export async function openSheet(page: Page, url: string): Promise<void> {
  await page.goto(url);
  await page.evaluate(() => {
    const scope = globalThis as unknown as Scope;
    const said: Keeping[] = [];
    scope.sheet = {
      keeper: new scope.kept.DraftKeeper('two-element', (keeping) => said.push(keeping)),
      said,
      carried: { kept: { stock: new Map(), history: [], previous: null, asBuilt: null }, attachments: new Map() },
    };
  });
}

/** Types, and waits until the keeper has said how it stands. */
export const type = (page: Page, fields: Fields): Promise<Keeping> =>
  page.evaluate(async (given) => {
    const { keeper, said, carried } = (globalThis as unknown as Required<Scope>).sheet;
    const before = said.length;
    keeper.keep(given, carried.kept, carried.attachments);
    while (said.length === before) await new Promise((done) => setTimeout(done, 20));
    return said.at(-1)!;
  }, fields);

/** Types one letter after the other, faster than they can be kept. */
export const typeAll = (page: Page, each: readonly Fields[]): Promise<void> =>
  page.evaluate((given) => {
    const { keeper, carried } = (globalThis as unknown as Required<Scope>).sheet;
    for (const fields of given) keeper.keep(fields, carried.kept, carried.attachments);
  }, each);

/** The last that the keeper said of this kind, once it did. */
export const heard = (page: Page, state: Keeping['state']): Promise<Keeping> =>
  page.evaluate(async (wanted) => {
    const { said } = (globalThis as unknown as Required<Scope>).sheet;
    while (said.at(-1)?.state !== wanted) await new Promise((done) => setTimeout(done, 20));
    return said.at(-1)!;
  }, state);

export const recall = (page: Page, address: Fields | null) =>
  page.evaluate(async (given) => {
    const found = await (globalThis as unknown as Required<Scope>).sheet.keeper.recall(given);
    return found === null
      ? null
      : { id: found.entry.id, own: found.own, fields: found.fields, history: found.kept.history };
  }, address);

export const open = (page: Page, id: string) =>
  page.evaluate(async (given) => {
    const found = await (globalThis as unknown as Required<Scope>).sheet.keeper.open(given);
    return found?.fields ?? null;
  }, id);

export const openOther = (page: Page) =>
  page.evaluate(async () => {
    const found = await (globalThis as unknown as Required<Scope>).sheet.keeper.openOther();
    return found?.fields ?? null;
  });

export const begin = (page: Page) =>
  page.evaluate(() => (globalThis as unknown as Required<Scope>).sheet.keeper.begin());

export const saveIssued = (page: Page, record: DesignRecord) =>
  page.evaluate((given) => (globalThis as unknown as Required<Scope>).sheet.keeper.saveIssued(given), record);
