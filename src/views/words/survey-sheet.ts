/** Words of the sheets of a survey: the form for the field and the survey that is read. */

export const sheetOfSurvey = {
  type: 'Survey sheet',
  points: 'Points and readings',
  both: 'Readings, checks and sources',
  form: 'Form for the field',
  refused: 'This survey has no result. What stands in the way:',
  section: 'Inside of the section',
  fluid: 'Fluid in the duct',
  result: 'Result',
  plan: 'Section',
  quality: 'Quality of the readings',
  ofFlow: 'of the flow',
  pictures: 'Section and velocities',
  depthFrom: (from: string, unit: string): string => `depth ${from}, in ${unit}`,
  weight: 'Weight',
  byLine: 'Points by line',
  toRead: 'To be read, point by point',
  toNote: 'To be noted at the duct',
  incomplete: 'Not read to the end: no flow can be stated.',
  number: 'No.',
  differential: 'Δp',
  velocity: 'v',
} as const;

export const formFacts = {
  section: 'Inside of the section',
  points: 'Points',
  port: 'Length of the port',
  probe: 'Probe',
  coefficient: 'Coefficient',
  legend: 'Points in the order of measuring; ports outside, with the number of the line. A square marks a moved point.',
} as const;

/** What a technician writes down beside the readings. */
export const fieldNotes: readonly string[] = [
  'Unit of the readings',
  'Gauge, its zero before',
  'Zero after',
  'Static pressure in the duct',
  'Temperature in the duct',
  'Humidity or wet bulb',
  'Barometer',
  'Second probe, begin and end',
  'Time, begin and end',
  'Inside sizes as measured',
  'By, date',
  'Remarks',
];
