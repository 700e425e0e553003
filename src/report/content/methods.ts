import { formatFixed } from '../../quantity/format.ts';
import type { DesignRecord, Method } from '../../record/design-record.ts';

/** Methods as the report names them. */
export const methodNames: Readonly<Record<Method, string>> = {
  'two-element': 'At most two parts between any two terminations',
  'resistive-pair': 'Resistive pair by the single-parameter Q method',
  pi: 'Pi of a chosen Q',
  tee: 'T of a chosen Q',
  cascade: 'Sections in cascade',
  'equal-ripple': 'Equal ripple',
  fitted: 'Fitted over band and load states',
  all: 'Every method, of every size',
};

/** The method with what was asked of it. */
export function methodAsked(record: DesignRecord): string {
  const asked =
    record.method === 'all'
      ? [record.q === null ? '' : `Pi and T of Q ${chosenQ(record)}`, fit(record)]
      : [ofMethod(record)];
  const words = asked.filter((each) => each !== '').join('; ');
  return methodNames[record.method] + (words === '' ? '' : `: ${words}`);
}

function ofMethod(record: DesignRecord): string {
  const { method, sections, fit: asked } = record;
  if (method === 'pi' || method === 'tee')
    return record.q === null ? 'taken from the least that exists' : chosenQ(record);
  if (method === 'cascade' || method === 'equal-ripple') {
    return sections === 'auto' ? 'the smallest number of sections that holds the requirement' : sectionsWords(sections);
  }
  if (method !== 'fitted') return '';
  const elements = asked.elements === 'auto' ? '2 to 8 elements' : `${String(asked.elements)} elements`;
  return [elements, fit(record)].filter((each) => each !== '').join('; ');
}

const sectionsWords = (sections: number): string =>
  `${String(sections)} ${sections === 1 ? 'section' : 'sections'}, as asked`;

const chosenQ = ({ q }: DesignRecord): string => (q === null ? '' : formatFixed(q, 3).replace(/\.?0+$/u, ''));

const fit = ({ fit: { form, shuntInductor, seed } }: DesignRecord): string =>
  [
    form === 'any' ? '' : `fitted ones ${form} only`,
    shuntInductor ? '' : 'fitted ones without a shunt inductor',
    `seed ${String(seed)}`,
  ]
    .filter((each) => each !== '')
    .join('; ');
