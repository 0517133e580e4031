/** What the picture of an instrument shows: levels of a reading, the scale of the series, and every text. */
import type { Picture, SolvedReading } from '../../core/result/readings-record.ts';
import type { Solved } from '../../core/result/record.ts';
import { instrumentLabel, liquidWord, pictureWords as words } from '../words/instruments.ts';
import type { Context } from './context.ts';
import { asRead, overOf } from './readings-answer.ts';
import type { Drawn, InstrumentTexts } from './readings-model.ts';
import { written as quantityOf } from './units.ts';

type Written = Readonly<Record<string, string>>;

/** Draws one reading, or the instrument before anything is read. */
export type Drawing = (row: SolvedReading | undefined, texts: Written) => Drawn;

const REST: Picture = {};
const ENDS: Readonly<Record<string, readonly [string, string]>> = {
  '4-20 mA': ['4\u00a0mA', '20\u00a0mA'],
  '1-5 V': ['1\u00a0V', '5\u00a0V'],
  percent: ['0\u00a0%', '100\u00a0%'],
};
const COLUMNS: readonly string[] = ['u-tube', 'inverted-u-tube', 'well', 'inclined'];

export function drawings(at: Context, kind: string, result: Solved): Drawing {
  const rows = result.readings?.rows ?? [];
  const most = Math.max(0, ...rows.map((row) => (row.status === 'solved' ? separationOf(row.picture) : 0)));
  const plate = result.element.startsWith('orifice-plate');
  const angle = quantityOf(at.meter.instrument?.angle, ['angle'])?.si ?? 0;
  return (row, texts) => {
    const picture = row?.picture ?? REST;
    return { picture, most, plate, angle, texts: textsOf(at, kind, result, row, texts) };
  };
}

const separationOf = ({ levelUpstream_m: one = 0, levelDownstream_m: other = 0 }: Picture): number =>
  Math.abs(one - other);

function textsOf(
  at: Context,
  kind: string,
  result: Solved,
  row: SolvedReading | undefined,
  texts: Written,
): InstrumentTexts {
  const { instrument, fluid } = at.meter;
  const reading = asRead(kind === 'gauges' ? texts.upstream : texts.value);
  const differential = row?.differential_Pa === undefined ? '' : at.value(row.differential_Pa, 'differential').text;
  const [upstream, downstream] = sides(kind, row?.picture ?? REST);
  const rise = asRead(typeof instrument?.rise === 'string' ? instrument.rise : '');
  const lowRange = texts.lowRange === undefined ? '' : `${words.lowRange}: ${asRead(texts.lowRange)}`;
  return {
    title: `${instrumentLabel(kind)}, ${result.tag}`,
    description: words.alt(instrumentLabel(kind), reading, differential),
    reading,
    second: kind === 'gauges' ? asRead(texts.throat) : lowRange,
    liquid: liquidText(at, kind, row?.picture ?? REST),
    above: aboveText(at, overOf(fluid?.kind, fluid?.name, result)),
    upstream,
    downstream,
    ends: ENDS[typeof instrument?.signal === 'string' ? instrument.signal : ''] ?? ['', ''],
    rise: rise === '' ? '' : `${words.rise} ${rise}`,
  };
}

/** What stands beside the two legs: which of a column's limbs is high, or which side of a cell each is. */
function sides(kind: string, picture: Picture): readonly [readonly string[], readonly string[]] {
  if (kind === 'gauges') return [[words.upstream], [words.downstream]];
  if (!COLUMNS.includes(kind))
    return [
      [words.upstreamLeg, words.high],
      [words.downstreamLeg, words.low],
    ];
  const { levelUpstream_m: one = 0, levelDownstream_m: other = 0 } = picture;
  const stands = (own: number, second: number): string =>
    own === second ? words.level : own > second ? words.higher : words.lower;
  return [
    [words.upstreamLeg, stands(one, other)],
    [words.downstreamLeg, stands(other, one)],
  ];
}

function liquidText({ meter, value }: Context, kind: string, { liquid_kg_m3: density }: Picture): string {
  if (!COLUMNS.includes(kind)) return '';
  const name = liquidWord(meter.instrument?.liquid ?? (kind === 'inverted-u-tube' ? 'air' : undefined));
  return density === undefined ? name : `${name}, ${value(density, 'density').text}`;
}

/** What fills the legs, where it is the process fluid by its name. */
function aboveText({ meter }: Context, over: string): readonly string[] {
  const { above = 'process', aboveDownstream } = meter.instrument ?? {};
  if (aboveDownstream !== undefined) return words.filledUnlike;
  return above === 'process'
    ? words.inLegs(over)
    : above === 'water'
      ? words.inLegs('water')
      : words.inLegs('fill liquid');
}
