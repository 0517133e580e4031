/** What holds where a project says nothing, in the spelling of the file. */

/** The site and base state of a project that states none. */
export const SITE_DEFAULTS = {
  atmosphere: '101.325 kPa(a)',
  gravity: '9.80665 m/s2',
  basePressure: '101.325 kPa(a)',
  baseTemperature: '15 degC',
} as const;

/** Temperature, in K, at which a bore was measured that names none: 20 degC. */
export const MEASURED_AT = 293.15;
