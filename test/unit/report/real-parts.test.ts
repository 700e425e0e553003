import { beforeAll, describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import type { Dossier, Option } from '../../../src/dossier.ts';
import { readStockList } from '../../../src/parts/read-stock-list.ts';
import type { Build, DesignRecord } from '../../../src/record/design-record.ts';
import { opacityName, opacityStates } from '../../../src/report/pdf/opacity.ts';
import { report } from '../../../src/report/report.ts';
import { overlaps, readPdf } from './read-pdf.ts';
import { demo, dossierOf, fonts } from './records.ts';

/** A demo with some of what is asked of real parts put otherwise. */
const built = (
  name: Parameters<typeof demo>[0],
  change: (build: Build) => Partial<Build>,
  more: Partial<DesignRecord> = {},
): Dossier => {
  const record = demo(name);
  if (record.build === null) throw new Error('the demo asks for real parts');
  return design({ ...record, ...more, build: { ...record.build, ...change(record.build) } });
};

const stock = readStockList(
  [
    'name,kind,value,tolerance,Q,Q frequency,self-resonance,ESL,rated voltage,rated current',
    '"coil 47 nH, class 5",inductor,47 nH,5 %,48,150 MHz,1.6 GHz,,,0.7',
    '"coil 120 nH, class 5",inductor,120 nH,5 %,45,150 MHz,1.2 GHz,,,0.6',
    '"chip 8.2 pF, class C",capacitor,8.2 pF,0.25 pF,450,150 MHz,,0.4 nH,100,',
    '"chip 39 pF, class 2",capacitor,39 pF,2 %,350,150 MHz,,0.4 nH,100,',
  ].join('\n'),
  'drawer.csv',
);

const dossiers: Readonly<Record<string, Dossier>> = {
  'two parts': dossierOf('tide-gauge'),
  'no power stated': dossierOf('crystal-filter'),
  'a mismatched load': dossierOf('power-stage'),
  'real parts not asked for': dossierOf('tide-gauge', () => ({ build: null })),
  'no part': dossierOf('tide-gauge', ({ source, requirement }) => ({
    loads: [{ name: '', termination: source }],
    requirement: { ...requirement, blockDc: false },
  })),
  'pairs of parts': built(
    'tide-gauge',
    ({ inductor, capacitor }) => ({
      pairs: true,
      inductor: { ...inductor, origin: 'E6' },
      capacitor: { ...capacitor, origin: 'E6' },
    }),
    { requirement: { ...demo('tide-gauge').requirement, returnLossDb: 24 } },
  ),
  'a stock list': built(
    'tide-gauge',
    ({ inductor, capacitor }) => ({
      stock,
      vswr: 5,
      ratedWatts: 2,
      inductor: { ...inductor, origin: 'stock' },
      capacitor: { ...capacitor, origin: 'stock' },
    }),
    { requirement: { ...demo('tide-gauge').requirement, powerW: 0.2 } },
  ),
  'wound coils': built('tide-gauge', ({ inductor }) => ({ inductor: { ...inductor, origin: 'wound' } })),
  'exact values': built('tide-gauge', ({ inductor, capacitor }) => ({
    inductor: { ...inductor, origin: 'exact' },
    capacitor: { ...capacitor, origin: 'exact' },
  })),
  'neither band nor return loss': dossierOf('tide-gauge', ({ requirement }) => ({
    requirement: { ...requirement, bandHz: null, returnLossDb: null },
  })),
  'several load states, spread ends, a least yield': built(
    'tide-gauge',
    () => ({
      vswr: 10,
      leastYield: 0.9,
      sourceSpread: 0.05,
      loadSpread: 0.1,
      ratedVolts: 50,
      ratedAmps: 0.5,
      strayF: 1e-12,
      leadH: 0.5e-9,
      distribution: 'normal',
    }),
    {
      loads: [
        { name: 'free space', termination: { r: 9.4, x: -61, behaviour: 'series' } },
        { name: 'in hand', termination: { r: 12, x: -55, behaviour: 'series' } },
      ],
    },
  ),
  'every method': dossierOf('tide-gauge', ({ fit }) => ({ method: 'all', fit: { ...fit, elements: 2 } })),
};

const chosen = ({ options, chosen: id }: Dossier): Option & { readonly built: NonNullable<Option['built']> } => {
  const option = options.find((each) => each.id === id)!;
  if (option.built === null) throw new Error('no real parts');
  return option as never;
};

/** Words of a report, and those of its first page, with spaces alike. */
const texts = new Map<string, { readonly all: string; readonly first: string }>();
const flat = (text: string): string => text.replace(/\s+/gu, ' ');

describe('a report on real parts', { timeout: 30_000 }, () => {
  beforeAll(async () => {
    for (const [name, dossier] of Object.entries(dossiers)) {
      const { text, pages } = await readPdf(await report(dossier, { paper: 'a4', fonts }));
      texts.set(name, { all: flat(text), first: flat(pages[0]!.map((word) => word.text).join(' ')) });
    }
  }, 60_000);

  it.each(Object.entries(dossiers))('of %s fits its pages, A4 and Letter', async (_, dossier) => {
    for (const paper of ['a4', 'letter'] as const) {
      const bytes = await report(dossier, { paper, fonts });
      expect(bytes.length).toBeLessThan(400_000);
      const { pages, text } = await readPdf(bytes);
      expect(text).not.toMatch(/NaN|Infinity|undefined|null/u);
      expect(pages.flatMap(overlaps)).toEqual([]);
      const right = paper === 'a4' ? 595.28 : 612;
      for (const word of pages.flat()) expect(word.x + word.width).toBeLessThan(right - 42);
    }
  });

  it('puts figures of real parts beside those of exact values on the first page', () => {
    const option = chosen(dossiers['two parts']!);
    const { worstReturnLossDb, yield: found, efficiency, stress } = option.built;
    const { first } = texts.get('two parts')!;
    expect(first).toContain('C1 8.2 pF, L1 47 nH');
    expect(first).toContain(`${worstReturnLossDb.toFixed(2)} dB`);
    expect(first).toContain(`${option.worstReturnLossDb!.toFixed(2)} dB`);
    expect(first).toContain(`${(100 * found!.value).toFixed(1)} % (${(100 * found!.low).toFixed(1)} to`);
    expect(first).toContain(`efficiency ${(100 * efficiency).toFixed(1)} %`);
    expect(first).toContain(`${stress!.parts[1]!.voltsPeak.toFixed(1)} V peak across L1`);
  });

  it('gives every option the parts to order, and its return loss, yield and loss with them', () => {
    for (const name of ['two parts', 'a mismatched load', 'every method']) {
      const { all } = texts.get(name)!;
      for (const { built: real } of dossiers[name]!.options) {
        expect(all).toContain(`To order: ${real!.parts[0]!.designator} `);
        expect(all).toContain(`${real!.worstReturnLossDb.toFixed(2)} dB`);
        expect(all).toContain(`${real!.lossDb.toFixed(2)} dB`);
        if (real!.yield!.value < 1) expect(all).toContain(`${(100 * real!.yield!.value).toFixed(1)} %`);
      }
    }
  });

  it('lists parts to order, where their values come from and what rounding cost', () => {
    const { all } = texts.get('two parts')!;
    const { centring, sets } = chosen(dossiers['two parts']!).built;
    expect(all).toContain('C1 1, series capacitor 8.2 pF ±2 % series E24 300');
    expect(all).toContain('L1 2, shunt inductor 47 nH ±5 % series E24 50');
    expect(all).toContain(`costs ${centring.roundingDb.toFixed(2)} dB`);
    for (const db of [centring.idealDb, centring.realDb, centring.centredDb]) {
      expect(all).toContain(`${db.toFixed(2)} dB`);
    }
    expect(sets).toHaveLength(3);
    for (const { worstReturnLossDb, yield: found } of sets) {
      expect(all).toContain(`${worstReturnLossDb.toFixed(2)} dB ${(100 * found!.value).toFixed(1)} %`);
    }
    expect(all).toContain('1, taken');
  });

  it('draws the values to order: a drawing and a parts list must not disagree', () => {
    expect(texts.get('two parts')!.all).toContain('8.200 pF');
    expect(texts.get('real parts not asked for')!.all).not.toContain('8.200 pF');
  });

  it('tells the two of a pair apart and how they are joined', () => {
    const { parts } = chosen(dossiers['pairs of parts']!).built;
    expect(parts.some(({ pair }) => pair !== null)).toBe(true);
    const { all } = texts.get('pairs of parts')!;
    for (const { designator, pair } of parts)
      expect(all).toMatch(new RegExp(`${designator} .*${pair ?? 'alone'}`, 'u'));
  });

  it('names the line of the stock list and its rating under each part', () => {
    const { all } = texts.get('a stock list')!;
    expect(all).toContain('chip 8.2 pF, class C; rated 100 V peak, 2.00 W');
    expect(all).toContain('coil 47 nH, class 5; rated 700 mA RMS, 2.00 W');
    expect(all).toContain('stock list drawer.csv');
  });

  it('gives the spread of the return loss at the frequencies that the requirement names', () => {
    const { states } = chosen(dossiers['two parts']!).built.percentiles!;
    const { frequencyHz, nominalDb, curvesDb } = states[0]!;
    const at = frequencyHz.findIndex((hertz) => Math.abs(hertz - 150.5e6) < 1);
    const figures = [nominalDb, ...curvesDb].map((curve) => `${curve[at]!.toFixed(2)} dB`).join(' ');
    expect(texts.get('two parts')!.all).toContain(`Lower band edge 150.5 MHz ${figures}`);
  });

  it('states the yield with its interval, the corner, each part’s effect and what to tighten', () => {
    const { yield: found, corners, sensitivity, tighten } = chosen(dossiers['two parts']!).built;
    const { all } = texts.get('two parts')!;
    const percent = (fraction: number): string => `${(100 * fraction).toFixed(1)} %`;
    expect(all).toContain(
      `Of 1000 networks drawn, ${found!.passed} hold 14 dB: a yield of ${percent(found!.value)}; ` +
        `with 95 % confidence it lies between ${percent(found!.low)} and ${percent(found!.high)} (Clopper-Pearson).`,
    );
    expect(all).toContain(`falls to ${corners!.worstReturnLossDb.toFixed(2)} dB`);
    expect(all).toContain(corners!.words);
    const ranked = sensitivity.map(({ designator, atToleranceDb, yieldIfHalved }) => {
      const row = all.match(new RegExp(`${designator} [^ ]+ ..? ±. % [^ ]+ dB [^ ]+ dB (\\S+) dB (\\S+) %`, 'u'))!;
      expect(row.slice(1)).toEqual([atToleranceDb.toFixed(2), (100 * yieldIfHalved!).toFixed(1)]);
      return row.index!;
    });
    expect(ranked).toEqual(ranked.toSorted((a, b) => a - b));
    expect(all).toContain(tighten);
  });

  it('gives what each part bears, with the load mismatched too, and when it reaches its rating', () => {
    const { stress } = chosen(dossiers['a mismatched load']!).built;
    const { all } = texts.get('a mismatched load')!;
    expect(all).toContain(stress!.words);
    for (const { designator, voltsPeak, mismatched, limitW, limitBy } of stress!.parts) {
      const row = new RegExp(
        `${designator} ${voltsPeak.toPrecision(3)} V .* ${mismatched!.voltsPeak.toPrecision(3)} V .* ${limitW!.toPrecision(3)} W, by ${limitBy}`,
        'u',
      );
      expect(all).toMatch(row);
    }
    expect(all).toContain('Every part is rated 250 V peak, 3.00 A RMS.');
  });

  it.each([
    ['no power stated', 'Stress is not assessed: no power is stated.'],
    ['no power stated', 'not assessed: no power stated'],
    ['neither band nor return loss', 'Yield is not assessed: no return loss is required.'],
    ['neither band nor return loss', 'not assessed: no return loss required'],
    ['real parts not asked for', 'not asked for: every figure is that of exact, ideal parts'],
    ['real parts not asked for', 'Stress is not assessed: real parts were not asked for.'],
    ['no part', 'There is nothing whose value could vary.'],
    ['exact values', 'Values are exact.'],
    ['several load states, spread ends, a least yield', '±5.0 %, ±10.0 %'],
  ])('of %s says in words what there is none of (%#)', (name, words) => {
    expect(texts.get(name)!.all).toContain(words);
  });

  it('of exact values alone has no parts to order and no figures of real parts', () => {
    const { all } = texts.get('real parts not asked for')!;
    expect(all).not.toMatch(/Parts to order|To order|real parts,|Best sets/u);
  });

  it('tells what DC meets, and what the parts may do for a bias', () => {
    const { bias } = chosen(dossiers['two parts']!).built;
    expect(bias.length).toBeGreaterThan(0);
    for (const words of bias) expect(texts.get('two parts')!.all).toContain(words);
  });

  it('gives the winding of every coil that is to be wound', () => {
    const { coils } = chosen(dossiers['wound coils']!).built;
    const { all } = texts.get('wound coils')!;
    expect(all).toContain('Single-layer air coils, to be wound of 1.00 mm wire');
    for (const { designator, turns } of coils)
      expect(all).toMatch(new RegExp(`${designator} .* ${turns.toFixed(2)} `, 'u'));
  });

  it('leaves out coils that no one would wind in place of an inductor on sale', () => {
    // 3 nH is less than half a turn on a form of 6 mm; 4.3 µH takes 136 turns.
    for (const name of ['a mismatched load', 'no power stated']) {
      expect(texts.get(name)!.all).toContain('No inductor of this network suits a single-layer air coil');
    }
  });

  it('takes the half-power edges on the plot from the state that it names', () => {
    const dossier = dossiers['several load states, spread ends, a least yield']!;
    const { state } = dossier.responses[0]!;
    const { halfPower } = chosen(dossier).states.find(({ name }) => name === state)!;
    expect(texts.get('several load states, spread ends, a least yield')!.all).toContain(
      `half power, ${state}: ${halfPower.words}`,
    );
  });
});

describe('opacityStates(sheets)', () => {
  const sheet = (...fillOpacity: readonly (number | undefined)[]) => ({
    items: [
      {
        kind: 'figure' as const,
        x: 0,
        y: 0,
        scale: 1,
        figure: {
          width: 1,
          height: 1,
          title: '',
          description: '',
          shapes: fillOpacity.map((opacity) => ({
            kind: 'path' as const,
            d: 'M0 0Z',
            ...(opacity === undefined ? {} : { fillOpacity: opacity }),
          })),
        },
      },
    ],
    bookmarks: [],
  });

  it('has each opacity once, under the name that the page calls it by', () => {
    expect(opacityStates([sheet(0.2, undefined), sheet(0.5, 0.2)] as never)).toEqual({
      O20: { ca: 0.2 },
      O50: { ca: 0.5 },
    });
    expect(opacityName(0.2)).toBe('O20');
  });
});
