/** Border between regions 2 and 3. Source: IAPWS R7-97(2012), Table 1: n1 to n5 of Eq. 5 and 6. */
export const coefficients = [348.05185628969, -1.1671859879975, 0.0010192970039326, 572.54459862746, 13.91883977887] as const;
