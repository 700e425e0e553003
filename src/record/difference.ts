import { buildChanges } from './build-changes.ts';
import { digestOf, sha256Of } from './canonical.ts';
import type { Change, ChangeGroup } from './change.ts';
import type { AsBuilt, Deviation, DesignRecord, EarlierRevision, Signature } from './design-record.ts';
import { listChanges } from './list-changes.ts';
import { loadChanges } from './load-changes.ts';
import {
  changeOf,
  choice,
  none,
  percent,
  plainNumber,
  quantity,
  same,
  span,
  text,
  yesNo,
  type Statement,
} from './statement.ts';
import { measuredStatement, terminationStatement } from './termination-statement.ts';

/**
 * What is otherwise in one record than in another, in the engineer's words and units, to the last digit and letter:
 * empty where nothing is.
 */
export function recordDifference(before: DesignRecord, after: DesignRecord): readonly Change[] {
  const of = (group: ChangeGroup, statements: (record: DesignRecord) => readonly Statement[]): readonly Change[] => {
    const now = statements(after);
    return statements(before)
      .map((statement, k) => changeOf(group, statement, now[k]!))
      .filter((change) => change !== null);
  };
  return [
    ...of('identity', identity),
    ...listChanges('identity', 'the revision history', before.history.map(revision), after.history.map(revision)),
    ...(same(before.previous, after.previous) ? [] : of('identity', ({ previous }) => [carriedAlong(previous)])),
    ...of('requirement', requirement),
    ...of('terminations', ({ aim, source }) => [choice('Aim', aim), terminationStatement('Source', source)]),
    ...loadChanges(before.loads, after.loads),
    ...of('method', method),
    ...of('parts', ({ partQ }) => [
      plainNumber('Q of inductors', partQ.inductor),
      plainNumber('Q of capacitors', partQ.capacitor),
    ]),
    ...buildChanges(before.build, after.build),
    ...of('selection', ({ selection }) => [
      { ...choice('Network chosen', selection.option ?? 'the proposed one'), value: selection.option },
      choice('Set of values', selection.set),
      text('Reason for the choice', selection.reason),
    ]),
    ...listChanges('deviations', 'the deviations', before.deviations.map(deviation), after.deviations.map(deviation)),
    ...listChanges('as built', 'the measurement', asBuilt(before.asBuilt), asBuilt(after.asBuilt)),
    ...of('sign-off', ({ signOff }) => [
      choice('State', signOff.state),
      ...signature('Prepared', signOff.prepared),
      ...signature('Checked', signOff.checked),
      ...signature('Approved', signOff.approved),
    ]),
  ];
}

const identity = ({ identity: of }: DesignRecord): readonly Statement[] => [
  text('Title', of.title),
  text('Document number', of.number),
  text('Revision', of.revision),
  text('Date of issue', of.date),
  text('Change ticket', of.ticket),
  text('Legal owner', of.owner),
  text('What the revision changes', of.change),
];

/** Worked out only where the two differ: digests take time. */
const carriedAlong = (previous: DesignRecord | null): Statement => ({
  what: 'Earlier revision carried along',
  value: previous,
  words:
    previous === null
      ? none
      : `${previous.identity.number}, revision ${previous.identity.revision}, SHA-256 ${digestOf(previous).slice(0, 16)}…`,
  exact: () => (previous === null ? none : `SHA-256 with its sign-off ${sha256Of(previous)}`),
});

const requirement = ({ requirement: of, build }: DesignRecord): readonly Statement[] => [
  quantity('Design frequency', of.frequencyHz, 'Hz'),
  span('Band', of.bandHz, 'Hz', 'the design frequency alone'),
  quantity('Return loss, at least', of.returnLossDb, 'dB', 'not required'),
  choice('DC between source and load', of.blockDc, of.blockDc ? 'must be blocked' : 'need not be blocked'),
  choice('Ends that carry DC', of.keepDc),
  span('Practicable inductance', of.inductorH, 'H'),
  span('Practicable capacitance', of.capacitorF, 'F'),
  quantity('Available power', of.powerW, 'W', 'not stated'),
  percent('Yield, at least', build?.leastYield ?? null, 'not required'),
];

const method = ({ method: of, sections, q, fit, sweepHz }: DesignRecord): readonly Statement[] => [
  choice('Method', of),
  choice('Sections', sections),
  plainNumber('Q of Pi and T', q, 'taken from the least that exists'),
  choice('Elements of fitted networks', fit.elements),
  choice('Form of fitted networks', fit.form),
  yesNo('Shunt inductors in fitted networks', fit.shuntInductor),
  plainNumber('Seed of the search', fit.seed),
  plainNumber('Search stopped after, pieces of work', fit.steps, 'not stopped'),
  span('Sweep shown', sweepHz, 'Hz', 'chosen from the band'),
];

const deviation = ({ subject, reason }: Deviation): Statement => text(`Deviation, ${subject}`, reason);

const revision = (of: EarlierRevision): Statement => ({
  what: `History, revision ${of.revision}`,
  value: of,
  words: [of.date, of.change, `SHA-256 ${of.digest.slice(0, 16)}…`].filter((each) => each !== '').join(', '),
  exact: () => [of.date, JSON.stringify(of.change), `SHA-256 ${of.digest}`].join(', '),
});

const asBuilt = (of: AsBuilt | null): readonly Statement[] =>
  of === null
    ? []
    : [
        measuredStatement('Measured on the board', of.measured),
        ...(of.state === null ? [] : [text('Load attached to the board', of.state)]),
        ...(of.note === '' ? [] : [text('Note on the measurement', of.note)]),
      ];

const signature = (who: string, of: Signature): readonly Statement[] => [
  text(`${who}, name`, of.name),
  text(`${who}, role`, of.role),
  text(`${who}, date`, of.date),
  text(`${who}, remark`, of.remark),
];
