/** Pipe and element: as measured, at the line temperature, and what stands around them. */
import { MEASURED_AT } from '../../core/document/defaults.ts';
import type { Solved } from '../../core/result/record.ts';
import { coefficientWords, openingWord } from '../words/elements.ts';
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

/** The element; a bar across the pipe is known by its coefficient and its width. */
export function metalRows(at: Context, result: Solved): readonly Row[] {
  const { bore_m: bore, diameterRatio: ratio } = result;
  return bore === undefined || ratio === undefined ? barRows(at, result) : boreRows(at, result, { bore, ratio });
}

function barRows(at: Context, result: Solved): readonly Row[] {
  const { element } = at.meter;
  const { name, symbol } = coefficientWords(result.element);
  const lines = maximumOf(result).working;
  const line = lines.find(({ id }) => id === 'C');
  const expansion = lines.some(({ id }) => id === 'epsilon') ? at.number(element?.expansion) : undefined;
  return [
    {
      id: 'coefficient',
      label: name,
      symbol,
      value: figuresOf(at, result).coefficient,
      ...(line === undefined ? {} : { cited: cited(line.source) }),
    },
    ...optional('bar-width', metalLabels.width, 'w', at.stated(element?.width, ['length'], 'length')),
    ...optional('expansion-number', metalLabels.expansion, 'a', expansion),
  ];
}

/** `hot` are the figures at the line temperature. */
function boreRows(at: Context, result: Solved, hot: { readonly bore: number; readonly ratio: number }): readonly Row[] {
  const { element } = at.meter;
  const { bore } = figuresOf(at, result);
  const opening = openingWord(result.element);
  const ratio = maximumOf(result).working.find(({ id }) => id === 'diameter-ratio');
  return [
    ...(bore === undefined ? [] : [measured(at, 'bore-as-measured', metalLabels.opening(opening), bore, element)]),
    atLine(at, result, 'element-bore', 'd', metalLabels.atLine(opening), hot.bore),
    {
      id: 'diameter-ratio',
      label: metalLabels.ratio,
      symbol: 'β',
      value: at.value(hot.ratio, 'ratio'),
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
