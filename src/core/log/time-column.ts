/** The column of time in the mapping of a log: its place, and its format as stated or as decided from the sample. */
import { at } from '../input/form.ts';
import { DAY, dateText } from './calendar.ts';
import { type Cell, type Decision, decideNumericTime } from './evidence.ts';
import type { FigureFormat } from './figure.ts';
import { type Desk, figuresOf, findColumn } from './find-column.ts';
import type { TimeColumn } from './mapping.ts';
import type { ColumnPreview } from './preview.ts';
import { TIME_FORMATS, type TimeFormat } from './time.ts';

const PLAIN: FigureFormat = { decimal: '.', group: '' };

/** `log.time` is the name or number of a column, or a group with `column`, `clock` and `format`. */
export function timeColumn(desk: Desk): TimeColumn | undefined {
  const { form } = desk;
  const written = at(form.group, 'log.time');
  if (written === undefined || written === null) return form.report('field-missing', 'log.time');
  const isGroup = typeof written === 'object';
  const found = findColumn(desk, isGroup ? 'log.time.column' : 'log.time');
  const clock =
    isGroup && at(form.group, 'log.time.clock') !== undefined ? findColumn(desk, 'log.time.clock') : undefined;
  const stated = isGroup ? form.choice('log.time.format', TIME_FORMATS) : undefined;
  const order = form.choice('log.dateOrder', ['day-first', 'month-first'] as const);
  if (found === undefined) return undefined;
  const isFigures = found.column.kind === 'figures';
  const figures = isFigures ? figuresOf(desk, found.column, 'log.time') : PLAIN;
  const format = figures && (stated ?? formatOf(desk, found.column, figures, order));
  if (figures === undefined || format === undefined) return undefined;
  return { at: found.at, ...(clock ? { clockAt: clock.at } : {}), format, figures };
}

/** The format that the sample shows, put in the order that is stated where both are possible. */
function formatOf(
  { form }: Desk,
  { name, kind, cells, time: seen }: ColumnPreview,
  figures: FigureFormat,
  order: 'day-first' | 'month-first' | undefined,
): TimeFormat | undefined {
  const field = 'log.time';
  const filled = cells.filter(({ text }) => text !== '');
  const decision = kind === 'figures' ? decideNumericTime(filled, figures) : seen;
  const [first] = filled;
  if (first === undefined) return form.report('log-empty', field, { column: name });
  if (decision === undefined) return form.report('log-time-unreadable', field, { column: name, written: first.text });
  if (decision.kind === 'decided') {
    const { value, evidence } = decision;
    const isOther = order !== undefined && value !== order && value.endsWith('-first');
    return isOther
      ? form.report('log-date-order-contradicted', 'log.dateOrder', { written: evidence?.text ?? '' })
      : value;
  }
  const asked = decision.readings.some(({ value }) => value.endsWith('-first'));
  if (asked && order !== undefined) return order;
  return asked ? askOrder(form, name, decision) : askSerial(form, name, decision.sample);
}

type Open = Extract<Decision<TimeFormat>, { kind: 'open' }>;

/** Both readings of a date, year first; one of them where the other is no date. */
function askOrder(form: Desk['form'], column: string, { sample, readings }: Open): undefined {
  const read = (order: TimeFormat) => readings.find(({ value }) => value === order)?.reads;
  const [dayFirst, monthFirst] = [read('day-first'), read('month-first')];
  const date = (seconds: number): string => dateText(Math.floor(seconds / DAY));
  return form.report('log-date-order-open', 'log.dateOrder', {
    column,
    written: sample.text,
    ...(dayFirst === undefined ? {} : { dayFirst: date(dayFirst) }),
    ...(monthFirst === undefined ? {} : { monthFirst: date(monthFirst) }),
  });
}

function askSerial(form: Desk['form'], column: string, sample: Cell): undefined {
  return form.report('log-time-open', 'log.time.format', { column, written: sample.text });
}
