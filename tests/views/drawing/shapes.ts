/** Shapes of every drawn element, as a result would give them. */
import type { DimensionRow, Heads, Shape, Value } from '../../../src/views/present/model.ts';

const inch = 0.0254;

export const shapeOf = (
  element: string,
  pipe: number,
  ratio: number,
  upstream = 0,
  downstream = 0,
  recovery = 6,
): Shape => ({
  element,
  pipe,
  bore: ratio * pipe,
  ratio,
  tappingUpstream: upstream,
  tappingDownstream: downstream,
  recovery_D: recovery,
});

/** An averaging pitot, which leaves its pipe open. */
export const barAt = (pipe: number, width = 0): Shape =>
  shapeOf('averaging-pitot.pipe', pipe, 1, width / 2, width / 2, 0);

/** One of each kind and variant with a bore at a pipe bore and a diameter ratio. */
export const shapesAt = (pipe: number, ratio: number): readonly Shape[] => [
  shapeOf('orifice-plate.flange', pipe, ratio, inch, inch),
  shapeOf('orifice-plate.D-D/2', pipe, ratio, pipe, pipe / 2),
  shapeOf('orifice-plate.corner', pipe, ratio),
  shapeOf('isa-1932-nozzle', pipe, ratio, 0, 0.15 * pipe),
  shapeOf('long-radius-nozzle', pipe, ratio, pipe, pipe / 2),
  shapeOf('venturi-nozzle', pipe, ratio, 0, 0.6041 * ratio * pipe, 8),
  shapeOf('venturi-tube.as-cast', pipe, ratio, pipe / 2, 1, 9),
  shapeOf('venturi-tube.machined', pipe, ratio, pipe / 2, 1, 9),
  shapeOf('venturi-tube.fabricated', pipe, ratio, pipe / 2, 1, 9),
];

const value = (si: number, unit: string): Value => ({
  number: String(si),
  unit,
  text: `${si}\u00a0${unit}`,
  plain: `${si} ${unit}`,
  si,
});

export const heads: Heads = {
  points: [
    { station: 'inlet', position_D: -3.25, total: 1.84, pressure: 1.62, computed: true },
    { station: 'tapping-upstream', position_D: -0.25, total: 1.84, pressure: 1.62, computed: true },
    { station: 'tapping-downstream', position_D: 0.25, total: 1.84, pressure: -0.98, computed: true },
    { station: 'recovered', position_D: 6, total: 0.22, pressure: 0, computed: true },
  ],
  tappingDrop: value(2.6, 'm'),
  loss: value(1.62, 'm'),
};

export const row = (id: string, text: string, nominal?: number): DimensionRow => ({
  id,
  label: id,
  text,
  cited: { clause: '', seen: 'memory', mark: '°' },
  ...(nominal === undefined ? {} : { nominal }),
});

export const pipeLabels = {
  title: 'Pipe with orifice plate',
  description: 'Section to scale',
  totalHead: 'total head',
  pressureHead: 'pressure head',
  tappings: 'across the tappings',
  loss: 'permanent loss',
  pipe: 'D 102.26 mm',
  bore: 'bore 62.48 mm',
  recovered: 'recovered by 6 D',
  legend: 'marked points are computed; the line between them is drawn',
  scale: 'bores and distances to scale; wall and flanges are not',
  pull: 'Diameter ratio',
  pullValue: 'ratio 0.611, bore 62.48 mm',
};

export const sectionLabels = {
  title: 'Dimensioned section',
  description: 'Orifice plate between flanges',
  flow: 'flow',
  scale: 'scale',
  edge: 'edge',
  pipe: '102.26',
  bore: '62.48 ± 0.03',
};
