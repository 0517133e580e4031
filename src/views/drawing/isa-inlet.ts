/**
 * The inlet of the ISA 1932 nozzle, which the Venturi nozzle shares: flat face, two arcs, cylindrical throat.
 * ISO 5167-3:2003, 5.1.2: R1 = 0.2 d centred 0.75 d from the axis, R2 = d/3 centred 5 d/6 from the axis.
 */
import { type ArcSegment, at, line, type Path } from './path.ts';

/** Axial place of the centre of the second arc behind the flat face, in d. */
const secondCentre = (12 + Math.sqrt(39)) / 60;

export interface Inlet {
  /** Contour from the upstream face to the end of the throat. */
  readonly contour: Path;
  /** Start and end of the cylinder, m from the upstream face. */
  readonly throatFrom: number;
  readonly throatTo: number;
}

/** Contour for a throat of a length in d; above a diameter ratio of 2/3 the face is turned down to the pipe bore. */
export function isaInlet(pipe: number, bore: number, throat: number): Inlet {
  const d = bore;
  const first = 0.2 * d;
  const second = d / 3;
  const entry = Math.min(0.75 * d, pipe / 2);
  const cut = 0.2 * d - Math.sqrt(first ** 2 - (0.75 * d - entry) ** 2); // 5.1.2.2, face turned down
  const place = (x: number, y: number) => at(x - cut, y);
  const firstCentre = place(0.2 * d, 0.75 * d);
  const centre = place(secondCentre * d, (5 / 6) * d);
  const share = second / (second - first); // the centres and the joint stand on one line
  const joint = at(centre.x + share * (firstCentre.x - centre.x), centre.y + share * (firstCentre.y - centre.y));
  const arc = (to: ArcSegment['to'], middle: ArcSegment['centre'], radius: number): ArcSegment => ({
    kind: 'arc',
    to,
    centre: middle,
    semiX: radius,
    semiY: radius,
    clockwise: false,
  });
  const throatFrom = centre.x;
  const throatTo = throatFrom + throat * d;
  const contour: Path = {
    start: place(cut, entry),
    segments: [arc(joint, firstCentre, first), arc(at(throatFrom, d / 2), centre, second), line(at(throatTo, d / 2))],
    closed: false,
  };
  return { contour, throatFrom, throatTo };
}
