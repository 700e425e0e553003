import type { Ceiling, Dossier, Evidence, Option } from '../dossier.ts';
import type { builtEvidence } from '../evidence/built-evidence.ts';
import { evidence } from '../evidence/evidence.ts';
import { endsOver } from '../network/sweep.ts';
import type { DesignRecord, LoadState } from '../record/design-record.ts';
import { assumptionsOf } from './assumptions.ts';
import { cautionsOf } from './cautions.ts';
import { referencesOf } from './references.ts';

type BuiltEvidence = typeof builtEvidence;

/** What the grounds of a dossier are worked out from. */
export interface Subject {
  readonly record: DesignRecord;
  readonly chosen: Option | undefined;
  readonly states: readonly LoadState[];
  readonly ceiling: Ceiling | null;
  /** The least Q for which a Pi or T exists, of the kinds that are asked for. */
  readonly least: Parameters<typeof assumptionsOf>[1];
  /** null: exact parts alone. */
  readonly real: { readonly evidence: BuiltEvidence } | null;
}

/** What a dossier rests on, which no first result shows. */
export type Grounds = (subject: Subject) => Pick<Dossier, 'assumptions' | 'evidence' | 'cautions' | 'references'>;

export const groundsOf: Grounds = ({ record, chosen, states, ceiling, least, real }) => {
  const checked = chosen === undefined ? null : evidenceOf(record, chosen, states, real?.evidence ?? null);
  return {
    assumptions: assumptionsOf(record, least),
    evidence: checked,
    cautions: cautionsOf(record, chosen),
    references: referencesOf(record, {
      ceiling: ceiling !== null,
      pairChecked: checked?.routes.some(({ name }) => name === 'Q method') ?? false,
      real: (chosen?.built ?? null) !== null,
    }),
  };
};

function evidenceOf(
  { source, requirement }: DesignRecord,
  { arms, sections, method, built }: Option,
  states: readonly LoadState[],
  builtEvidence: BuiltEvidence | null,
): Evidence {
  const { frequencyHz: f0, bandHz, powerW } = requirement;
  const frequencies = [...new Set(bandHz === null ? [f0] : [f0, bandHz.low, bandHz.high])];
  const exact = evidence(
    states.map(({ termination }) => ({ arms, source, load: termination, f0 })),
    frequencies,
    sections <= 1 && method !== 'fitted' && method !== 'equal-ripple',
  );
  if (built === null || builtEvidence === null) return exact;
  const grid = Float64Array.from(frequencies);
  const ends = states.map(({ termination }) => endsOver(source, termination, f0, grid));
  const checks = [...exact.checks, ...builtEvidence(built.ladder, ends, f0, powerW ?? 1)];
  return { ...exact, checks, pass: checks.every(({ pass }) => pass) };
}
