/** The figure that stands in place of the model's, with its unit, and the way back to the model. */
import { overrideWords as words } from '../../words/fluid-forms.ts';
import buttons from '../button.module.css';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useWriteAll } from '../hand.tsx';
import { useMeterText } from '../meter.ts';
import styles from './override.module.css';
import { type Override, overridePath } from './overrides.ts';

interface Props {
  readonly name: Override;
  readonly label: string;
  /** Called when the figure is taken back. */
  readonly cleared?: () => void;
}

export function OverrideField({ name, label, cleared }: Props) {
  const path = overridePath(name);
  const text = useMeterText(path);
  const writeAll = useWriteAll();
  const clear = (): void => {
    if (text !== '') writeAll([[path, undefined]]);
    cleared?.();
  };
  return (
    <div className={styles.field}>
      {name === 'isentropicExponent' ? (
        <MeterTextField path={path} label={words.field(label)} decimal />
      ) : (
        <QuantityField path={path} label={words.field(label)} />
      )}
      <button type="button" className={buttons.word} aria-label={words.clearOf(label)} onClick={clear}>
        {words.clear}
      </button>
    </div>
  );
}
