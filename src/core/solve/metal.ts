/** The metal at the line temperature, and the found bore back at the temperature it will be measured at. */
import type { Geometry, Primary } from '../element/contract.ts';
import { grow, growthWorking, materialOf } from '../element/shared/growth.ts';
import type { MetalInput, MeterInput } from '../input/meter.ts';
import type { Length, Temperature } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Working } from '../quantity/working.ts';
import { geometryOf } from './equation.ts';

type Metal = Omit<MetalInput, 'bore'>;

/** A length as measured, grown to the line temperature; without a material it stays. ISO 5167-1:2022, 5.2. */
export const atLine = (length: Length, metal: Metal, line: Temperature): Length =>
  moved(length, metal, metal.measuredAt, line);

/** The inverse of `atLine`. */
export const asMeasured = (length: Length, metal: Metal, line: Temperature): Length =>
  moved(length, metal, line, metal.measuredAt);

const moved = (length: Length, metal: Metal, from: Temperature, to: Temperature): Length => {
  const material = metal.material === undefined ? undefined : materialOf(metal.material);
  return material === undefined ? length : grow(length, material, from, to);
};

/** Pipe and bore at the line temperature. Problem bore-not-below-pipe: no element has a bore as wide as its pipe. */
export function hotGeometry(bore: Length, input: MeterInput, line: Temperature): Outcome<Geometry> {
  const geometry = geometryOf(hotPipe(input, line), atLine(bore, input.element, line));
  if (geometry.ratio < 1) return ok(geometry);
  return fail('bore-not-below-pipe', 'element.bore', { bore, pipe: input.pipe.bore });
}

/**
 * The metal as it stands in the line: a bore in its pipe, or the section that a bar across the pipe counts.
 * Problems: those of hotGeometry, or of the bar.
 */
export function hotSection(primary: Primary, bore: Length | undefined, input: MeterInput, line: Temperature) {
  if (primary.insertion !== undefined) return primary.insertion.section(hotPipe(input, line));
  if (bore === undefined) throw new Error(`metal: expected a bore of ${primary.name}, got none`);
  return hotGeometry(bore, input, line);
}

/** The pipe's bore at the line temperature. */
export const hotPipe = ({ pipe }: MeterInput, line: Temperature): Length => atLine(pipe.bore, pipe, line);

/** How pipe and bore grew; a metal without a material has no line here, nor has the bore of an element without one. */
export function metalWorking(input: MeterInput, bore: Length | undefined, line: Temperature): readonly Working[] {
  const rows = [
    { symbol: 'D', words: 'pipe-bore', length: input.pipe.bore, metal: input.pipe },
    ...(bore === undefined ? [] : [{ symbol: 'd', words: 'element-bore', length: bore, metal: input.element }]),
  ];
  return rows.flatMap(({ symbol, words, length, metal }) => {
    const material = metal.material === undefined ? undefined : materialOf(metal.material);
    if (material === undefined) return [];
    return [growthWorking({ symbol, words, length, material, measuredAt: metal.measuredAt, line })];
  });
}
