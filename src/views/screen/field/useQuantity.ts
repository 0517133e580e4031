/**
 * One quantity between the document and its text box.
 *
 * Each keystroke is written: in the file's spelling where it can be read, as typed where it cannot, so nothing is lost.
 * The box keeps what was typed while the document holds what that typing wrote; leaving or entering it changes nothing.
 */
import { useState } from 'react';
import type { Display } from '../../../core/document/project.ts';
import { type Previous, readTyped } from '../../../core/quantity/typed.ts';
import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import { echoOf } from './echo.ts';
import { type QuantityKind, quantityKind } from './quantities.ts';
import { split } from './split.ts';

interface Draft {
  readonly typed: string;
  readonly written: string;
  /** The unit was changed and the number kept. */
  readonly relabelled?: boolean;
}

export interface QuantityBinding {
  readonly shown: string;
  readonly unit: Unit;
  /** What was read, where it is not spelled as it was typed; '' otherwise. */
  readonly echo: string;
  readonly kind: QuantityKind;
  type(typed: string): void;
  chooseUnit(symbol: string): void;
  /** Shows the number apart from its unit again. */
  settle(): void;
  /** As settle, but only where a unit alone was typed. */
  leave(): void;
}

const RELABELLED = 'number kept, only the unit changed: no factor leads from one to the other';

const hasDigit = (text: string): boolean => /\d/.test(text);

function firstUnit(kind: QuantityKind, display: Display): Unit {
  const unit = unitOf(kind.unit[display], kind.measures);
  if (unit === undefined) throw new Error(`expected a unit of ${kind.measures.join(', ')}, got ${kind.unit[display]}`);
  return unit;
}

export function useQuantity(
  path: string,
  text: string,
  display: Display,
  write: (text: string) => void,
): QuantityBinding {
  const kind = quantityKind(path);
  const [draft, setDraft] = useState<Draft>();
  const [chosen, setChosen] = useState<Unit>();
  const [last, setLast] = useState<Previous>(); // the last number that could be read: a unit alone converts it
  const live = draft !== undefined && draft.written === text ? draft : undefined;
  const parts = split(text, kind.measures);
  const unit = parts.unit ?? chosen ?? last?.unit ?? firstUnit(kind, display);
  const written: Previous = parts.unit === undefined ? (last ?? { unit }) : { number: parts.number, unit: parts.unit };

  const enter = (typed: string): void => {
    // A unit alone converts the number that stood there before its first letter was typed.
    const previous = live !== undefined && last !== undefined ? last : written;
    const from = { ...previous, unit: hasDigit(typed) ? unit : previous.unit };
    const read = typed.trim() === '' ? undefined : readTyped(typed, kind.measures, path, from);
    const file = read === undefined ? '' : read.ok ? read.value.file : typed;
    if (read?.ok && hasDigit(typed)) setLast(split(file, kind.measures) as Previous);
    else if (live === undefined) setLast(written);
    setDraft({ typed, written: file });
    write(file);
  };

  const chooseUnit = (symbol: string): void => {
    const next = unitOf(symbol, kind.measures);
    setChosen(next);
    setDraft(undefined);
    if (next === undefined || parts.unit === undefined) return;
    const converted = readTyped(symbol, kind.measures, path, written);
    // What no factor converts (gauge to absolute, mass to volume) keeps its number under the new unit, and says so.
    const file = converted.ok ? converted.value.file : `${parts.number} ${symbol}`;
    if (!converted.ok) setDraft({ typed: parts.number, written: file, relabelled: true });
    write(file);
  };

  return {
    shown: live?.typed ?? parts.number,
    unit,
    echo: live === undefined ? '' : live.relabelled ? RELABELLED : echoOf(live.typed, text, kind.measures),
    kind,
    type: enter,
    chooseUnit,
    settle: () => setDraft(undefined),
    leave: () => {
      if (live !== undefined && !hasDigit(live.typed)) setDraft(undefined);
    },
  };
}
