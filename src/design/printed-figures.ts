import type { AsBuiltFigures, Built, Dossier, Option } from '../dossier.ts';

/** One figure of a report, under a name that the next version of it bears too. */
export interface PrintedFigure {
  readonly name: string;
  /** null: there is none. */
  readonly value: number | string | boolean | null;
  /** SI; dB for ratios; '' for what has none. */
  readonly unit: string;
}

/** Every figure of a report that a reviewer would challenge, in the order in which it is printed. */
export function printedFigures({ ceiling, options, chosen, evidence, asBuilt }: Dossier): readonly PrintedFigure[] {
  const network = options.find(({ id }) => id === chosen);
  return [
    figure('network chosen', chosen),
    figure('networks considered', options.length),
    ...(ceiling === null
      ? []
      : [
          figure('ceiling: verdict', ceiling.verdict),
          figure('ceiling: |Γ| at best', ceiling.bestReflection),
          figure('ceiling: resonators needed', ceiling.needs),
        ]),
    ...options.flatMap(ofOption),
    ...(network === undefined ? [] : valuesOf(network)),
    ...(evidence === null
      ? []
      : [
          figure('evidence: passes', evidence.pass),
          ...evidence.checks.map(({ subject, spread }) => figure(`evidence: spread of ${subject}`, spread)),
        ]),
    ...(asBuilt === null ? [] : ofBoard(asBuilt, network)),
  ];
}

const figure = (name: string, value: PrintedFigure['value'], unit = ''): PrintedFigure => ({ name, value, unit });

function ofOption(option: Option): readonly PrintedFigure[] {
  const { id, worstReturnLossDb, worstAtHz, transducerGain, seen, halfPower, lossDb, states, meets, built } = option;
  return [
    figure(`${id}: worst return loss`, worstReturnLossDb, 'dB'),
    figure(`${id}: frequency of the worst return loss`, worstAtHz, 'Hz'),
    ...(states.length < 2
      ? []
      : states.map((state) => figure(`${id}: worst return loss, ${state.name}`, state.worstReturnLossDb, 'dB'))),
    figure(`${id}: transducer gain`, transducerGain),
    figure(`${id}: resistance seen`, seen.r, 'Ω'),
    figure(`${id}: reactance seen`, seen.x, 'Ω'),
    figure(`${id}: lower half-power edge`, halfPower.lowHz, 'Hz'),
    figure(`${id}: upper half-power edge`, halfPower.highHz, 'Hz'),
    figure(`${id}: loss at the stated Q`, lossDb, 'dB'),
    figure(`${id}: meets everything`, meets),
    ...(built === null ? [] : ofBuilt(`${id}, real parts`, built)),
  ];
}

const valuesOf = ({ arms, designators }: Option): readonly PrintedFigure[] =>
  arms.map(({ part, value }, k) => figure(`chosen network: ${designators[k] ?? ''}`, value, unitOf(part)));

const unitOf = (part: 'inductor' | 'capacitor'): string => (part === 'inductor' ? 'H' : 'F');

function ofBuilt(of: string, built: Built): readonly PrintedFigure[] {
  const { parts, worstReturnLossDb, lossDb, yield: found, corners, stress } = built;
  return [
    ...parts.map(({ designator, part, value }) => figure(`${of}: ${designator}`, value, unitOf(part))),
    figure(`${of}: worst return loss`, worstReturnLossDb, 'dB'),
    figure(`${of}: loss`, lossDb, 'dB'),
    ...(found === null
      ? []
      : [
          figure(`${of}: yield`, found.value),
          figure(`${of}: yield, low end`, found.low),
          figure(`${of}: yield, high end`, found.high),
        ]),
    ...(corners === null ? [] : [figure(`${of}: worst return loss at the corners`, corners.worstReturnLossDb, 'dB')]),
    ...(stress === null ? [] : ofStress(of, stress)),
  ];
}

function ofStress(of: string, { parts, within }: NonNullable<Built['stress']>): readonly PrintedFigure[] {
  return [
    ...parts.flatMap(({ designator, voltsPeak, ampsRms, watts, mismatched, limitW }) => [
      figure(`${of}: peak voltage across ${designator}`, voltsPeak, 'V'),
      figure(`${of}: RMS current in ${designator}`, ampsRms, 'A'),
      figure(`${of}: heat in ${designator}`, watts, 'W'),
      ...(mismatched === null
        ? []
        : [
            figure(`${of}: peak voltage across ${designator}, load mismatched`, mismatched.voltsPeak, 'V'),
            figure(`${of}: RMS current in ${designator}, load mismatched`, mismatched.ampsRms, 'A'),
            figure(`${of}: heat in ${designator}, load mismatched`, mismatched.watts, 'W'),
          ]),
      figure(`${of}: power that ${designator} bears`, limitW, 'W'),
    ]),
    figure(`${of}: within its ratings`, within),
  ];
}

/** The one cause that explains the board best goes by its kind and its part, node or end. */
function ofBoard(board: AsBuiltFigures, network: Option | undefined): readonly PrintedFigure[] {
  const { attached, verdict, outside, distance, conclusion, explanations, remedy } = board;
  const of = 'finished board';
  const [best] = explanations;
  const partOf = (designator: string) => network?.arms[network.designators.indexOf(designator)]?.part ?? 'capacitor';
  return [
    figure(`${of}: verdict`, verdict.verdict),
    figure(`${of}: load state attached`, attached.state),
    figure(`${of}: worst return loss measured`, verdict.worstReturnLossDb, 'dB'),
    figure(`${of}: frequency of the worst return loss measured`, verdict.worstAtHz, 'Hz'),
    figure(`${of}: worst return loss predicted`, verdict.predictedDb, 'dB'),
    figure(`${of}: places outside the tolerance band`, outside?.length ?? null),
    figure(`${of}: RMS distance in Γ`, distance),
    figure(`${of}: conclusion`, conclusion),
    ...(best === undefined
      ? []
      : [
          figure(`${of}: nearest cause`, `${best.kind}, ${best.designator ?? String(best.at)}`),
          figure(`${of}: RMS distance it leaves`, best.residual),
        ]),
    ...(remedy === null
      ? []
      : [
          figure(`${of}: part to replace`, remedy.designator),
          figure(`${of}: value instead`, remedy.to, unitOf(partOf(remedy.designator))),
          figure(`${of}: worst return loss with it`, remedy.afterDb, 'dB'),
        ]),
  ];
}
