import type { Dossier, Option } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { defaults } from '../record/fields.ts';

/** Decibels by which a figure may be above the ceiling by rounding. */
const slackDb = 1e-6;

/**
 * What lacks before a record can be issued, one sentence's worth each: every piece of evidence passes, every requirement
 * is met or its deviation written, and all three have signed. Empty: it may be issued.
 */
export function lacksForIssue(dossier: Dossier): readonly string[] {
  const { record, options, chosen } = dossier;
  const option = options.find(({ id }) => id === chosen);
  return [
    ...ofDocument(record),
    ...(option === undefined ? ['there is no network'] : ofNetwork(dossier, option)),
    ...ofSignatures(record),
  ];
}

function ofDocument({ identity, history }: DesignRecord): readonly string[] {
  const empty = (text: string): boolean => text.trim() === '';
  return [
    ...(empty(identity.title) ? ['the document has no title'] : []),
    ...(empty(identity.number) || identity.number.trim() === defaults.number ? ['the document has no number'] : []),
    ...(empty(identity.revision) ? ['the document has no revision'] : []),
    ...(empty(identity.date) ? ['the document has no date of issue'] : []),
    ...(history.length > 0 && empty(identity.change) ? ['what this revision changes, and why, is not said'] : []),
  ];
}

function ofNetwork({ record, evidence, ceiling }: Dossier, { checks, built, ceilingGapDb }: Option): readonly string[] {
  const deviates = (subject: string): boolean =>
    record.deviations.some((deviation) => deviation.subject === subject && deviation.reason.trim() !== '');
  return [
    ...(record.build !== null && built === null ? ['real parts are asked for and not yet worked out'] : []),
    ...(evidence === null ? ['nothing verifies the network'] : []),
    ...(evidence?.checks ?? []).filter(({ pass }) => !pass).map(({ subject }) => `the evidence on ${subject} fails`),
    ...(ceiling !== null && !ceiling.estimate && ceilingGapDb !== null && ceilingGapDb < -slackDb
      ? ['the worst return loss is above the ceiling, which no lossless network can be']
      : []),
    ...checks
      .filter(({ subject, verdict }) => verdict === 'falls short' && !deviates(subject))
      .map(({ subject, reason }) => `${subject} falls short and no deviation is written: ${reason}`),
  ];
}

function ofSignatures({ signOff }: DesignRecord): readonly string[] {
  return (['prepared', 'checked', 'approved'] as const).flatMap((who) => {
    const { name, date } = signOff[who];
    const lacking = [...(name.trim() === '' ? ['name'] : []), ...(date === '' ? ['date'] : [])];
    return lacking.length === 0 ? [] : [`“${who}” lacks its ${lacking.join(' and its ')}`];
  });
}
