/** What became of the rows of a log, by the code of their account: a label for lists, and what it means. */

export interface AccountWords {
  readonly label: string;
  readonly meaning: string;
}

/** Accounts of rows that could be read; those that could not have the words of their trouble. */
const accountWords: Readonly<Record<string, AccountWords>> = {
  converted: { label: 'Converted', meaning: 'The row was converted.' },
  'signal-saturated': {
    label: 'Signal saturated',
    meaning: 'The signal lies above its upper limit: at least so much flowed.',
  },
  'signal-uncertain': {
    label: 'Signal uncertain',
    meaning: 'The signal lies below its lower limit, and not yet at that of a fault.',
  },
  'differential-negative': {
    label: 'Differential below zero',
    meaning:
      'The differential lies below zero, beyond any cut-off; backward flow is not measured: the row counts as no flow.',
  },
  'below-cut-off': {
    label: 'Below the cut-off',
    meaning: 'The differential lies within the cut-off of zero, above or below: the row counts as no flow.',
  },
  'outside-limits': {
    label: 'Outside the limits',
    meaning:
      'The Reynolds number, the pressure ratio or the state of the fluid lies outside the limits of its formula.',
  },
  'pressure-substituted': {
    label: 'Pressure substituted',
    meaning: 'The row has no pressure; the stated one stands in for it.',
  },
  'temperature-substituted': {
    label: 'Temperature substituted',
    meaning: 'The row has no temperature; the stated one stands in for it.',
  },
  spike: { label: 'Spike', meaning: 'The differential stands out from the rows before it.' },
  frozen: { label: 'Signal frozen', meaning: 'The signal has not moved for as many rows as are stated.' },
  'hour-repeated': {
    label: 'Hour repeated',
    meaning: 'The stamp stands in the hour that the clocks repeat; the order of the rows tells which one is meant.',
  },
  'signal-fault': {
    label: 'Fault of the transmitter',
    meaning: 'The signal reports a fault: the row was not converted.',
  },
  'pressure-missing': {
    label: 'Pressure missing',
    meaning: 'The row has no pressure and none is stated to stand in: the row was not converted.',
  },
  'temperature-missing': {
    label: 'Temperature missing',
    meaning: 'The row has no temperature and none is stated to stand in: the row was not converted.',
  },
  'not-solved': {
    label: 'Not solved',
    meaning: 'The fluid or the meter has no answer at the figures of the row: the row was not converted.',
  },
  'stamp-repeated': {
    label: 'Stamp repeated',
    meaning: 'A later row has the same stamp: the last one that could be converted counts.',
  },
  'stamp-backward': {
    label: 'Stamp backward',
    meaning: 'The stamp lies before that of an earlier row: the row has no place in time and was not converted.',
  },
};

/** What troubles rows that could not be read. */
const troubleWords: Readonly<Record<string, AccountWords>> = {
  'fields-too-few': { label: 'Too few fields', meaning: 'The row has fewer fields than the log has columns.' },
  'fields-too-many': { label: 'Too many fields', meaning: 'The row has more fields than the log has columns.' },
  'quote-open': { label: 'Quote left open', meaning: 'A quotation mark in the row is never closed.' },
  'line-too-long': { label: 'Row too long', meaning: 'The row is longer than any row of a log.' },
  'nul-byte': { label: 'NUL byte', meaning: 'The row holds a byte that is no text.' },
  'header-again': { label: 'Header again', meaning: 'The row repeats the header of the log.' },
  'time-empty': { label: 'No stamp', meaning: 'The row has no stamp.' },
  'time-unreadable': {
    label: 'Stamp unreadable',
    meaning: 'The stamp is not written as the others of its column are.',
  },
  'time-impossible': { label: 'Stamp impossible', meaning: 'The stamp names a day or an hour that does not exist.' },
  'time-skipped': {
    label: 'Stamp in a skipped hour',
    meaning: 'The stamp stands in the hour that the clocks of its zone leave out.',
  },
  'signal-empty': { label: 'No signal', meaning: 'The row has no signal and no differential.' },
  'signal-unreadable': { label: 'Signal unreadable', meaning: 'The signal or the differential is no number.' },
  'signal-out-of-range': {
    label: 'Signal beyond numbers',
    meaning: 'The signal or the differential is too large or too small a number.',
  },
  'pressure-unreadable': { label: 'Pressure unreadable', meaning: 'The pressure is no number.' },
  'pressure-out-of-range': {
    label: 'Pressure beyond numbers',
    meaning: 'The pressure is too large or too small a number.',
  },
  'temperature-unreadable': { label: 'Temperature unreadable', meaning: 'The temperature is no number.' },
  'temperature-out-of-range': {
    label: 'Temperature beyond numbers',
    meaning: 'The temperature is too large or too small a number.',
  },
};

/** Label and meaning of an account. */
export function accountWordsOf(code: string): AccountWords {
  const words = accountWords[code] ?? troubleWords[code];
  if (words === undefined) throw new Error(`expected words for the account ${code}, got none`);
  return words;
}
