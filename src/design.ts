import type { Dossier } from './dossier.ts';
import { asBuiltOf } from './design/as-built.ts';
import { differenceFromBefore } from './design/difference-from-before.ts';
import { fittedNetworks, type FitControl } from './design/fitted.ts';
import { groundsOf } from './design/grounds.ts';
import { dossierSteps, finish, type ReviewMethods } from './design/pipeline.ts';
import { realSteps, type DesignStep } from './design/real-parts.ts';
import { builtEvidence } from './evidence/built-evidence.ts';
import type { DesignRecord } from './record/design-record.ts';
import { equalRipple } from './synthesis/equal-ripple.ts';

/**
 * The one pipeline, used by page, worker and command line alike: a checked record in, everything computed from it out.
 *
 * @throws InputError when a termination's data don't reach, or the record's selection names a network that isn't there
 */
export function design(record: DesignRecord): Dossier {
  return finish(designSteps(record, { stopped: false }));
}

/** The pipeline in pieces, for a caller that shows progress or stops it: what it has then is kept. */
export function designSteps(record: DesignRecord, control: FitControl): Generator<DesignStep, Dossier> {
  return dossierSteps(record, {
    equalRipple,
    grounds: groundsOf,
    search: (starts) => fittedNetworks(record, starts, control),
    real: { steps: realSteps, evidence: builtEvidence, control },
    review: reviewMethods(control),
  });
}

export const reviewMethods = (control: FitControl): ReviewMethods => ({
  asBuilt: asBuiltOf,
  difference: (dossier) => differenceFromBefore(dossier, (before) => designSteps(before, control)),
});
