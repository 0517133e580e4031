/** Border between regions 2 and 3. Source: IAPWS R7-97(2012), Table 1: n1 to n3 of Eq. 5. */
export const coefficients = [348.05185628969, -1.1671859879975, 0.0010192970039326] as const;
