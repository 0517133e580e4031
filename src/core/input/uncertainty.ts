/** The uncertainties a user states: expanded, relative, at 95 %. The differential's says of what it is a share. */
import type { PressureDifference, Ratio } from '../quantity/kinds.ts';
import { readQuantity } from '../quantity/text.ts';
import { at, type Form } from './form.ts';

export type DifferentialUncertainty =
  | { readonly of: 'span' | 'reading'; readonly share: Ratio }
  | { readonly of: 'pressure'; readonly value: PressureDifference };

export interface StatedUncertainty {
  readonly bore?: Ratio;
  readonly pipe?: Ratio;
  readonly density?: Ratio;
  readonly differential?: DifferentialUncertainty;
}

const BASIS = /^(.*?)\s+of\s+(span|reading)$/;

/** Reads the group `uncertainty`. Problem share-basis-missing: '0.1 %' without `of span` or `of reading`. */
export function readUncertainty(form: Form): StatedUncertainty {
  const share = (name: 'bore' | 'pipe' | 'density') => {
    const value = form.quantity(`uncertainty.${name}`, ['share']);
    if (value === undefined) return {};
    if (value.si < 0) return form.report('negative', `uncertainty.${name}`, { written: `${value.number} %` }) ?? {};
    return { [name]: value.si as Ratio };
  };
  const differential = readDifferential(form);
  return { ...share('bore'), ...share('pipe'), ...share('density'), ...(differential ? { differential } : {}) };
}

function readDifferential(form: Form): DifferentialUncertainty | undefined {
  const field = 'uncertainty.differential';
  const text = at(form.group, field);
  if (typeof text !== 'string' || text.trim() === '') return undefined;
  const [, figure, of] = BASIS.exec(text.trim()) ?? [];
  const read = readQuantity(figure ?? text, figure === undefined ? ['share', 'pressure difference'] : ['share'], field);
  if (!read.ok) {
    form.problems.push(...read.problems);
    return undefined;
  }
  if (read.value.si < 0) return form.report('negative', field, { written: text });
  if (read.value.unit.measure === 'pressure difference')
    return { of: 'pressure', value: read.value.si as PressureDifference };
  if (of !== 'span' && of !== 'reading') return form.report('share-basis-missing', field, { written: text });
  return { of, share: read.value.si as Ratio };
}
