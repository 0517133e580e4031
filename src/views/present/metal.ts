/** Pipe and element: as measured, at the line temperature, and what stands around them. */
import { MEASURED_AT } from '../../core/document/defaults.ts';
import type { Solved } from '../../core/result/record.ts';
import { openingWord } from '../words/elements.ts';
import { materialLabel } from '../words/materials.ts';
import { measuredAt, metalLabels, noGrowth, withMaterial, withSize } from '../words/rows.ts';
import { figuresOf } from './answer.ts';
import { cited } from './cited.ts';
import { type Context, maximumOf } from './context.ts';
import type { Row, Value } from './model.ts';

export function pipeRows(at: Context, result: Solved): readonly Row[] {
  const { pipe, installation } = at.meter;
  const bore = at.given(pipe?.bore, ['length'], result.pipeAsMeasured_m, 'bore');
  return [
    measured(at, 'pipe-as-measured', withSize(metalLabels.pipe, pipe?.size), bore, pipe),
    atLine(at, result, 'pipe-bore', 'D', metalLabels.pipeAtLine, result.pipe_m),
    ...optional('pipe-roughness', metalLabels.roughness, 'Ra', at.stated(pipe?.roughness, ['length'], 'roughness')),
    ...optional('before', metalLabels.before, undefined, straight(at, installation?.before)),
    ...optional('after', metalLabels.after, undefined, straight(at, installation?.after)),
  ];
}

export function metalRows(at: Context, result: Solved): readonly Row[] {
  const { element } = at.meter;
  const opening = openingWord(result.element);
  const ratio = maximumOf(result).working.find(({ id }) => id === 'diameter-ratio');
  return [
    measured(at, 'bore-as-measured', metalLabels.opening(opening), figuresOf(at, result).bore, element),
    atLine(at, result, 'element-bore', 'd', metalLabels.atLine(opening), result.bore_m),
    {
      id: 'diameter-ratio',
      label: metalLabels.ratio,
      symbol: 'β',
      value: at.value(result.diameterRatio, 'ratio'),
      ...(ratio === undefined ? {} : { cited: cited(ratio.source), working: ratio.id }),
    },
    ...optional('plate-thickness', metalLabels.plate, 'E', at.stated(element?.plateThickness, ['length'], 'length')),
    ...optional('plate-thickness-edge', metalLabels.edge, 'e', at.stated(element?.edgeThickness, ['length'], 'length')),
  ];
}

interface Metal {
  readonly material?: string;
  readonly measuredAt?: string;
}

function measured(at: Context, id: string, label: string, value: Value, metal: Metal | undefined): Row {
  const { material, measuredAt: written } = metal ?? {};
  const temperature =
    at.stated(written, ['temperature'], 'temperature')?.text ?? at.print.limit(MEASURED_AT, 'temperature');
  return {
    id,
    label: withMaterial(label, material === undefined ? undefined : materialLabel(material)),
    value,
    note: material === undefined ? noGrowth : measuredAt(temperature),
  };
}

function atLine(at: Context, result: Solved, id: string, symbol: string, label: string, si: number): Row {
  const line = result.working.find((one) => one.id === id);
  const row = { id, label, symbol, value: at.value(si, 'bore') };
  return line === undefined ? row : { ...row, cited: cited(line.source), working: id };
}

function optional(id: string, label: string, symbol: string | undefined, value: Value | undefined): readonly Row[] {
  return value === undefined ? [] : [{ id, label, ...(symbol === undefined ? {} : { symbol }), value }];
}

const straight = (at: Context, text: unknown): Value | undefined =>
  at.stated(text, ['bores'], 'bores') ?? at.stated(text, ['length'], 'head');
