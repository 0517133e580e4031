/**
 * The printed sheets, one meter after the other, then the surveys, shown on screen as the paper they will be. While this is in the page,
 * nothing else is printed: everything that neither holds nor belongs to the sheets is left off the paper.
 */
import { type ComponentType, useMemo } from 'react';
import { presentLog } from '../present/log.ts';
import type { Conversion } from '../present/log-context.ts';
import {
  isAsked,
  type PresentedSheet,
  type Printing,
  presentSheets,
  type SizingSheet as Sizing,
} from '../present/sheet.ts';
import { presentSurveySheets } from '../present/survey-sheet.ts';
import { ChecksSheet } from './ChecksSheet.tsx';
import { DimensionsSheet } from './DimensionsSheet.tsx';
import { LogSheet } from './LogSheet.tsx';
import { type Paper, type Place, SheetContext, type SheetKind } from './paper.ts';
import { ReadingsSheet } from './ReadingsSheet.tsx';
import { RefusedSheet } from './RefusedSheet.tsx';
import styles from './Sheets.module.css';
import { SizingSheet } from './SizingSheet.tsx';
import { SurveyPages } from './SurveyPages.tsx';
import { WorkingSheet } from './WorkingSheet.tsx';

/** The sheets of a meter, in this order; the first stands on its own and carries the signatures. */
const kinds = {
  sizing: SizingSheet,
  readings: ReadingsSheet,
  checks: ChecksSheet,
  dimensions: DimensionsSheet,
  working: WorkingSheet,
} as const satisfies Partial<Record<SheetKind, ComponentType<{ readonly sheet: Sizing; readonly place: Place }>>>;

const usual: readonly SheetKind[] = ['log', 'survey', 'sizing', 'readings', 'checks', 'dimensions'];

interface SheetsProps extends Printing {
  readonly paper: Paper;
  /** Day of printing, ISO 8601; left blank where it is not given. */
  readonly printedOn?: string;
  /** Which sheets of each meter; all but the working unless given. */
  readonly include?: readonly SheetKind[];
  /** The log that was last converted, and the place of its meter in the list. */
  readonly log?: Conversion & { readonly index: number };
  /** Takes no room on screen and is there for the printer only. */
  readonly paperOnly?: boolean;
}

export function Sheets({ paper, printedOn = '', include = usual, paperOnly = false, log, ...printing }: SheetsProps) {
  const { project, results, only, stale = false } = printing;
  const sheets = useMemo(
    () => presentSheets({ project, results, stale, ...(only === undefined ? {} : { only }) }),
    [project, results, only, stale],
  );
  const surveys = useMemo(
    () => presentSurveySheets({ project, results, stale, ...(only === undefined ? {} : { only }) }),
    [project, results, only, stale],
  );
  const isLogAsked = log !== undefined && include.includes('log') && isAsked(only, 'meters', log.index);
  const summary = useMemo(() => (isLogAsked ? presentLog(log) : undefined), [isLogAsked, log]);
  const surroundings = useMemo(() => ({ paper, printedOn }), [paper, printedOn]);
  return (
    <SheetContext value={surroundings}>
      <div className={paperOnly ? `${styles.sheets} ${styles.paperOnly}` : styles.sheets} data-sheets={paper}>
        {sheets.map((sheet, index) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: two meters may carry the same tag
          <Meter key={index} sheet={sheet} include={include} />
        ))}
        {summary && <LogSheet log={summary} />}
        {surveys.map((sheet, index) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: two surveys may carry the same tag
          <SurveyPages key={index} sheet={sheet} include={include} />
        ))}
      </div>
    </SheetContext>
  );
}

function Meter({ sheet, include }: { readonly sheet: PresentedSheet; readonly include: readonly SheetKind[] }) {
  if (sheet.status === 'refused') return <RefusedSheet sheet={sheet} />;
  const chosen = (Object.keys(kinds) as (keyof typeof kinds)[]).filter(
    (kind) => include.includes(kind) && (kind !== 'readings' || sheet.readings !== undefined),
  );
  return chosen.map((kind, at) => {
    const One = kinds[kind];
    return <One key={kind} sheet={sheet} place={{ sheet: at + 1, of: chosen.length }} />;
  });
}
