import type { AsBuiltFigures } from './evidence/as-built-figures.ts';
import type { Evidence } from './evidence/evidence.ts';
import type { Change } from './record/change.ts';
import type { Corners, PartSensitivity, Percentiles, Yield } from './evidence/tolerance-figures.ts';
import type { Stress } from './evidence/stress-figures.ts';
import type { CoilWinding } from './parts/coil-winding.ts';
import type { Arm } from './network/arm.ts';
import type { RealLadder } from './network/real-arm.ts';
import type { Tolerance } from './parts/tolerance.ts';
import type { Span } from './quantity/span.ts';
import type { DesignRecord, Method, Required } from './record/design-record.ts';

export type { Corners, PartSensitivity, Percentiles, Yield } from './evidence/tolerance-figures.ts';
export type { PartStress, Stress, StressFigures, StressKind } from './evidence/stress-figures.ts';
export type { CoilWinding } from './parts/coil-winding.ts';
export type { AsBuiltFigures } from './evidence/as-built-figures.ts';
export type { Change } from './record/change.ts';
export type { Evidence, EvidenceCheck, Route } from './evidence/evidence.ts';

/**
 * The dossier: everything computed from one record, as plain data. Page, worker, command line and report read this and
 * compute nothing. SI units; no NaN, no Infinity: what doesn't exist is null.
 */
export interface Dossier {
  readonly schema: 'ferrule-dossier/1';
  /** Version of Ferrule that computed it. */
  readonly version: string;
  readonly record: DesignRecord;
  /** SHA-256 (FIPS 180-4) of the record's RFC 8785 form without its sign-off; 64 hex digits. */
  readonly digest: string;
  /** Numbered A1... in order. */
  readonly assumptions: readonly string[];
  readonly ceiling: Ceiling | null;
  /** Why there is no ceiling; '' when there is one. */
  readonly noCeiling: string;
  /** Every network that exists, in the order in which they are considered. */
  readonly options: readonly Option[];
  /** Forms without a network, with the inequality that fails. */
  readonly absent: readonly Absent[];
  /** The least that holds the requirement, or by how much all fall short, in a sentence. */
  readonly minimum: string;
  /** Cascade and equal ripple. */
  readonly sections: SectionTable | null;
  /** Id of the first option that meets everything; null when none does. */
  readonly proposed: string | null;
  /** Id of the option that the rest of the dossier is about; null when there is no option at all. */
  readonly chosen: string | null;
  /** Who chose: the engineer, the proposal, or (none meets everything) the one that comes nearest. */
  readonly chosenBy: 'engineer' | 'proposal' | 'nearest';
  /** The chosen option's sweep over the span shown, one a load state, the governing one first. */
  readonly responses: readonly Response[];
  readonly evidence: Evidence | null;
  /** The finished board against the prediction; null where none was measured, or not yet worked out. */
  readonly asBuilt: AsBuiltFigures | null;
  /** What is otherwise than in the revision before, in record, results and verdicts; null: there is none before. */
  readonly difference: readonly Change[] | null;
  /** Of the chosen network and of the work; safety included. */
  readonly cautions: readonly Caution[];
  /** Only those really applied, each with what it was applied for. */
  readonly references: readonly Reference[];
}

export interface Option {
  /** Stable name of the network for these terminations: selection in the record refers to it. */
  readonly id: string;
  /** For people: "Series L, shunt C". */
  readonly title: string;
  readonly arms: readonly Arm[];
  /** Reference designators in the order of `arms`: L1, C1, ... */
  readonly designators: readonly string[];
  /** Which method found it. */
  readonly method: Exclude<Method, 'all'>;
  /** Number of cascaded sections the network stands for; 0 when no part is needed, or where sections have no meaning. */
  readonly sections: number;
  readonly form: 'low-pass' | 'high-pass' | 'band-pass' | 'all-pass';
  /** Figures into every load state. Those of the option itself are of the state that governs: the worst one. */
  readonly states: readonly StateFigures[];
  /** Name of the state that governs; '' where there is only one without a name. */
  readonly worstState: string;
  /** Impedance seen from the source at the design frequency, Ω. */
  readonly seen: { readonly r: number; readonly x: number };
  /** At the design frequency, 0 to 1. */
  readonly transducerGain: number;
  /** |Γ| at the design frequency for the aim in force, 0 to 1. */
  readonly reflection: number;
  /** Least return loss over the required band, dB (at most 200); null without a band. */
  readonly worstReturnLossDb: number | null;
  /** Where it occurs, Hz. */
  readonly worstAtHz: number | null;
  readonly halfPower: HalfPower;
  /** Q of the section between its two resistances, halved; null when no part is needed. */
  readonly loadedQ: number | null;
  /** design frequency / loadedQ, Hz. */
  readonly bandwidthFromQHz: number | null;
  /** How the two half-power figures compare, in words. */
  readonly bandwidthNote: string;
  /** Transducer gain at 2f0 and 3f0 below that at f0, dB (negative: above; at most 200). */
  readonly harmonicDb: readonly Harmonic[];
  /** Power lost in the parts at the design frequency with the stated Q, dB. */
  readonly lossDb: number;
  /** How far the worst return loss stays below the ceiling, dB; null without a ceiling. */
  readonly ceilingGapDb: number | null;
  readonly dc: {
    /** A series capacitor stands between source and load. */
    readonly blocked: boolean;
    /** A shunt inductor shorts DC to ground as seen from that end. */
    readonly sourceShorted: boolean;
    readonly loadShorted: boolean;
    readonly words: string;
  };
  /** With real parts; null while they aren't asked for or not yet worked out. */
  readonly built: Built | null;
  /** Everything assessed is met: with real parts where there are such. */
  readonly meets: boolean;
  /** One per requirement assessed, met or not, in words. */
  readonly checks: readonly Check[];
  /** Reasons in words why it falls short; when it meets everything, what it meets. */
  readonly reasons: readonly string[];
  /** Rules of thumb that apply, with the reason. They never hide an option. */
  readonly cautions: readonly string[];
}

/** A network of real parts: what it is made of, and how it does. Units as in `Option`. */
export interface Built {
  /** To order, source side first; the parts of a pair follow each other. */
  readonly parts: readonly BuiltPart[];
  /** The same as arms, one for each of the option's, and the strays: what everything below is computed of. */
  readonly ladder: RealLadder;
  /** The sets of values that come nearest, the best first, at most three; empty where values are exact. */
  readonly sets: readonly ValueSet[];
  /** Which of them was taken, from 1; 0 where values are exact. */
  readonly set: number;
  /** How it was searched, and whether another set has the better yield, in a sentence or two. */
  readonly searchWords: string;
  /** Least return loss over band and states, dB; without a band at the design frequency. */
  readonly worstReturnLossDb: number;
  readonly worstAtHz: number;
  readonly worstState: string;
  /** What finite Q and strays leave of the exact values' return loss, and what values centred anew would. */
  readonly centring: Centring;
  /** At the design frequency, in the state that governs; −10·log10 of `efficiency`. */
  readonly lossDb: number;
  /** Power in the load over power into the network, 0 to 1. */
  readonly efficiency: number;
  /** null where no return loss is required. */
  readonly yield: Yield | null;
  /** Return loss that the given fractions of networks have or exceed, over the response's frequencies; null: not worked out. */
  readonly percentiles: Percentiles | null;
  readonly corners: Corners | null;
  /** Largest effect first. */
  readonly sensitivity: readonly PartSensitivity[];
  /** What to tighten first, and what it would buy; '' where nothing would. */
  readonly tighten: string;
  /** For the available power; null where no power is stated. */
  readonly stress: Stress | null;
  readonly bias: readonly string[];
  /** One for each inductor, as a coil to be wound. */
  readonly coils: readonly CoilWinding[];
}

export interface BuiltPart {
  readonly designator: string;
  /** Index of the arm in the option's `arms`. */
  readonly armIndex: number;
  readonly arm: 'series' | 'shunt';
  readonly part: 'inductor' | 'capacitor';
  /** H or F */
  readonly value: number;
  /** Name of the series ("E24"), of the stock line, "wound" or "exact". */
  readonly from: string;
  /** How it is joined to the other part of its pair; null: it stands alone. */
  readonly pair: 'in series' | 'in parallel' | null;
  readonly tolerance: Tolerance;
  readonly q: number;
  /** Hz; null: not stated. */
  readonly selfResonanceHz: number | null;
  readonly ratedVolts: number | null;
  readonly ratedAmps: number | null;
}

export interface ValueSet {
  /** One for each arm, H or F: of a pair, of both together. */
  readonly values: readonly number[];
  /** As to be ordered: "82 nH", "8.2 pF + 1 pF". */
  readonly words: readonly string[];
  readonly worstReturnLossDb: number;
  readonly yield: Yield | null;
}

/** Worst return loss over band and states, dB. */
export interface Centring {
  /** Exact values, ideal parts. */
  readonly idealDb: number;
  /** Exact values with loss and strays. */
  readonly realDb: number;
  /** Values found anew with loss and strays in, H or F, one for each arm. */
  readonly values: readonly number[];
  readonly centredDb: number;
  /** What rounding to parts on sale cost against these, dB. */
  readonly roundingDb: number;
}

/** Transducer gain at a harmonic below that at f0, dB; null: outside the terminations' data. */
export interface Harmonic {
  readonly order: 2 | 3;
  readonly attenuationDb: number | null;
}

/** One network into one load state; units and meaning as in `Option`. */
export interface StateFigures {
  readonly name: string;
  readonly seen: { readonly r: number; readonly x: number };
  readonly transducerGain: number;
  readonly reflection: number;
  readonly worstReturnLossDb: number | null;
  readonly worstAtHz: number | null;
  readonly halfPower: HalfPower;
  readonly harmonicDb: readonly Harmonic[];
}

/**
 * What no lossless network can beat over the band (Bode, Fano). Null where no end has reactance, or no band is given,
 * or the aim isn't a matter of power.
 */
export interface Ceiling {
  /** |Γ| with any number of sections. */
  readonly bestReflection: number;
  /** |Γ| with 1 to 6 resonators, the end's own counted. */
  readonly perResonators: readonly number[];
  readonly governs: 'load' | 'source';
  /** Load state that governs; '' where there is only one without a name. */
  readonly state: string;
  /** Q of the governing end at the band's centre, and the band's fractional width. */
  readonly q: number;
  readonly fractionalWidth: number;
  /** A fit stands for the termination, or it is held constant: the figure is an estimate. */
  readonly estimate: boolean;
  /** Least number of resonators (1 to 6) that can hold the return loss; null: none of them, or none required. */
  readonly needs: number | null;
  readonly verdict: 'out of reach' | 'within reach' | 'room to spare' | 'not assessed';
  /** The verdict in a sentence, with its numbers. */
  readonly words: string;
  /** What stands for the termination, and how well it fits. */
  readonly basis: string;
}

export interface Check {
  readonly subject: Required;
  readonly verdict: 'meets' | 'falls short';
  readonly reason: string;
}

export interface HalfPower {
  /** Edge 3.0103 dB below the peak nearest the design frequency, Hz; null: there is none on that side. */
  readonly lowHz: number | null;
  readonly highHz: number | null;
  /** highHz - lowHz; null when an edge is absent. */
  readonly bandwidthHz: number | null;
  /** Frequency of the peak, Hz, and the transducer gain there. */
  readonly peakHz: number;
  readonly peakGain: number;
  /** "102.2 MHz to 201.0 MHz", "none below: low-pass", ... */
  readonly words: string;
}

export interface Absent {
  readonly form: string;
  /** The inequality that fails, with its numbers. */
  readonly why: string;
}

export interface SectionTable {
  readonly rows: readonly SectionRow[];
  /** Smallest number of sections that holds the return loss; null when six don't. */
  readonly smallest: number | null;
  /** Best worst-case return loss of all rows, dB; null without a band. */
  readonly bestReturnLossDb: number | null;
  /** One sentence: which number holds it, or that none does and by how much. */
  readonly words: string;
}

export interface SectionRow {
  readonly id: string;
  readonly sections: number;
  readonly form: 'low-pass' | 'high-pass';
  /** Which end has the shunt arm. */
  readonly shuntAt: 'source' | 'load';
  readonly parts: number;
  /** Q of every section. */
  readonly sectionQ: number;
  readonly worstReturnLossDb: number | null;
  readonly halfPower: HalfPower;
  readonly holds: boolean | null;
}

/** Equal lengths; ascending frequency. Every figure finite: return loss and attenuation stop at 200 dB, VSWR at 1e6. */
export interface Response {
  /** Load state; '' where there is only one without a name. */
  readonly state: string;
  readonly spanHz: Span;
  readonly frequencyHz: readonly number[];
  readonly returnLossDb: readonly number[];
  readonly vswr: readonly number[];
  readonly mismatchLossDb: readonly number[];
  /** 10 log10 of transducer gain: 0 or negative. */
  readonly transducerGainDb: readonly number[];
  /** Reflection coefficient for the aim in force. */
  readonly gammaRe: readonly number[];
  readonly gammaIm: readonly number[];
}

export interface Caution {
  readonly kind: 'safety' | 'practice';
  readonly text: string;
}

export interface Reference {
  readonly title: string;
  readonly appliedFor: string;
}
