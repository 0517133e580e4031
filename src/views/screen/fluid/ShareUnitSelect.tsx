/** Per cent or plain fractions. */
import { SHARE_UNITS, type ShareUnit } from './share.ts';

interface Props {
  readonly label: string;
  readonly unit: ShareUnit;
  readonly choose: (unit: ShareUnit) => void;
}

export function ShareUnitSelect({ label, unit, choose }: Props) {
  return (
    <select aria-label={label} value={unit} onChange={(event) => choose(event.target.value as ShareUnit)}>
      {SHARE_UNITS.map(({ value, label: words }) => (
        <option key={value} value={value}>
          {words}
        </option>
      ))}
    </select>
  );
}
