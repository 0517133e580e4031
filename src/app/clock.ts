/** Local time as the screen shows it. */

const two = (part: number): string => String(part).padStart(2, '0');

/** '14:02' */
export const timeOf = (at: Date): string => `${two(at.getHours())}:${two(at.getMinutes())}`;

/** '2026-03-14' */
export const dayOf = (at: Date): string => `${at.getFullYear()}-${two(at.getMonth() + 1)}-${two(at.getDate())}`;

/** '2026-03-14 14:02' */
export const dateOf = (at: Date): string => `${dayOf(at)} ${timeOf(at)}`;
