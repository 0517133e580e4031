/** How a log comes to a meter: by the dialog, by a drop on the page, or made as an example. */
import { logWords as words } from '../../words/logs.ts';
import { useCommands, useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useItem } from '../hand.tsx';
import styles from './Log.module.css';

/** The example log has the signal of such a transmitter. */
const useTakesExample = (): boolean =>
  useItem((item) => {
    const { instrument } = (item ?? {}) as { instrument?: { kind?: unknown; signal?: unknown } };
    return instrument?.kind === 'transmitter' && (instrument.signal ?? '4-20 mA') === '4-20 mA';
  });

export function OpenLogButtons({ elsewhere }: { readonly elsewhere: string | undefined }) {
  const commands = useCommands();
  const name = useWorkbench((state) => state.log?.name) ?? '';
  const busy = useWorkbench((state) => state.log?.progress !== undefined);
  const takesExample = useTakesExample();
  return (
    <div className={styles.opening}>
      {elsewhere !== undefined && (
        <p className={styles.elsewhere}>
          {busy ? words.elsewhereBusy(name, elsewhere) : words.elsewhere(name, elsewhere)}
        </p>
      )}
      <p>{words.none}</p>
      <p className={styles.ways}>
        <button type="button" className={buttons.framed} disabled={busy} onClick={() => void commands.openLog()}>
          {words.open}
        </button>
        <span>{words.drop}</span>
      </p>
      {takesExample && (
        <p className={styles.ways}>
          <button
            type="button"
            className={buttons.framed}
            disabled={busy}
            onClick={() => void commands.openExampleLog()}
          >
            {words.example}
          </button>
          <span>{words.exampleNote}</span>
        </p>
      )}
    </div>
  );
}
