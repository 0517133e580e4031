/** Moves between fields. Each input of the form carries its path in data-field. */
const FIELDS = '[data-field]';
/** The buttons that say what is to be found. */
const UNKNOWNS = '[data-unknown]';

const all = (): HTMLElement[] => [...document.querySelectorAll<HTMLElement>(FIELDS)];

/** A field inside a fold cannot take the focus before the fold is open. */
function reveal(field: HTMLElement): void {
  for (let fold = field.closest('details'); fold !== null; fold = fold.parentElement?.closest('details') ?? null)
    fold.open = true;
}

function enter(field: HTMLElement): void {
  reveal(field);
  field.focus();
  field.scrollIntoView({ block: 'nearest' });
  if (field instanceof HTMLInputElement) field.select();
}

/** The field of a path, or the first below it: 'fluid' leads to its kind. False where the form has none. */
export function focusField(path: string): boolean {
  const field =
    all().find(({ dataset }) => dataset.field === path) ??
    all().find(({ dataset }) => dataset.field?.startsWith(`${path}.`)) ??
    (path === 'find' ? (document.querySelector<HTMLElement>(UNKNOWNS) ?? undefined) : undefined);
  if (field === undefined) return false;
  enter(field);
  return true;
}

/** The field of a path once the page has followed a change, so that the keys go on where the change led. */
export function focusFieldSoon(path: string): void {
  requestAnimationFrame(() => focusField(path));
}

/** The same for anything else on the page. */
export function focusSoon(selector: string): void {
  requestAnimationFrame(() => document.querySelector<HTMLElement>(selector)?.focus());
}

/** The field after the one at hand, in the order of the data; folded ones are passed over. */
export function focusNext(from: HTMLElement): void {
  const shown = all().filter((field) => field.checkVisibility());
  const next = shown[shown.indexOf(from) + 1];
  if (next !== undefined) enter(next);
}

export interface FieldEntry {
  readonly path: string;
  readonly label: string;
  readonly place: string;
}

/** Every field of the form, for the search. */
export const fieldEntries = (): readonly FieldEntry[] =>
  all().map((field) => ({
    path: field.dataset.field ?? '',
    label:
      field instanceof HTMLInputElement || field instanceof HTMLSelectElement
        ? (field.labels?.[0]?.textContent ?? field.ariaLabel ?? '')
        : '',
    place: field.closest('section')?.querySelector('h2')?.lastChild?.textContent ?? '',
  }));
