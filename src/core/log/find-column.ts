/** Finds the columns that the document names in what the preview saw, and the decimal mark of their figures. */
import { at, type Form } from '../input/form.ts';
import type { FigureFormat } from './figure.ts';
import type { ColumnPreview, Preview } from './preview.ts';

/** What is at hand while the columns are found. */
export interface Desk {
  readonly form: Form;
  readonly preview: Preview;
}

/** The decimal mark of a column: that of the column, that of the log, or what the preview has decided. */
export function figuresOf({ form }: Desk, { name, figures }: ColumnPreview, path: string): FigureFormat | undefined {
  const stated = statedMark(form, `${path}.decimal`) ?? statedMark(form, 'log.decimal');
  if (stated !== undefined) return { decimal: stated, group: stated === '.' ? ',' : '.' };
  if (figures.kind === 'decided') return figures.value;
  const [one, other] = figures.readings;
  return form.report('log-decimal-open', 'log.decimal', {
    column: name,
    written: figures.sample.text,
    ...(one ? { one: one.reads, oneMark: one.value.decimal } : {}),
    ...(other ? { other: other.reads, otherMark: other.value.decimal } : {}),
  });
}

/** The decimal mark that a field states. */
function statedMark(form: Form, field: string): '.' | ',' | undefined {
  const written = form.word(field);
  if (written === undefined || written === '.' || written === ',') return written;
  return form.report('log-decimal-unknown', field, { written });
}

/** The column that a field names: by its name in the header, or by its number. */
export function findColumn(
  { form, preview }: Desk,
  field: string,
): { readonly at: number; readonly column: ColumnPreview } | undefined {
  const found = at(form.group, field);
  const written = typeof found === 'number' || (typeof found === 'string' && found.trim() !== '') ? found : undefined;
  if (written === undefined) return form.report('field-missing', field);
  const { columns } = preview;
  const choices = columns.map(({ name }) => name).join(', ');
  const places = placesOf(columns, written);
  const [place] = places;
  if (place === undefined) return form.report('log-column-missing', field, { written: String(written), choices });
  if (places.length > 1) return form.report('log-column-twice', field, { written: String(written) });
  return { at: place, column: columns[place] as ColumnPreview };
}

/** Places of the columns of a name: spelled alike, else alike but for case and space; or the place of a number. */
function placesOf(columns: readonly ColumnPreview[], written: string | number): readonly number[] {
  if (typeof written === 'number') return columns[written - 1] ? [written - 1] : [];
  const plain = (name: string): string => name.normalize('NFKC').toLowerCase().replaceAll(/\s+/g, ' ').trim();
  const exact = columns.flatMap(({ name }, at) => (name === written.trim() ? [at] : []));
  return exact.length > 0 ? exact : columns.flatMap(({ name }, at) => (plain(name) === plain(written) ? [at] : []));
}
