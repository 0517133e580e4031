/** The site: what is stated wins, its place comes next, what is usual last. */
import { describe, expect, it } from 'vitest';
import type { Project } from '../../../src/core/document/project.ts';
import { readSite } from '../../../src/core/input/site.ts';
import { refusal, solved, water } from '../sample.ts';

const site = (written: Project['site']) => {
  const read = readSite(written === undefined ? {} : { site: written });
  if (!read.ok) throw new Error(`expected a site, got ${JSON.stringify(read.problems)}`);
  return read.value;
};
const codes = (written: Project['site']) => {
  const read = readSite(written === undefined ? {} : { site: written });
  return read.ok ? [] : read.problems.map(({ code, field }) => `${code} at ${field}`);
};

describe('the site of a project', () => {
  it('is the usual one where nothing is said', () => {
    for (const written of [undefined, {}, { atmosphere: '', gravity: '' }])
      expect(site(written)).toMatchObject({
        atmosphere: 101325,
        gravity: 9.80665,
        from: { atmosphere: 'usual', gravity: 'usual' },
        place: {},
      });
  });

  it('has the atmosphere of its altitude and the gravity of its latitude', () => {
    const found = site({ altitude: '350 m', latitude: '52 deg' });
    expect(found.from).toEqual({ atmosphere: 'place', gravity: 'place' });
    expect(found.atmosphere / 101325).toBeCloseTo((1 - 2.25577e-5 * 350) ** 5.25588, 5); // the usual short form
    // Helmert's formula of 1901 and 3.086e-6 for each metre, close to the normal gravity of today
    const [s, s2] = [Math.sin((52 * Math.PI) / 180) ** 2, Math.sin((104 * Math.PI) / 180) ** 2];
    expect(found.gravity).toBeCloseTo(9.78033 * (1 + 0.005302 * s - 0.000007 * s2) - 3.086e-6 * 350, 4);
  });

  it('reads feet, places below the sea and south of the equator', () => {
    expect(site({ altitude: '1000 ft' }).atmosphere).toBeCloseTo(site({ altitude: '304.8 m' }).atmosphere, 6);
    expect(site({ altitude: '-400 m' }).atmosphere).toBeGreaterThan(101325);
    expect(site({ latitude: '-52 deg' }).gravity).toBe(site({ latitude: '52 deg' }).gravity);
    expect(site({ altitude: '350 m' }).gravity).toBe(9.80665); // height alone says nothing of it
    expect(site({ altitude: '350 m' }).from.gravity).toBe('usual');
  });

  it('keeps what is stated, and still says what the place suggests', () => {
    const place = { altitude: '350 m', latitude: '52 deg' };
    const found = site({ ...place, atmosphere: '98 kPa(a)', gravity: '9.81 m/s2' });
    expect(found).toMatchObject({
      atmosphere: 98000,
      gravity: 9.81,
      from: { atmosphere: 'stated', gravity: 'stated' },
    });
    expect(found.place).toEqual(site(place).place);
  });

  it('refuses a place that is none', () => {
    expect(codes({ altitude: '90 km', latitude: '52 deg' })).toEqual(['unit-unknown at site.altitude']);
    expect(codes({ altitude: '90000 m' })).toEqual(['altitude-out-of-range at site.altitude']);
    expect(codes({ latitude: '91 deg' })).toEqual(['latitude-out-of-range at site.latitude']);
    expect(codes({ latitude: '90 deg' })).toEqual([]);
    expect(codes({ atmosphere: '98 kPa', altitude: 'high' })).toEqual([
      'pressure-reference-missing at site.atmosphere',
      'number-unreadable at site.altitude',
    ]);
  });
});

describe('a meter on the site', () => {
  const project = { site: { altitude: '350 m', latitude: '52 deg' } };

  it('stands on the atmosphere of the altitude, and says so', () => {
    const result = solved(water, project);
    expect(result.state.pressure_Pa).toBe(700000 + result.site.atmosphere_Pa);
    expect(result.site).toMatchObject({ atmosphereFrom: 'place', gravityFrom: 'place', altitude_m: 350 });
    expect(result.site.suggestedAtmosphere_Pa).toBe(result.site.atmosphere_Pa);
    const lines = result.working.slice(0, 2).map(({ id, value, remark }) => [id, value, remark]);
    expect(lines).toEqual([
      ['site-atmosphere', result.site.atmosphere_Pa, 'standard-atmosphere'],
      ['site-gravity', result.site.gravity_m_s2, 'normal-gravity'],
    ]);
  });

  it('has no such line where both are stated or usual', () => {
    const stated = { site: { ...project.site, atmosphere: '1 bar(a)', gravity: '9.81 m/s2' } };
    for (const one of [{}, stated]) expect(solved(water, one).working[0]?.id).toBe('density');
    expect(refusal(water, { site: { altitude: '1e6 m' } })).toEqual(['altitude-out-of-range at site.altitude']);
  });
});
