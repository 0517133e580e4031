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
    return { [name]: value.si };
  };
  const differential = readDifferential(form);
  return { ...share('bore'), ...share('pipe'), ...share('density'), ...(differential ? { differential } : {}) };
}

function readDifferential(form: Form): DifferentialUncertainty | undefined {
  const field = 'uncertainty.differential';
  const text = at(form.group, field);
  if (typeof text !== 'string' || text.trim() === '') return undefined;
  const [, figure, of] = BASIS.exec(text.trim()) ?? [];
  const measures = figure === undefined ? (['share', 'pressure difference'] as const) : (['share'] as const);
  const read = readQuantity<'share' | 'pressure difference'>(figure ?? text, measures, field);
  if (!read.ok) {
    form.problems.push(...read.problems);
    return undefined;
  }
  const { value } = read;
  if (value.si < 0) return form.report('negative', field, { written: text });
  if (value.measure === 'pressure difference') return { of: 'pressure', value: value.si };
  if (of !== 'span' && of !== 'reading') return form.report('share-basis-missing', field, { written: text });
  return { of, share: value.si };
}
