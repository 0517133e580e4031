/** The texts of the drawings, all given from outside; a drawing holds no word of its own. */

export interface PipeLabels {
  /** Accessible name and description of the picture. */
  readonly title: string;
  readonly description: string;
  readonly totalHead: string; // 'total head'
  readonly pressureHead: string; // 'pressure head'
  readonly tappings: string; // 'across the tappings'
  readonly loss: string; // 'permanent loss'
  readonly pipe: string; // 'D 102.26 mm'
  readonly bore: string; // 'bore 62.48 mm'
  readonly recovered: string; // 'recovered by 6 D'; empty where nothing is to be said
  readonly legend: string; // 'marked points are computed; the line between them is drawn'
  readonly scale: string; // 'bores, tappings and distances to scale; wall and flanges are not'
  /** Name of the handle on the bore's edge, and what it says of the present ratio. */
  readonly pull?: string;
  readonly pullValue?: string;
}

export interface SectionLabels {
  readonly title: string;
  readonly description: string;
  readonly flow: string; // 'flow'
  readonly scale: string; // 'scale'
  readonly edge: string; // 'edge'
  /** Printed diameters at the temperature of the caption, with tolerance if any, without unit. */
  readonly pipe: string; // '102.26'
  readonly bore: string; // '62.48 ± 0.03'
}
