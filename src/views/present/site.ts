/** What the place of a site suggests for its two figures, and whether that is what the results stand on. */
import type { Project } from '../../core/document/project.ts';
import type { Results } from '../../core/result/record.ts';
import { siteWords } from '../words/site.ts';
import { asPrinted } from './base.ts';
import { show } from './numbers.ts';
import { unit } from './units.ts';

export interface Suggestion {
  readonly sentence: string;
  /** The figure as it is printed, and as it is written into the file where another one is stated. */
  readonly figure: string;
  readonly file: string;
  /** True while the figure is in use because nothing is stated. */
  readonly taken: boolean;
}

/** By the field that it is for. */
export type Suggestions = Readonly<Partial<Record<'site.atmosphere' | 'site.gravity', Suggestion>>>;

/** To the pascal, near enough, and to the last digit that the ground leaves standing. */
const DIGITS = { significant: 5 } as const;

/** Suggestions for the fields of the site; none where its place is not known or cannot be read. */
export function siteSuggestions({ site: written, display }: Project, { site }: Results): Suggestions {
  if (site === undefined) return {};
  const altitude = asPrinted(written?.altitude ?? '');
  const latitude = asPrinted(written?.latitude ?? '');
  const pressure = unit(display === 'US' ? 'psi(a)' : 'kPa(a)', 'absolute pressure');
  const { suggestedAtmosphere_Pa: p, suggestedGravity_m_s2: g } = site;
  const from = altitude === '' ? latitude : siteWords.and(latitude, altitude);
  return {
    ...(p === undefined
      ? {}
      : { 'site.atmosphere': suggestion(show(p, pressure, DIGITS), altitude, site.atmosphereFrom === 'place') }),
    ...(g === undefined
      ? {}
      : {
          'site.gravity': suggestion(show(g, unit('m/s2', 'acceleration'), DIGITS), from, site.gravityFrom === 'place'),
        }),
  };
}

function suggestion(
  { text, plain }: { readonly text: string; readonly plain: string },
  place: string,
  taken: boolean,
): Suggestion {
  const sentence = taken ? siteWords.ofPlace(text, place) : siteWords.suggested(text, place);
  return { sentence, figure: text, file: plain, taken };
}
