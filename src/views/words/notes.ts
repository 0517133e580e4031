/** Remarks on a working line and notes of the tables of straight lengths: what a formula or a figure cannot say. */
import { catalogue } from './catalogue.ts';
import { airRemarks } from './notes-of-air.ts';
import { liquidRemarks } from './notes-of-liquids.ts';

const byRegion = (region: number): Readonly<Record<string, string>> => ({
  [`if97-region-${region}`]: `From the equation of region ${region} of the formulation; too long to print here.`,
  [`if97-region-${region}-beyond-saturation`]: `From the equation of region ${region}, continued a little beyond the saturation line to hold the phase.`,
});

export const remarks: Readonly<Record<string, string>> = {
  ...byRegion(1),
  ...byRegion(2),
  ...byRegion(3),
  ...byRegion(5),
  'if97-region-4': 'From the saturation equation of the formulation.',
  'if97-at-base': 'From the formulation at the base state of the project.',
  'equation-density': 'From the equation of state at pressure and temperature; too long to print here.',
  'equation-speed-of-sound': 'From the equation of state; too long to print here.',
  'composition-normalised': 'The shares of the composition do not add up to 1; each was divided by this sum.',
  'standard-atmosphere':
    'From the altitude, as none is stated; the weather moves the true pressure by up to 3\u00a0%. Too long to print here.',
  'normal-gravity': 'From latitude and altitude, as none is stated; too long to print here.',
  'joule-thomson':
    'Fall of temperature with pressure at constant enthalpy, at the state upstream; too long to print here.',
  'temperature-from-downstream':
    'From the temperature measured downstream and the permanent loss at maximum flow; at a smaller flow the two ' +
    'temperatures differ less.',
  'gas-base-ideal': 'Something would condense at the base state: the density of the ideal gas is the custom.',
  'viscosity-by-scheme': 'From the viscosities of the dilute gases, mixed, and the effect of density.',
  'viscosity-by-reference': 'From the reference correlation of this gas; too long to print here.',
  'viscosity-by-release': 'From the correlation of the release; too long to print here.',
  'viscosity-extrapolated': 'From the correlation of the release, continued above its range: take it with care.',
  stated: 'Stated by the user.',
  'traverse-strongest':
    'Written here for the strongest reading, before any correction; every point follows in the same way.',
  ...liquidRemarks,
  ...airRemarks,
  'expansion-held': 'The temperature lies outside the table of expansion; its nearest value is held.',
  'expansibility-isentropic': 'Written here with τ as the ratio of the pressures.',
  'venturi-loss-curve': 'The share is read from a curve of the standard.',
  'venturi-annex-b': 'From the list for low Reynolds numbers, which is for information only.',
  'venturi-held': 'Outside the Reynolds numbers of the standard; the constant is held.',
  'venturi-machined-doubt': 'The 2022 edition may give another value: check your copy.',
  'expansion-number-missing': 'The maker’s sheet gives no expansion number: the factor is taken as 1.',
  'calibration-constant': 'From the calibration of this meter, one point.',
  'calibration-held': 'Outside the calibration of this meter; its end value is held.',
  'calibration-interpolated': 'From the calibration of this meter, between two points.',
  'coefficient-held': 'The flow lies far below the Reynolds numbers of the standard; the coefficient is held.',
  'uncertainty-allowance':
    'Pipe bore or bore have no uncertainty of their own: the largest that the standard allows is taken.',
  'uncertainty-gaps': 'Differential or density have no uncertainty stated and are left out: the true figure is larger.',
  'uncertainty-allowance-and-gaps':
    'Pipe bore or bore take the largest uncertainty that the standard allows; differential or density are left out, so ' +
    'the true figure is larger.',
  'uncertainty-left-out': 'What has no uncertainty stated is left out: the true figure is larger.',
  'straight-perpendicular-high-reynolds': 'Longer at high Reynolds numbers',
  'straight-from-throat-tapping': 'Counted from the plane of the throat tappings',
  'straight-perpendicular-conditioner': 'A flow conditioner is advised',
};

export const noteText = catalogue('note', remarks);
