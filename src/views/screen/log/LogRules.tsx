/** What holds for the rows of a log as a whole: zone, how they follow each other, what stands in for what is missing. */
import type { PresentedLook } from '../../present/log-model.ts';
import { delimiterChoices, interpretations, logFields, logWords as words } from '../../words/logs.ts';
import { useWorkbench } from '../binding.tsx';
import { QuantityBox } from '../field/QuantityField.tsx';
import { TextField } from '../field/TextField.tsx';
import { CheckField } from '../fluid/CheckField.tsx';
import { useWrite } from '../hand.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import styles from './Log.module.css';
import { LogChoice } from './LogChoice.tsx';
import { useLogProblem } from './useLog.ts';

export function LogRules({ look: { assumed, zoned } }: { readonly look: PresentedLook }) {
  const zoneNote = assumed.includes('zone') && !zoned ? logFields.zoneAssumed : logFields.zoneNote;
  return (
    <div className={styles.columns}>
      <h3>{words.rules}</h3>
      <div className={styles.fields}>
        <LogText path="log.zone" label={logFields.zone} note={zoned ? logFields.zoneOwn : zoneNote} />
        <LogChoice
          path="log.interpretation"
          label={logFields.interpretation}
          choices={interpretations}
          note={assumed.includes('interpretation') ? logFields.interpretationAssumed : ''}
        />
        <LogText path="log.maxGap" label={logFields.maxGap} note={logFields.maxGapNote} />
        <LogQuantity path="log.cutOff" label={logFields.cutOff} />
        <LogQuantity path="log.fallback.pressure" label={logFields.fallbackPressure} />
        <LogQuantity path="log.fallback.temperature" label={logFields.fallbackTemperature} />
      </div>
      <Fold title={words.more}>
        <div className={styles.fields}>
          <LogText path="log.dayStart" label={logFields.dayStart} />
          <LogText path="log.frozen" label={logFields.frozen} decimal />
          <LogText path="log.spike" label={logFields.spike} decimal />
          <LogChoice path="log.delimiter" label={logFields.delimiter} choices={delimiterChoices} note="" />
        </div>
        <CheckField path="log.exact" />
        <p className={styles.note}>{logFields.exactNote}</p>
      </Fold>
    </div>
  );
}

interface FieldProps {
  readonly path: string;
  readonly label: string;
}

interface TextProps extends FieldProps {
  readonly note?: string;
  readonly decimal?: boolean;
}

function LogText({ path, label, note = '', decimal = false }: TextProps) {
  const text = useMeterText(path);
  const problem = useLogProblem(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  return (
    <div>
      <TextField {...{ path, label, text, problem, decimal, settle }} write={(next) => write(path, next)} />
      {note !== '' && <p className={styles.note}>{note}</p>}
    </div>
  );
}

function LogQuantity({ path, label }: FieldProps) {
  const text = useMeterText(path);
  const problem = useLogProblem(path);
  const write = useWrite();
  return <QuantityBox {...{ path, label, text, problem }} write={(next) => write(path, next)} />;
}
