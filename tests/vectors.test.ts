/** The only runner of the reference vectors: every case of every file, at its printed precision, none skipped. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { compareAll, vectorFiles } from './vectors/measure.ts';

/** Figures that their source prints otherwise than its own formula gives; each must still miss, or the entry goes. */
interface Miss {
  readonly file: string;
  readonly name: string;
  readonly field: string;
  readonly reason: string;
}
const misses = JSON.parse(readFileSync(join(import.meta.dirname, 'vectors/known-misses.json'), 'utf8')) as Miss[];

const files = vectorFiles();

describe.each(files)('$path', ({ path, file }) => {
  const known = misses.filter((miss) => miss.file === path);
  const compared = compareAll({ path, file });

  test('names its source, its columns and the reason of each tolerance', () => {
    expect(file.source).toMatch(/\S/);
    expect(['published', 'independent', 'unseen', 'copied']).toContain(file.origin);
    for (const { why, rel, abs, digits } of Object.values(file.tolerance)) {
      expect(why).toMatch(/\S/);
      expect(rel ?? abs ?? digits, why).toBeGreaterThanOrEqual(0);
    }
    for (const name of Object.keys(file.cases[0]?.expect ?? {})) expect(Object.keys(file.about)).toContain(name);
  });

  test(`${compared.length} figures`, () => {
    const isKnown = (name: string, field: string) => known.some((miss) => miss.name === name && miss.field === field);
    const wrong = compared.filter(({ name, field, share }) => share <= 1 === isKnown(name, field));
    expect(wrong.map(({ name, field, expected, got }) => `${name}: ${field} expected ${expected}, got ${got}`)).toEqual(
      [],
    );
  });
});

test('no vector has been lost', () => {
  const counts = Object.fromEntries(files.map(({ path, file }) => [path, file.cases.length]));
  expect(counts).toMatchInlineSnapshot(`
    {
      "aga8/appendix-b.json": 29,
      "aga8/binaries.json": 270,
      "aga8/detail-binaries.json": 270,
      "aga8/detail-example.json": 1,
      "aga8/detail-w.json": 40,
      "aga8/detail-z.json": 40,
      "aga8/example.json": 1,
      "aga8/iso20765-2.json": 24,
      "aga8/phase-grid.json": 117,
      "aga8/pipeline-w.json": 40,
      "aga8/pipeline-z.json": 40,
      "air/cipm-factors.json": 1,
      "air/cipm-rounded.json": 1,
      "air/dry-air-compressibility.json": 4,
      "air/moist-states.json": 40,
      "air/oiml-formula.json": 5,
      "gas-viscosity/friend-ethane.json": 3,
      "gas-viscosity/laesecke-muzny.json": 6,
      "gas-viscosity/lemmon-jacobsen-liquid.json": 3,
      "gas-viscosity/lemmon-jacobsen.json": 12,
      "gas-viscosity/pure-states.json": 80,
      "gas-viscosity/scheme-carbon-dioxide.json": 2,
      "gas-viscosity/scheme-dry-air.json": 3,
      "gas-viscosity/scheme-helium.json": 1,
      "gas-viscosity/scheme-hexane-heptane.json": 4,
      "gas-viscosity/scheme-hydrogen-sulfide.json": 1,
      "gas-viscosity/scheme-methane-butane.json": 1,
      "gas-viscosity/scheme-perry.json": 18,
      "gas-viscosity/scheme-simple-gases.json": 9,
      "gas-viscosity/scheme-steam.json": 1,
      "gas-viscosity/scheme-vdi.json": 9,
      "gas-viscosity/vogel-propane.json": 3,
      "gauge/liquid-columns.json": 3,
      "gauge/mercury-density.json": 1,
      "gauge/mercury-volume.json": 6,
      "gauge/tanaka-water-if97.json": 8,
      "gauge/tanaka-water.json": 8,
      "handbook/cengel-cimbala.json": 1,
      "handbook/coulson-richardson.json": 1,
      "handbook/crane-bore.json": 1,
      "handbook/crane-flow-coefficient.json": 1,
      "handbook/crane-flow.json": 2,
      "handbook/crane-loss.json": 1,
      "handbook/entrance-question-venturi.json": 1,
      "handbook/fox-mcdonald.json": 1,
      "handbook/geankoplis.json": 1,
      "handbook/inclined-oil-venturi.json": 1,
      "handbook/petrol-venturi-coefficient.json": 1,
      "handbook/petrol-venturi-flow.json": 1,
      "handbook/white.json": 3,
      "iapws/boundary.json": 2,
      "iapws/region1.json": 3,
      "iapws/region2.json": 3,
      "iapws/region3-roots-at-critical.json": 4,
      "iapws/region3-roots-near-critical.json": 8,
      "iapws/region3-roots.json": 40,
      "iapws/region3.json": 3,
      "iapws/region5.json": 3,
      "iapws/saturation.json": 6,
      "iapws/states.json": 200,
      "iapws/viscosity.json": 11,
      "iapws/vpt-borders.json": 12,
      "iapws/vpt.json": 52,
      "iso5167/flange-data-sheet.json": 1,
      "iso5167/fluids-coefficient.json": 78,
      "iso5167/fluids-expansibility.json": 40,
      "iso5167/fluids-flow.json": 40,
      "iso5167/fluids-jet-loss.json": 12,
      "iso5167/fluids-venturi-loss.json": 12,
      "iso5167/isa-1932-coefficient.json": 179,
      "iso5167/long-radius-coefficient.json": 223,
      "iso5167/reader-harris-gallagher.json": 4,
      "iso5167/tr-11583-expansibility.json": 1,
      "iso5167/venturi-nozzle-coefficient.json": 28,
      "liquids/ashrae-glycols.json": 66,
      "liquids/handbook-pure.json": 13,
      "liquids/handbook-solutions.json": 9,
      "liquids/laliberte-density.json": 1,
      "liquids/laliberte-viscosity.json": 1,
      "liquids/melinder-calcium-chloride-brine.json": 32,
      "liquids/melinder-ethylene-glycol-water.json": 75,
      "liquids/melinder-propylene-glycol-water.json": 64,
      "liquids/melinder-sodium-chloride-brine.json": 23,
      "logs/gaps.json": 2,
      "logs/rooting.json": 3,
      "other-gases/states.json": 120,
      "pitot/abulencia-oil-meter.json": 1,
      "pitot/abulencia-oil.json": 1,
      "pitot/anderson-airspeed.json": 1,
      "pitot/averaging-equation.json": 32,
      "pitot/bias-six-decimals.json": 22,
      "pitot/bias.json": 28,
      "pitot/card-rectangular.json": 2,
      "pitot/card-round.json": 1,
      "pitot/compressibility.json": 1,
      "pitot/doebelin.json": 1,
      "pitot/epa-constant.json": 1,
      "pitot/epa-method-1.json": 12,
      "pitot/epa-molar-mass.json": 1,
      "pitot/epa-velocity.json": 1,
      "pitot/geankoplis-duct-meter.json": 1,
      "pitot/geankoplis-duct.json": 1,
      "pitot/geankoplis-static.json": 1,
      "pitot/iso3966-log-linear.json": 1,
      "pitot/iso3966-log-tchebycheff.json": 1,
      "pitot/iso3966-rectangular.json": 1,
      "pitot/iso5802.json": 4,
      "pitot/lal-submarine.json": 1,
      "pitot/log-linear-26.json": 1,
      "pitot/mean-velocity-point.json": 2,
      "pitot/rules-circular.json": 28,
      "pitot/rules-rectangular.json": 8,
      "pitot/vennard-mercury.json": 1,
      "pitot/vennard-subsonic.json": 1,
      "reading/abulencia-vacuum.json": 1,
      "reading/arora-oil.json": 1,
      "reading/brodkey-well.json": 1,
      "reading/cengel-cimbala-methanol.json": 1,
      "reading/cengel-cimbala-u-tube.json": 1,
      "reading/choudhary-gauges.json": 1,
      "reading/choudhary-venturi.json": 1,
      "reading/compensation.json": 1,
      "reading/coulson-acid.json": 1,
      "reading/coulson-orifice.json": 1,
      "reading/de-nevers-two-liquids.json": 1,
      "reading/de-nevers-venturi.json": 1,
      "reading/douglas-gauge.json": 1,
      "reading/douglas-inverted.json": 1,
      "reading/geankoplis-mercury.json": 1,
      "reading/inch-of-water-60.json": 1,
      "reading/inch-of-water.json": 1,
      "reading/krishnaswamy-level.json": 1,
      "reading/krishnaswamy-orifice.json": 1,
      "reading/linear-of-root-12.json": 1,
      "reading/massey-orifice.json": 1,
      "reading/millimetre-of-mercury.json": 1,
      "reading/missing-water-in-leg.json": 1,
      "reading/nbs-barometer.json": 1,
      "reading/pao-vacuum.json": 1,
      "reading/paradise-coefficient.json": 1,
      "reading/rao-inclined.json": 1,
      "reading/root-of-linear-12.json": 1,
      "reading/root-of-linear-8.json": 1,
      "reading/sawhney-inclined-cistern.json": 1,
      "reading/sawhney-inclined.json": 1,
      "reading/sawhney-mercury.json": 1,
      "reading/sawhney-well-error.json": 1,
      "reading/sawhney-well.json": 1,
      "reading/schaschke-throat.json": 1,
      "reading/span-error.json": 1,
      "reading/subramanya-inverted.json": 1,
      "reading/subramanya-oil.json": 1,
      "reading/subramanya-reading.json": 1,
      "reading/subramanya-reducer.json": 1,
      "reading/walshaw-capillary.json": 1,
      "reading/wrong-bore.json": 1,
      "reading/wrong-density.json": 1,
      "site/normal-gravity.json": 5,
      "site/standard-atmosphere.json": 10,
      "units/nist-sp811.json": 39,
      "units/pint.json": 130,
    }
  `);
});

test('every known miss names a case that exists, and says why', () => {
  for (const miss of misses) {
    const found = files.find(({ path }) => path === miss.file)?.file.cases.find(({ name }) => name === miss.name);
    expect(found?.expect, JSON.stringify(miss)).toHaveProperty(miss.field);
    expect(miss.reason).toMatch(/\S/);
  }
});
