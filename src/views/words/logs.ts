/** Words of the log of a meter: its columns, its conversion and what it came to. */

export const logWords = {
  title: 'Log',
  none: 'A log is a table of what was recorded: time, differential or signal, and pressure and temperature where they were.',
  open: 'Open a log',
  openOther: 'Open another',
  drop: 'or drop a .csv or .csv.gz file on the page. It is read here and sent nowhere.',
  example: 'Example log',
  exampleNote: 'One day at one row a second, made on the spot, with faults.',
  elsewhere: (name: string, tag: string): string => `${name} is open at ${tag}.`,
  elsewhereBusy: (name: string, tag: string): string => `${name} is being converted by ${tag}.`,
  close: 'Close the log',
  looking: 'The first rows are being read.',
  rows: 'The first rows, as written and as read',
  rowsNote: 'Below each cell of a chosen column stands what it is read as.',
  columns: 'Columns',
  rules: 'Rules',
  more: 'More rules',
  questions: 'To be answered before it can begin',
  blocked: 'What stands in the way',
  convert: 'Convert the log',
  again: 'Convert it again',
  cancel: 'Cancel',
  cancelled: 'The conversion was cancelled. Nothing of it was kept.',
  stale: 'The meter or the columns have changed since: convert the log again.',
  save: 'Save the converted rows',
  print: 'Print the summary',
  row: 'Row',
  notUsed: 'not in the log',
  choose: 'Choose a column',
  none2: 'none',
} as const;

/** The parts of a log by their key in the document. */
export const logParts = {
  time: 'Time',
  clock: 'Clock, where it stands apart',
  differential: 'Differential',
  signal: 'Signal of the transmitter',
  pressure: 'Pressure',
  temperature: 'Temperature',
} as const;

/** What a log of a meter without such a column is converted with. */
export const withoutColumn = {
  pressure: 'as the meter has it',
  temperature: 'as the meter has it',
} as const;

export const logFields = {
  unit: 'unit',
  zone: 'Time zone',
  zoneNote: 'UTC, +01:00 or a place such as Europe/Oslo',
  zoneOwn: 'The stamps name their zone.',
  zoneAssumed: 'Not stated: taken as UTC.',
  interpretation: 'Values are',
  interpretationAssumed: 'Not stated: taken as samples.',
  maxGap: 'Longest interval bridged',
  maxGapNote: 'such as 60\u00a0s; left open, ten times the usual interval',
  cutOff: 'Low-flow cut-off',
  fallbackPressure: 'Where a pressure is missing',
  fallbackTemperature: 'Where a temperature is missing',
  dayStart: 'Day begins at',
  frozen: 'Frozen after so many equal rows',
  spike: 'Spike beyond so many deviations',
  exactNote: 'Slower, and the same within the bound that is printed with the result.',
  delimiter: 'Delimiter',
  decided: 'as found',
} as const;

export const interpretations = [
  { value: 'sampled', label: 'samples at their moment' },
  { value: 'held', label: 'held until the next one' },
] as const;

export const interpretationLabel = (code: 'sampled' | 'held'): string =>
  interpretations.find(({ value }) => value === code)?.label ?? code;

/** Beside what was taken because nothing is written. */
export const assumedText = 'taken, not stated';
export const usualGap = 'ten times the usual interval';

export const delimiterChoices = [
  { value: ',', label: 'comma' },
  { value: ';', label: 'semicolon' },
  { value: '|', label: 'bar' },
  { value: 'tab', label: 'tab' },
] as const;
/** By the character itself. */
const delimiters: Readonly<Record<string, string>> = Object.fromEntries(
  delimiterChoices.map(({ value, label }) => [value === 'tab' ? '\t' : value, label]),
);

const encodings: Readonly<Record<string, string>> = {
  'utf-8': 'UTF-8',
  'utf-16le': 'UTF-16, low byte first',
  'utf-16be': 'UTF-16, high byte first',
  'windows-1252': 'Windows-1252',
};

const timeFormats: Readonly<Record<string, string>> = {
  iso: 'year, month, day (ISO 8601)',
  'day-first': 'day, month, year',
  'month-first': 'month, day, year',
  'month-name': 'day, name of the month, year',
  'epoch-s': 'seconds since 1970',
  'epoch-ms': 'milliseconds since 1970',
  'serial-days': 'days of a spreadsheet',
  seconds: 'seconds of a plain clock',
};

const named = (what: string, words: Readonly<Record<string, string>>, code: string): string => {
  const found = words[code];
  if (found === undefined) throw new Error(`expected words for the ${what} ${code}, got none`);
  return found;
};

export const timeFormatLabel = (format: string): string => named('time format', timeFormats, format);
export const decimalLabel = (mark: '.' | ','): string => (mark === '.' ? 'decimal point' : 'decimal comma');

/** 'UTF-8, columns parted by commas, 1 row above the data'. */
export function spellingText(encoding: string, delimiter: string, skip: number, hasHeader: boolean): string {
  const above = skip === 0 ? 'no row of names' : `${skip} ${skip === 1 ? 'row' : 'rows'} above the data`;
  const names = hasHeader || skip === 0 ? above : `${above}, none of them names`;
  return `${named('encoding', encodings, encoding)}, parted by ${named('delimiter', delimiters, delimiter)}, ${names}`;
}

/** What a decision stands on. Row 0 stands near the end of the log. */
export function evidenceText(label: string, cell: { readonly text: string; readonly row: number } | undefined): string {
  if (cell === undefined) return label;
  return `${label}: ‘${cell.text}’ ${cell.row === 0 ? 'near the end' : `in row ${cell.row}`} says so`;
}

export const readAs = (reading: string): string => `Read it as ${reading}`;
export const ambiguous = (text: string, column: string): string =>
  `‘${text}’ in the column ${column} can be read in two ways.`;

/** How far a conversion is. */
export const progressText = (rows: string, rate: string, left: string): string =>
  [`${rows} rows`, rate === '' ? '' : `${rate} rows a second`, left === '' ? '' : `${left} left`]
    .filter(Boolean)
    .join(' · ');

/** Rows of the result. */
export const logRows = {
  mass: 'Mass',
  baseVolume: 'Volume at the base state',
  volume: 'Volume at the state of each row',
  meanFlow: 'Mean mass flow',
  counted: 'Time that the totals stand for',
  flowing: 'of it with flow',
  still: 'of it without flow',
  gaps: 'Gaps, not bridged',
  substituteHeld: 'Would have passed in them, the flow before each held',
  substituteLine: 'Would have passed in them, on a straight line across',
  differential: 'Mean differential, by time',
  pressure: 'Mean pressure, by flow',
  temperature: 'Mean temperature, by flow',
  rooting: 'Rooting the mean differential would read',
  path: 'Rows by the property surface',
  exactRows: 'Rows through the whole calculation',
  bound: 'Largest difference between the two, of the flow',
} as const;

export const extremeLabels = {
  massFlow: 'Mass flow',
  differential: 'Differential',
  pressure: 'Pressure, absolute',
  temperature: 'Temperature',
} as const;

export const resultWords = {
  totals: 'Totals',
  means: 'Means',
  extremes: 'Least and most',
  reasons: 'Account of every row',
  days: 'By day',
  chart: 'Mass flow over time',
  configuration: 'Converted with',
  quantity: 'Quantity',
  least: 'Least',
  most: 'Most',
  at: 'at',
  reason: 'Account',
  rows: 'Rows',
  share: 'Share',
  time: 'Time',
  mass: 'Mass',
  first: 'First at row',
  day: 'Day',
  mean: 'Mean flow',
  flowing: 'With flow',
  flagged: 'Flagged',
  gap: 'Gaps',
  tooHigh: 'too high',
  fates: { converted: 'converted', remarked: 'converted, with a remark', refused: 'not converted' },
} as const;

/** '86 400 rows in 3.1 s: 85 000 converted, 1 200 of them with a remark, 200 not converted.' */
export function rowsAccount(
  rows: string,
  converted: string,
  remarked: string,
  refused: string,
  seconds: string,
): string {
  return `${rows} rows in ${seconds}: ${converted} converted, ${remarked} of them with a remark, ${refused} not converted.`;
}

/** '98.8 % of the rows converted'. */
export const shareText = (share: string): string => `${share} of the rows converted`;

export const logAnswer = (mass: string, from: string, to: string, mean: string): string =>
  `${mass} passed between ${from} and ${to}, ${mean} in the mean.`;
export const logNoAnswer = 'No two rows could be joined: there is no total.';

export const gapsText = (count: string): string => `${count} of them`;
export const longestGapText = (time: string, at: string): string => `the longest ${time}, from ${at}`;
export const chartSummaryText = (least: string, most: string): string =>
  `Mass flow from ${least} to ${most}. Each stretch of time shows its least and its largest flow, so that no peak is lost; gaps are left open.`;

export const openEnd = 'The log ends without a line end: its last row may have been cut.';
export const spanningText = (rows: string): string => `${rows} rows have a text that goes over several lines.`;
export const blankText = (lines: string): string => `${lines} blank lines were passed over.`;

/** Why there is no property surface, or no wider one. */
const reasonsWhy: Readonly<Record<string, string>> = {
  'downstream-temperature': 'the temperature is measured downstream, so that every flow has a state of its own',
  'fluid-refused': 'the fluid has no state somewhere in the range of the log',
  'two-phases': 'the fluid changes its phase within the range of the log',
  'partly-outside': 'a formula of the fluid ends within the range of the log',
  'temperature-tied': 'the temperature of the fluid is tied to its pressure',
  'not-smooth': 'the state of the fluid is not smooth over the range of the log',
  'too-many-seams': 'the formulas of the fluid change too often over the range of the log',
};
export const exactBecause = (why: string): string => `There, ${named('reason', reasonsWhy, why)}.`;

export const saveNote = (name: string, size: string): string => `${name}, ${size}`;
export const sizeText = { bytes: 'bytes', kilo: 'kB', mega: 'MB', giga: 'GB' } as const;

export const logSheet = {
  type: 'Summary of a log',
  file: 'Log',
  more: (count: string): string => `${count} more days are left out here; they are in the table on the screen.`,
} as const;
