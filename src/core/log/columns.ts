/**
 * The mapping of a log: what the document says of its columns, completed by what the preview has decided. Every
 * question that is still open is a problem that shows both readings of a cell.
 */
import type { LogText } from '../document/v/1-log.ts';
import { type Form, failed, openForm } from '../input/form.ts';
import type { Site } from '../input/site.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { figureColumn, signalColumn } from './figure-column.ts';
import type { Desk } from './find-column.ts';
import type { Mapping } from './mapping.ts';
import type { Preview } from './preview.ts';
import { statedOf, zoneOfLog } from './stated.ts';
import { timeColumn } from './time-column.ts';

/** Reads the mapping of a log that has been looked at. Problems: those of the texts, and `log-…` for what the log does not settle. */
export function readMapping(log: LogText, preview: Preview, site: Site): Outcome<Mapping> {
  const form = openForm({ log });
  const desk: Desk = { form, preview };
  const time = timeColumn(desk);
  const signal = signalColumn(desk);
  const pressure = figureColumn(desk, 'log.pressure', ['absolute pressure', 'gauge pressure'], site.atmosphere);
  const temperature = figureColumn(desk, 'log.temperature', ['temperature']);
  const stated = statedOf(form, site);
  sharedColumns(form, [time?.at, time?.clockAt, signal?.at, pressure?.at, temperature?.at]);
  const zone = zoneOfLog(form);
  if (form.problems.length > 0 || !(time && signal && zone)) return failed(form);
  return ok({
    layout: {
      spelling: preview.spelling,
      delimiter: preview.delimiter.charCodeAt(0),
      fields: preview.columns.length,
      skip: preview.skip,
      header: preview.header,
    },
    time,
    zone: zone.zone,
    signal,
    ...(pressure ? { pressure } : {}),
    ...(temperature ? { temperature } : {}),
    ...stated,
    assumed: [...(zone.assumed ? (['zone'] as const) : []), ...stated.assumed],
  });
}

/** One column cannot hold two things. */
function sharedColumns(form: Form, places: readonly (number | undefined)[]): void {
  const names = ['log.time', 'log.time.clock', 'log.differential', 'log.pressure', 'log.temperature'];
  for (const [place, at] of places.entries())
    if (at !== undefined && places.indexOf(at) < place) form.report('log-column-shared', names[place] ?? 'log');
}
