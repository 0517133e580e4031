/** The rows of the fluid: what was written, what was found, and what is said beside them. */
import { expect, it } from 'vitest';
import type { MeterText, Project } from '../../../src/core/document/project.ts';
import { run } from '../../../src/core/run.ts';
import type { PresentedSizing } from '../../../src/views/present/model.ts';
import { presentSheets } from '../../../src/views/present/sheet.ts';

const gas: MeterText = {
  tag: 'FE-3101',
  fluid: { kind: 'gas', composition: { methane: 0.9, ethane: 0.06, nitrogen: 0.04 } },
  upstream: { pressure: '60 bar(g)', temperature: '15 degC' },
  pipe: { bore: '200 mm' },
  element: { kind: 'orifice-plate', tappings: 'flange', bore: '120 mm' },
  differential: '900 mbar',
  find: 'flow',
};
const behind = { ...gas.upstream, temperatureAt: 'downstream' };
const stated = { kind: 'stated', density: '45 kg/m3', viscosity: '0.012 mPa.s', isentropicExponent: 1.3 };

function sheet(meter: MeterText, more: Partial<Project> = {}) {
  const project: Project = { format: 'headwright', version: 1, meters: [meter], ...more };
  const [presented] = presentSheets({ project, results: run(project) });
  if (presented?.status !== 'solved') throw new Error(`expected a solved meter, got ${JSON.stringify(presented)}`);
  return presented;
}
const rowOf = ({ state }: PresentedSizing, id: string) => state.find((row) => row.id === id);

it('shows the temperature upstream, and from which it was found', () => {
  const { meter, fluid } = sheet({ ...gas, upstream: behind });
  const row = rowOf(meter, 'temperature');
  expect(row?.value.text).toBe('15.2\u00a0°C');
  expect(row).toMatchObject({ working: 'temperature', cited: { clause: 'ISO 5167-1:2003, 5.4.4.1', mark: '°' } });
  const note = 'from 15\u00a0°C measured downstream, with the loss at maximum flow';
  expect(row?.note).toBe(note);
  expect(fluid.find(({ id }) => id === 'temperature')?.note).toBe(note);
  expect(rowOf(sheet(gas).meter, 'temperature')).toMatchObject({ value: { text: '15\u00a0°C' } });
  expect(rowOf(sheet(gas).meter, 'temperature')).not.toHaveProperty('note');
});

it('says where the temperature stands as measured', () => {
  const { meter } = sheet({ ...gas, fluid: stated, upstream: behind });
  expect(rowOf(meter, 'temperature')).toMatchObject({ value: { text: '15\u00a0°C' }, note: 'as measured downstream' });
  const lines = meter.checks.flatMap(({ rows }) => rows).map(({ text }) => text);
  expect(lines).toContain(
    'Temperature 15.0\u00a0°C was measured downstream and taken as that upstream: no Joule–Thomson coefficient is known ' +
      'of this fluid',
  );
  expect([meter.throttles, sheet(gas).meter.throttles]).toEqual([false, true]);
});

it('says where a formulation holds, in the units of the meter', () => {
  expect(rowOf(sheet(gas).meter, 'density')?.range).toBe('holds for −23.2 to 176.9\u00a0°C, at most 350\u00a0bar(a)');
  const us = { ...gas, upstream: { pressure: '870 psi(g)', temperature: '59 degF' } };
  const { meter } = sheet(us, { display: 'US' });
  expect(rowOf(meter, 'density')?.range).toBe('holds for −9.7 to 350.3\u00a0°F, at most 5076\u00a0psi(a)');
  expect(rowOf(meter, 'pressure')).not.toHaveProperty('range');
});

it('says on which atmosphere a gauge pressure stands', () => {
  const noteWith = (site: Project['site']) =>
    sheet(gas, site === undefined ? {} : { site }).fluid.find(({ id }) => id === 'absolute')?.note;
  expect(noteWith(undefined)).toBe('over 1.013\u00a0bar(a)');
  expect(noteWith({ altitude: '350 m' })).toBe('over 0.9719\u00a0bar(a), standard atmosphere at 350\u00a0m');
  expect(noteWith({ altitude: '350 m', atmosphere: '98 kPa(a)' })).toBe('over 98\u00a0kPa(a)');
});
