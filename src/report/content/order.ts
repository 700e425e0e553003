import type { Built, BuiltPart, Centring, Dossier, Option } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { formatTolerance } from '../../parts/tolerance.ts';
import { formatFixed, formatQuantity } from '../../quantity/format.ts';
import type { Build, DesignRecord } from '../../record/design-record.ts';
import { plain, text, type Block, type Column, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { amps, orderedValue, percent, returnLossName, volts } from './real-words.ts';
import { valueOf } from './words.ts';

/** Real parts to order, where their values come from, and the other sets that were close. */
export function order({ record }: Dossier, option: Option, built: Built, build: Build): readonly Block[] {
  return [
    { kind: 'heading', text: 'Parts to order' },
    ...(built.parts.length === 0
      ? [text('None: the terminations are connected directly.')]
      : [...partsList(built, build), ...fromExact(record, option, built, build), ...bestSets(record, option, built)]),
  ];
}

function partsList({ parts: ordered }: Built, build: Build): readonly Block[] {
  const paired = ordered.some(({ pair }) => pair !== null);
  const resonant = ordered.some(({ selfResonanceHz }) => selfResonanceHz !== null);
  const ratings = new Set(ordered.map((part) => ratingWords(part, build)));
  const rated = ratings.size > 1;
  const columns: readonly Column[] = [
    { title: 'Designator', share: 50 },
    { title: 'Arm', share: 46 },
    { title: 'Kind', share: 46 },
    { title: 'Value', share: 48, align: 'end' },
    { title: 'Tolerance', share: 46, align: 'end' },
    { title: 'From', share: 72 },
    { title: 'Q at f₀', share: 34, align: 'end' },
    ...(resonant ? [{ title: 'Self-resonance', share: 66, align: 'end' } as const] : []),
    ...(paired ? [{ title: 'Joined', share: 46 } as const] : []),
  ];
  const table: Block = {
    kind: 'table',
    columns,
    together: true,
    rows: ordered.map((part) => ({
      cells: [
        [{ spans: [{ text: part.designator, bold: true }] }],
        ...[
          `${String(part.armIndex + 1)}, ${part.arm}`,
          part.part,
          orderedValue(part),
          formatTolerance(part.tolerance, part.part),
          originWords(part, build),
          formatFixed(part.q, part.q < 100 ? 1 : 0).replace(/\.0$/u, ''),
          ...(resonant ? [part.selfResonanceHz === null ? '–' : formatQuantity(part.selfResonanceHz, 'Hz', 3)] : []),
          ...(paired ? [part.pair ?? 'alone'] : []),
        ].map((cell) => [plain(cell)]),
      ],
      ...below(part, build, rated),
    })),
  };
  const [rating = ''] = ratings;
  return [table, ...(rated || rating === '' ? [] : [text(`Every part is rated ${rating}.`)])];
}

/** The line of the stock list, and a rating that isn't that of every part. */
function below(part: BuiltPart, build: Build, rated: boolean): Pick<Row, 'below'> {
  const words = [
    build[part.part].origin === 'stock' ? part.from : '',
    rated ? ratedWords(ratingWords(part, build)) : '',
  ].filter((each) => each !== '');
  return words.length === 0 ? {} : { below: { from: 1, paragraphs: [plain(words.join('; '), 'small')] } };
}

const ratedWords = (rating: string): string => (rating === '' ? 'rating not known' : `rated ${rating}`);

function originWords({ part, from }: BuiltPart, build: Build): string {
  const { origin } = build[part];
  if (origin === 'stock') return 'stock list';
  if (origin === 'wound') return `wound, part ${String(parts.winding)}`;
  return origin === 'exact' ? 'exact value' : `series ${from}`;
}

/** Its own rating, or what is stated for parts that have none; '' where neither is. */
function ratingWords({ ratedVolts, ratedAmps }: BuiltPart, build: Build): string {
  const [v, a] = [ratedVolts ?? build.ratedVolts, ratedAmps ?? build.ratedAmps];
  return [
    v === null ? '' : `${volts(v)} peak`,
    a === null ? '' : `${amps(a)} RMS`,
    build.ratedWatts === null ? '' : formatQuantity(build.ratedWatts, 'W', 3),
  ]
    .filter((rating) => rating !== '')
    .join(', ');
}

const bothExact = ({ inductor, capacitor }: Build): boolean =>
  inductor.origin === 'exact' && capacitor.origin === 'exact';

/** Each arm's value on the way from the equations to what is on sale, and what every step does to the return loss. */
function fromExact(record: DesignRecord, option: Option, built: Built, build: Build): readonly Block[] {
  const { centring, worstReturnLossDb } = built;
  const name = returnLossName(record);
  const exact = bothExact(build);
  const columns: readonly Column[] = [
    { title: 'Arm', share: 150 },
    { title: 'Exact', share: 60, align: 'end' },
    ...(exact
      ? []
      : [
          { title: 'Centred anew', share: 60, align: 'end' } as const,
          { title: 'To order', share: 110, align: 'end' } as const,
        ]),
  ];
  const arms = option.arms.map((arm, k): Row => {
    const centred = centring.values[k];
    return cells(option.designators[k] ?? '', [
      valueOf(arm),
      ...(exact ? [] : [centred === undefined ? '–' : valueOf({ ...arm, value: centred }), armOrdered(built, k)]),
    ]);
  });
  const ideal = cells(`${name}, ideal parts`, [returnLossWords(centring.idealDb), ...(exact ? [] : ['–', '–'])]);
  const real = cells(`${name}, with loss and strays`, [
    returnLossWords(centring.realDb),
    ...(exact ? [] : [returnLossWords(centring.centredDb), returnLossWords(worstReturnLossDb)]),
  ]);
  return [
    { kind: 'heading', text: exact ? 'What loss and strays cost' : 'From exact values to parts on sale' },
    { kind: 'table', columns, rows: [...arms, ideal, real] },
    ...(exact ? [] : [text(roundingWords(centring, worstReturnLossDb))]),
  ];
}

const cells = (name: string, values: readonly string[]): Row => ({
  cells: [[{ spans: [{ text: name, bold: true }] }], ...values.map((value) => [plain(value)])],
});

/** "8.2 pF", or of a pair "8.2 pF + 1 pF in parallel" */
export function armOrdered({ parts: ordered }: Built, armIndex: number): string {
  const its = ordered.filter((part) => part.armIndex === armIndex);
  const pair = its[0]?.pair ?? null;
  return `${its.map(orderedValue).join(' + ')}${pair === null ? '' : ` ${pair}`}`;
}

function roundingWords({ centredDb, roundingDb }: Centring, realDb: number): string {
  if (centredDb > 100)
    return `Rounding brings the return loss from ${returnLossWords(centredDb)} to ${returnLossWords(realDb)}.`;
  return roundingDb > 0.005
    ? `Rounding to parts on sale costs ${formatFixed(roundingDb, 2)} dB against values centred anew.`
    : 'Rounding to parts on sale costs nothing against values centred anew.';
}

/** The sets that come nearest, that which was taken marked. */
function bestSets(record: DesignRecord, { designators }: Option, { sets, set, searchWords }: Built): readonly Block[] {
  if (sets.length < 2) return [text(searchWords)];
  const withYield = sets.some(({ yield: found }) => found !== null);
  return [
    { kind: 'heading', text: 'Best sets of values' },
    { ...text(searchWords), keep: true },
    {
      kind: 'table',
      columns: [
        { title: 'Set', share: 40 },
        { title: 'Values', share: 260 },
        { title: returnLossName(record), share: 80, align: 'end' },
        ...(withYield ? [{ title: 'Yield', share: 100, align: 'end' } as const] : []),
      ],
      rows: sets.map((each, k) => ({
        cells: [
          [{ spans: [{ text: `${String(k + 1)}${k + 1 === set ? ', taken' : ''}`, bold: k + 1 === set }] }],
          [plain(each.words.map((words, arm) => `${designators[arm] ?? ''}\u00a0${words}`).join(', '))],
          [plain(returnLossWords(each.worstReturnLossDb))],
          ...(withYield ? [[plain(each.yield === null ? '–' : percent(each.yield.value))]] : []),
        ],
        marked: k + 1 === set,
      })),
    },
  ];
}
