import { describe, expect, it } from 'vitest';
import { alongWith } from '../../../../components/ferrule-sheet/along-with.ts';
import { groundsOf } from '../../../../src/design/grounds.ts';
import { designAtOnce } from '../../../../src/design/pipeline.ts';
import { recordOf } from '../../record-of.ts';

const dossier = designAtOnce(recordOf({ frequency: '10M', source: '50', load: '200' }), groundsOf);
const other = dossier.options.find(({ id }) => id !== dossier.chosen)!.id;

describe('alongWith(change, dossier)', () => {
  it('lets a search go to its end when another is meant', () => {
    expect(alongWith({ name: 'band', value: '' }, dossier)).toEqual({ steps: '' });
    expect(alongWith({ name: 'title', value: 'x' }, dossier)).toEqual({});
  });

  it('chooses the network whose set of values is taken', () => {
    expect(alongWith({ name: 'set', value: '2' }, dossier)).toEqual({ choice: dossier.chosen });
  });

  it('goes back to the best set with another network', () => {
    expect(alongWith({ name: 'choice', value: other }, dossier)).toEqual({ set: '1' });
    expect(alongWith({ name: 'choice', value: dossier.chosen! }, dossier)).toEqual({});
  });
});
