/**
 * A drawing as plain shapes in a coordinate system whose y runs down, in points. Two writers turn it into SVG (page)
 * and PDF operators (report), so that both show the same drawing.
 */
export interface Figure {
  readonly width: number;
  readonly height: number;
  /** Short name, and the words that stand in for the picture. */
  readonly title: string;
  readonly description: string;
  readonly shapes: readonly Shape[];
}

/** What a line or text means; the writers hold the colours. Never told apart by tone alone: dash and label differ too. */
export type Tone = 'ink' | 'muted' | 'faint' | 'accent' | 'limit';

export type Shape =
  | {
      readonly kind: 'path';
      /** Absolute SVG path data with M, L, C, A and Z only. */
      readonly d: string;
      readonly stroke?: Tone;
      readonly width?: number;
      readonly dash?: readonly number[];
      readonly fill?: Tone;
      /** 0 to 1, of the fill. */
      readonly fillOpacity?: number;
    }
  | {
      readonly kind: 'text';
      readonly x: number;
      /** Baseline. */
      readonly y: number;
      readonly text: string;
      readonly size: number;
      readonly anchor: 'start' | 'middle' | 'end';
      readonly tone: Tone;
      readonly bold?: boolean;
    };
