/** The picture of each instrument. */
import { Cell } from './Cell.tsx';
import type { InstrumentDrawing } from './contract.ts';
import { Gauges } from './Gauges.tsx';
import { Inclined } from './Inclined.tsx';
import { InvertedUTube } from './InvertedUTube.tsx';
import { Loop } from './Loop.tsx';
import { UTube } from './UTube.tsx';
import { Well } from './Well.tsx';

const drawings: Readonly<Record<string, InstrumentDrawing>> = {
  differential: Cell,
  'u-tube': UTube,
  'inverted-u-tube': InvertedUTube,
  well: Well,
  inclined: Inclined,
  gauges: Gauges,
  transmitter: Loop,
};

/** A kind that is not known is drawn as a cell: what the file says is shown beside it. */
export const drawingOf = (kind: string): InstrumentDrawing => drawings[kind] ?? Cell;
