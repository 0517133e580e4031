/** A field that can be the unknown: an input, or the shaded figure that was found, with the button that turns it round. */
import type { Unknown as UnknownName } from '../../../core/document/project.ts';
import { foundFrom, foundFromBar } from '../../words/verdicts.ts';
import { FoundField } from '../field/FoundField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { FIELD_OF, unknownOf } from '../field/turn.ts';
import { UnknownToggle } from '../field/UnknownToggle.tsx';
import { useMeterText, useSelectedMeter } from '../meter.ts';

interface Props {
  readonly unknown: UnknownName;
  readonly label: string;
  /** The name in full, for the button. */
  readonly name: string;
}

export function Unknown({ unknown, label, name }: Props) {
  const found = unknownOf(useMeterText('find')) === unknown;
  const path = FIELD_OF[unknown];
  const aside = <UnknownToggle unknown={unknown} label={name} pressed={found} />;
  return found ? (
    <Found unknown={unknown} label={label} path={path} aside={aside} />
  ) : (
    <QuantityField path={path} label={label} aside={aside} />
  );
}

interface FoundProps {
  readonly unknown: UnknownName;
  readonly label: string;
  readonly path: string;
  readonly aside: React.ReactNode;
}

function Found({ unknown, label, path, aside }: FoundProps) {
  const selected = useSelectedMeter();
  const sizing = selected?.sizing?.find === unknown ? selected.sizing : undefined;
  const bar = useMeterText('element.kind') === 'averaging-pitot';
  return (
    <FoundField
      label={label}
      path={path}
      value={sizing?.found.value}
      from={sizing?.found.from ?? (bar ? foundFromBar : foundFrom)[unknown]}
      stale={sizing !== undefined && selected?.stale === true}
      aside={aside}
    />
  );
}
