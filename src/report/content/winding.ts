import type { Built, CoilWinding, Dossier } from '../../dossier.ts';
import { formatFixed, formatQuantity } from '../../quantity/format.ts';
import type { Build } from '../../record/design-record.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { chosenBuilt, whyNotBuilt } from './real-words.ts';

/** Every inductor as a single-layer air coil: to be wound, or in place of one that is bought where that makes sense. */
export function winding(dossier: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.winding, text: 'Winding' };
  const built = chosenBuilt(dossier);
  const { build } = dossier.record;
  if (built === null || build === null) return [heading, text(`Not assessed: ${whyNotBuilt(dossier)}.`)];
  if (built.coils.length === 0) return [heading, text('There is no inductor to be wound.')];
  const wound = build.inductor.origin === 'wound';
  const coils = wound ? built.coils : built.coils.filter(windable);
  if (coils.length === 0) {
    return [heading, text(`No inductor of this network suits a single-layer air coil of ${formWords(build)}.`)];
  }
  const intro = wound
    ? 'Single-layer air coils, to be wound'
    : `Where ${coils.length === 1 ? 'this inductor is' : 'these inductors are'} not bought: single-layer air coils`;
  return [
    heading,
    {
      ...text(`${intro} of ${formWords(build)}. Inductance by Wheeler, self-capacitance by Medhurst.`),
      keep: true,
    },
    {
      kind: 'table',
      columns: [
        { title: 'Coil', share: 24 },
        { title: 'Inductance', share: 48, align: 'end' },
        { title: 'Turns', share: 32, align: 'end' },
        { title: 'Diameter to mid-wire', share: 44, align: 'end' },
        { title: 'Length of winding', share: 42, align: 'end' },
        { title: 'Wire', share: 40, align: 'end' },
        { title: 'Length of\u00a0wire', share: 42, align: 'end' },
        { title: 'Own capacitance', share: 52, align: 'end' },
        { title: 'Self-resonance', share: 62, align: 'end' },
      ],
      rows: coils.map(row),
    },
    ...unlike(built, wound),
  ];
}

/** Turns that can be wound evenly by hand, on a coil long enough for Wheeler's formula. */
const windable = ({ turns, lengthM, diameterM }: CoilWinding): boolean =>
  turns >= 1 && turns <= 100 && lengthM > 0.4 * diameterM;

/** Inductors for which a coil makes no sense. */
function unlike({ coils }: Built, wound: boolean): readonly Block[] {
  const left = wound ? [] : coils.filter((coil) => !windable(coil));
  return left.length === 0
    ? []
    : [text(`A coil of this kind does not suit ${left.map(({ designator }) => designator).join(', ')}.`)];
}

function formWords({ winding: { wireM, formM, gapM } }: Build): string {
  const gap = gapM === 0 ? 'without a gap' : `with a gap of ${formatQuantity(gapM, 'm', 3)}`;
  return `${formatQuantity(wireM, 'm', 3)} wire on a form of ${formatQuantity(formM, 'm', 3)}, ${gap} between turns`;
}

function row(coil: CoilWinding): Row {
  const { designator, inductanceH, turns, diameterM, lengthM, wireM, wireLengthM } = coil;
  const { selfCapacitanceF, selfResonanceHz, caution } = coil;
  return {
    cells: [
      [{ spans: [{ text: designator, bold: true }] }],
      ...[
        formatQuantity(inductanceH, 'H'),
        formatFixed(turns, turns < 100 ? 2 : 0),
        formatQuantity(diameterM, 'm', 3),
        formatQuantity(lengthM, 'm', 3),
        formatQuantity(wireM, 'm', 3),
        formatQuantity(wireLengthM, 'm', 3),
        selfCapacitanceF === null ? 'not known' : formatQuantity(selfCapacitanceF, 'F', 3),
        selfResonanceHz === null ? 'not known' : formatQuantity(selfResonanceHz, 'Hz', 3),
      ].map((cell) => [plain(cell)]),
    ],
    ...(caution === '' ? {} : { below: { from: 1, paragraphs: [plain(caution, 'small')] } }),
  };
}
