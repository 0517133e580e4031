/** The sheets of one survey: the form to take along, and once something is read what it found. */
import type { ComponentType } from 'react';
import type { PresentedSurveySheet, RefusedSurveySheet, SurveySheet as Sheet } from '../present/survey-sheet.ts';
import { sheetOfSurvey as words } from '../words/survey-sheet.ts';
import { ChecksSheet } from './ChecksSheet.tsx';
import { FormSheet } from './FormSheet.tsx';
import { Points, PointsSheet } from './PointsSheet.tsx';
import type { Place, SheetKind } from './paper.ts';
import { RefusedSheet } from './RefusedSheet.tsx';
import { SurveySheet } from './SurveySheet.tsx';
import { WorkingSheet } from './WorkingSheet.tsx';

interface PageProps {
  readonly sheet: Sheet;
  readonly place: Place;
}

/** So many points stand on one page with the checks. */
const FEW = 26;

interface Props {
  readonly sheet: PresentedSurveySheet;
  readonly include: readonly SheetKind[];
}

export function SurveyPages({ sheet, include }: Props) {
  if (sheet.status === 'refused') return <Refused sheet={sheet} include={include} />;
  const chosen = pagesOf(sheet, include);
  const form = include.includes('form') || sheet.survey.measured === 0;
  return (
    <>
      {form && <FormSheet sheet={sheet} place={{ sheet: 1, of: 1 }} />}
      {chosen.map((One, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a page is its place among the sheets
        <One key={at} sheet={sheet} place={{ sheet: at + 1, of: chosen.length }} />
      ))}
    </>
  );
}

interface RefusedProps extends Pick<Props, 'include'> {
  readonly sheet: RefusedSurveySheet;
}

/** Why there is no result; the form for the field, alone where nothing but what is measured there is missing. */
function Refused({ sheet, include }: RefusedProps) {
  const { form } = sheet;
  const alone = form?.alone === true;
  return (
    <>
      {form && (alone || include.includes('form')) && <FormSheet sheet={form} place={{ sheet: 1, of: 1 }} />}
      {!alone && <RefusedSheet sheet={sheet} />}
    </>
  );
}

function pagesOf({ survey }: Sheet, include: readonly SheetKind[]): readonly ComponentType<PageProps>[] {
  if (survey.measured === 0) return [];
  const asked = (kind: SheetKind, ...pages: ComponentType<PageProps>[]) => (include.includes(kind) ? pages : []);
  const together = survey.points <= FEW && include.includes('survey') && include.includes('checks');
  return [
    ...asked('survey', SurveySheet),
    ...(together ? [PointsAndChecks] : [...asked('survey', PointsSheet), ...asked('checks', Checks)]),
    ...asked('working', Working),
  ];
}

const Checks = ({ sheet, place }: PageProps) => <ChecksSheet sheet={{ ...sheet, meter: sheet.survey }} place={place} />;

const PointsAndChecks = ({ sheet, place }: PageProps) => (
  <ChecksSheet sheet={{ ...sheet, meter: sheet.survey }} place={place} type={words.both}>
    <Points survey={sheet.survey} />
  </ChecksSheet>
);

const Working = ({ sheet, place }: PageProps) => (
  <WorkingSheet sheet={{ ...sheet, meter: sheet.survey }} place={place} />
);
