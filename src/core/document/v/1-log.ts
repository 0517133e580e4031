/** How the log of a meter is read: which column holds what, in which unit and spelling. What is left out is decided from the log. */

export interface LogColumnText {
  column?: string | number; // name in the header, or the number of the column, 1 for the first
  unit?: string;
  decimal?: string; // '.' or ',', where it is not that of the other columns
  [key: string]: unknown;
}

export interface LogTimeText {
  column?: string | number;
  clock?: string | number; // column of the clock, where date and clock stand apart
  format?: string; // 'iso' | 'day-first' | 'month-first' | 'month-name' | 'epoch-s' | 'epoch-ms' | 'serial-days' | 'seconds'
  [key: string]: unknown;
}

export interface LogText {
  time?: string | number | LogTimeText;
  differential?: LogColumnText;
  signal?: LogColumnText; // of a transmitter, in place of the differential: mA, V or %
  pressure?: LogColumnText;
  temperature?: LogColumnText;
  zone?: string; // 'UTC', '+01:00' or a place such as 'Europe/Oslo'; of stamps that name none
  decimal?: string; // '.' or ','
  delimiter?: string; // ',', ';', '|' or 'tab'
  dateOrder?: string; // 'day-first' | 'month-first'
  dayStart?: string; // clock at which a day begins, '06:00'; midnight where it is not stated
  maxGap?: string; // longest interval that is bridged, '60 s'
  interpretation?: string; // 'sampled' | 'held'
  cutOff?: string; // a differential below it is no flow
  frozen?: string | number; // rows with one and the same signal that are suspect
  spike?: string | number; // distance from the median that is suspect, in median absolute deviations
  fallback?: { pressure?: string; temperature?: string; [key: string]: unknown };
  exact?: boolean; // every row through the whole calculation, without a surface
  [key: string]: unknown;
}
