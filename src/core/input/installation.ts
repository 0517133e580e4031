/** The straight pipe before and after the element, in pipe bores: written as '30 D' or as a length. */
import type { Length, Ratio } from '../quantity/kinds.ts';
import type { Form } from './form.ts';

export interface Installation {
  /** Code of the nearest fitting upstream; the element's table says whether it knows it. */
  readonly fitting?: string;
  readonly before?: number; // pipe bores
  readonly after?: number;
  /** Root-mean-square fluctuation of the differential over its mean. */
  readonly fluctuation?: Ratio;
}

/** Reads the group `installation`; a length is divided by the pipe's bore as measured. */
export function readInstallation(form: Form, pipe: Length | undefined): Installation {
  const bores = (name: 'before' | 'after') => {
    const length = form.quantity(`installation.${name}`, ['bores', 'length']);
    if (length === undefined) return {};
    if (length.si < 0) return form.report('negative', `installation.${name}`, { written: length.number }) ?? {};
    if (length.measure === 'bores') return { [name]: length.si };
    return pipe === undefined ? {} : { [name]: length.si / pipe };
  };
  const fitting = form.word('installation.fitting');
  const fluctuation = form.quantity('installation.fluctuation', ['share']);
  if (fluctuation && fluctuation.si < 0)
    form.report('negative', 'installation.fluctuation', { written: fluctuation.number });
  return {
    ...bores('before'),
    ...bores('after'),
    ...(fitting === undefined ? {} : { fitting }),
    ...(fluctuation === undefined ? {} : { fluctuation: fluctuation.si }),
  };
}
