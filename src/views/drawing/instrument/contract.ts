/** What a picture of an instrument is given, and the frame that all of them share. */
import type { ComponentType } from 'react';
import type { Drawn } from '../../present/readings-model.ts';

export type InstrumentProps = Drawn;

export type InstrumentDrawing = ComponentType<InstrumentProps>;

/** Size of every picture, in its own units. */
export const frame = { width: 420, height: 330 } as const;
/** Where the tappings stand. */
export const taps = { upstream: 120, downstream: 235 } as const;
