/** What is said of a site whose place is known. */
export const siteWords = {
  empty: (figure: string): string => `empty: ${figure}`,
  ofPlace: (figure: string, place: string): string => `empty: ${figure}, from ${place}`,
  suggested: (figure: string, place: string): string => `suggested from ${place}: ${figure}`,
  take: 'take it',
  takeOf: (field: string, figure: string): string => `${field}: take ${figure}`,
  and: (latitude: string, altitude: string): string => `${latitude} and ${altitude}`,
} as const;
