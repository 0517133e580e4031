/** The instrument: drawn at the row at hand, and its fields. */
import { Instrument } from '../../drawing/instrument/Instrument.tsx';
import type { PresentedReadings, ReadingRow } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { Panel } from '../panel/Panel.tsx';
import { InstrumentFields } from './InstrumentFields.tsx';
import styles from './Read.module.css';

interface Props {
  readonly kind: string;
  readonly readings: PresentedReadings | undefined;
  readonly row: ReadingRow | undefined;
}

export function InstrumentPanel({ kind, readings, row }: Props) {
  const drawn = row?.drawn ?? readings?.blank;
  const own = readings?.problems.filter(({ field }) => field === 'instrument' || field === 'instrument.limits') ?? [];
  return (
    <Panel id="instrument" title={readings?.instrument ?? words.instrument}>
      {drawn && (
        <div className={styles.picture}>
          <Instrument kind={kind} {...drawn} />
        </div>
      )}
      <InstrumentFields kind={kind} />
      {own.map(({ field, sentence }) => (
        <p key={`${field} ${sentence}`} className={styles.problem}>
          {sentence}
        </p>
      ))}
    </Panel>
  );
}
