/** Hatching of cut metal: thin lines at 45 degrees. */
interface HatchProps {
  readonly id: string;
  /** Distance of the lines and their width, in the units of the drawing. */
  readonly pitch: number;
  readonly width: number;
  readonly className?: string | undefined;
}

export function Hatch({ id, pitch, width, className }: HatchProps) {
  return (
    <pattern id={id} width={pitch} height={pitch} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <line className={className} x1={pitch / 2} y1={0} x2={pitch / 2} y2={pitch} strokeWidth={width} />
    </pattern>
  );
}
