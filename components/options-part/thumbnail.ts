import type { TemplateResult } from 'lit';
import type { Arm } from '../../src/network/arm.ts';
import { schematicThumbnail } from '../../src/figures/schematic-thumbnail.ts';
import { drawing } from '../base/drawing.ts';

const drawn = new Map<string, TemplateResult>();

/** The drawing of a network's shape. Values don't show in it, so that it is made once for each shape. */
export function thumbnail(arms: readonly Arm[]): TemplateResult {
  const shape = arms.map(({ arm, part }) => `${arm} ${part}`).join();
  const known = drawn.get(shape);
  if (known !== undefined) return known;
  const fresh = drawing(schematicThumbnail(arms));
  drawn.set(shape, fresh);
  return fresh;
}
