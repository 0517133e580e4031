/** What the document says of a log as a whole: its zone, how its rows follow each other, what stands in for a gap. */
import type { Form } from '../input/form.ts';
import type { Site } from '../input/site.ts';
import { quoted } from '../quantity/spelling.ts';
import { DAY, HOUR } from './calendar.ts';
import type { Mapping } from './mapping.ts';
import { type Zone, zoneOf } from './zone.ts';

type Stated = Pick<Mapping, 'interpretation' | 'maxGap' | 'cutOff' | 'frozen' | 'spike' | 'fallback' | 'assumed'>;

/** What the document says of the rows as a whole. */
export function statedOf(form: Form, site: Site): Stated {
  const interpretation = form.choice('log.interpretation', ['sampled', 'held'] as const);
  const maxGap = durationOf(form, 'log.maxGap');
  const cutOff = form.positive('log.cutOff', ['pressure difference']);
  const frozen = count(form, 'log.frozen');
  const spike = count(form, 'log.spike');
  const pressure = form.quantity('log.fallback.pressure', ['absolute pressure', 'gauge pressure']);
  const temperature = form.positive('log.fallback.temperature', ['temperature']);
  const absolute = pressure && (pressure.measure === 'gauge pressure' ? pressure.si + site.atmosphere : pressure.si);
  if (absolute !== undefined && absolute <= 0)
    form.report('not-above-vacuum', 'log.fallback.pressure', {
      written: `${pressure?.number} ${pressure?.unit.symbol}`,
    });
  return {
    interpretation: interpretation ?? 'sampled',
    ...(maxGap === undefined ? {} : { maxGap }),
    ...(cutOff ? { cutOff: cutOff.si } : {}),
    ...(frozen === undefined ? {} : { frozen }),
    ...(spike === undefined ? {} : { spike }),
    fallback: {
      ...(absolute === undefined ? {} : { pressure: absolute as NonNullable<Mapping['fallback']['pressure']> }),
      ...(temperature ? { temperature: temperature.si } : {}),
    },
    assumed: interpretation === undefined ? ['interpretation'] : [],
  };
}

function count(form: Form, field: string): number | undefined {
  const value = form.number(field);
  return value === undefined || value > 0 ? value : form.report('not-positive', field, { written: String(value) });
}

const DURATION = /^(\d+\.?\d*|\.\d+)\s*(s|min|h|d)$/;
const SECONDS: Readonly<Record<string, number>> = { s: 1, min: 60, h: HOUR, d: DAY };

/** A length of time as '60 s', '5 min', '1 h' or '1 d', in s. */
function durationOf(form: Form, field: string): number | undefined {
  const text = form.word(field)?.trim();
  if (text === undefined) return undefined;
  const [, number = '', unit = ''] = DURATION.exec(text) ?? [];
  const seconds = Number(number) * (SECONDS[unit] ?? 0);
  if (seconds > 0 && Number.isFinite(seconds)) return seconds;
  return form.report('log-duration-unreadable', field, { written: quoted(text) });
}

/** The zone of stamps that name none; UTC where the document says nothing. */
export function zoneOfLog(form: Form): { readonly zone: Zone; readonly assumed: boolean } | undefined {
  const text = form.word('log.zone');
  const zone = zoneOf(text ?? 'UTC');
  if (zone === undefined) return form.report('log-zone-unknown', 'log.zone', { written: quoted(text ?? '') });
  return { zone, assumed: text === undefined };
}
