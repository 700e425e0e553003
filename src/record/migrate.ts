import type { Problem } from '../quantity/problem.ts';
import type { DesignRecord } from './design-record.ts';

/** Number of the schema that is read and written. */
const current = 2;
const name = (version: number): string => `ferrule-record/${version}`;

/**
 * A record of an earlier schema as one of today's; anything else as it is, for the schema to judge. What an earlier
 * schema didn't have takes the value that changes nothing: exact parts, no deviation, a draft.
 *
 * @param value what was read from JSON
 */
export function migrate(value: unknown): unknown {
  if (!isObject(value) || value.schema !== name(1)) return value;
  const { identity, selection, signOff } = value;
  const from2: Pick<DesignRecord, 'build' | 'deviations' | 'history' | 'previous' | 'asBuilt'> = {
    build: null,
    deviations: [],
    history: [],
    previous: null,
    asBuilt: null,
  };
  return {
    ...from2,
    ...value,
    schema: name(current),
    identity: completed({ change: '' }, identity),
    selection: completed({ set: 1 }, selection),
    signOff: isObject(signOff)
      ? {
          state: 'draft',
          ...signOff,
          ...Object.fromEntries(
            (['prepared', 'checked', 'approved'] as const)
              .filter((who) => who in signOff)
              .map((who) => [who, completed({ remark: '' }, signOff[who])]),
          ),
        }
      : signOff,
  };
}

/** What to say of a record written by a later schema than this one; null where it isn't. */
export function neededVersion(value: unknown): Problem | null {
  if (!isObject(value) || typeof value.schema !== 'string') return null;
  const version = /^ferrule-record\/([1-9]\d{0,5})$/u.exec(value.schema)?.[1];
  if (version === undefined || Number(version) <= current) return null;
  return {
    field: 'schema',
    read: value.schema,
    why: `a later Ferrule wrote this record; this one reads up to ${name(current)}`,
    would: `open it with a Ferrule that reads ${value.schema}`,
  };
}

/** What is given stays as it is; what lacks is added. */
const completed = (lacking: object, given: unknown): unknown => (isObject(given) ? { ...lacking, ...given } : given);

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
