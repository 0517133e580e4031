/** The texts of the chart, given from outside. */
export interface ChartLabels {
  readonly title: string; // 'Flow against differential'
  readonly low: string; // 'lowest, 95 %'
  readonly high: string; // 'highest, 95 %'
  readonly limits: string; // 'Reynolds limits'
  readonly inside: string; // 'inside'
  readonly outside: string; // 'outside'
  readonly band: string; // 'band: expanded uncertainty, 95 %'
}
