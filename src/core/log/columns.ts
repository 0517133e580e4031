/**
 * The mapping of a log: what the document says of its columns, completed by what the preview has decided. Every
 * question that is still open is a problem that shows both readings of a cell.
 */
import type { LogText } from '../document/project.ts';
import { type Form, failed, openForm } from '../input/form.ts';
import type { Site } from '../input/site.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { figureColumn, signalColumn } from './figure-column.ts';
import type { Desk } from './find-column.ts';
import type { Mapping } from './mapping.ts';
import { type Preview, previewLog } from './preview.ts';
import { statedOf, zoneOfLog } from './stated.ts';
import { timeColumn } from './time-column.ts';

/** What is known of a log beside the document. */
export interface Beginning {
  /** The first bytes, 64 KiB or so. */
  readonly first: Uint8Array;
  /** Whether they are the whole log. */
  readonly complete: boolean;
  /** The last bytes, where they can be had: what stands there may settle a question. */
  readonly last?: Uint8Array;
}

const DELIMITERS: Readonly<Record<string, string>> = { ',': ',', ';': ';', '|': '|', '\t': '\t', tab: '\t' };

/** Looks at a log and reads its mapping. Problems: `log-empty`, and those of readMapping. */
export function mapLog(log: LogText, { first, complete, last }: Beginning, site: Site): Outcome<Mapping> {
  const form = openForm({ log });
  const written = form.word('log.delimiter');
  const delimiter = written === undefined ? undefined : DELIMITERS[written];
  if (written !== undefined && !delimiter) form.report('log-delimiter-unknown', 'log.delimiter', { written });
  if (form.problems.length > 0) return failed(form);
  const preview = previewLog(first, { complete, ...(last ? { last } : {}), ...(delimiter ? { delimiter } : {}) });
  return preview ? readMapping(log, preview, site) : fail('log-empty', 'log');
}

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
