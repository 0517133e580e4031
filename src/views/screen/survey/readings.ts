/** The readings of the selected survey between the document and its boxes: one unit for all, each text as it is written. */
import { useState } from 'react';
import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import { type ReadingCell, readingAt } from '../../../state/readings.ts';
import type { PresentedSurvey } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import { useWorkbench, useWorkbenchStore } from '../binding.tsx';
import { quantityKind } from '../field/quantities.ts';
import { split } from '../field/split.ts';
import { convertedCell, fileCell, shownCell, type TableColumn } from '../fluid/rows.ts';

const column: TableColumn = { name: 'readings', label: words.reading, kind: quantityKind('readings') };

export interface Readings {
  readonly unit: Unit;
  readonly units: TableColumn['kind']['measures'];
  textAt(line: number, point: number): string;
  /** What a box shows of a text of the document, and what is written of what was typed. */
  shown(text: string): string;
  file(typed: string): string;
  write(cells: readonly ReadingCell[]): void;
  chooseUnit(symbol: string): void;
  clear(): void;
}

export function useReadings(survey: PresentedSurvey | undefined): Readings {
  const readings = useWorkbench((state) => state.project.traverses?.[state.traverseSelected]?.readings) as unknown;
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const store = useWorkbenchStore();
  const [chosen, setChosen] = useState<Unit>();
  const places = (survey?.lines ?? []).flatMap(({ points }) => points);
  const textAt = (line: number, point: number): string => readingAt(readings, line, point);
  const written = places
    .map(({ line, point }) => split(textAt(line, point), column.kind.measures).unit)
    .find((unit) => unit !== undefined);
  const unit = chosen ?? written ?? unitOf(column.kind.unit[display], column.kind.measures);
  if (unit === undefined) throw new Error(`expected a unit of readings, got ${column.kind.unit[display]}`);
  return {
    unit,
    units: column.kind.measures,
    textAt,
    shown: (text) => shownCell(text, column, unit),
    file: (typed) => fileCell(typed, column, unit),
    write: (cells) => store.getState().writeReadings(cells),
    chooseUnit: (symbol) => {
      const next = unitOf(symbol, column.kind.measures);
      if (next === undefined) return;
      setChosen(next);
      const cells = places
        .map(({ line, point }) => ({ line, point, text: convertedCell(textAt(line, point), column, next) }))
        .filter(({ text }) => text !== '');
      store.getState().writeReadings(cells);
    },
    clear: () => store.getState().writeAll([['readings', undefined]], 'traverses'),
  };
}
