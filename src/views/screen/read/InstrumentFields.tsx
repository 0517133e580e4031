/** The fields of the instrument: first what it cannot be read without, the rest folded away. */
import {
  fillChoices,
  gaugeChoices,
  instrumentChoices,
  limbChoices,
  meantChoices,
  metalChoices,
  outputChoices,
  scaleChoices,
  signalChoices,
  topChoices,
  instrumentWords as words,
} from '../../words/instruments.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { UsualChoice } from '../fluid/UsualChoice.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import { LiquidField } from './LiquidField.tsx';
import styles from './Read.module.css';

const COLUMNS: readonly string[] = ['u-tube', 'inverted-u-tube', 'well', 'inclined'];

export function InstrumentFields({ kind }: { readonly kind: string }) {
  return (
    <form className={styles.fields} onSubmit={(event) => event.preventDefault()} autoComplete="off">
      <ChoiceField path="instrument.kind" choices={instrumentChoices} open="Pressure difference, as it is shown" />
      {COLUMNS.includes(kind) && <ColumnFields kind={kind} />}
      {kind === 'transmitter' && <TransmitterFields />}
      <LegFields kind={kind} />
      {COLUMNS.includes(kind) && <ScaleFields />}
      {kind === 'transmitter' && <LimitFields />}
      {kind !== 'gauges' && !COLUMNS.includes(kind) && (
        <QuantityField path="instrument.zero" kindPath="instrument.zero.cell" />
      )}
      <SureFields kind={kind} />
    </form>
  );
}

function ColumnFields({ kind }: { readonly kind: string }) {
  const inverted = kind === 'inverted-u-tube';
  return (
    <>
      {inverted ? (
        <LiquidField path="instrument.liquid" choices={topChoices.slice(1)} open={topChoices[0]?.label ?? ''} />
      ) : (
        <LiquidField path="instrument.liquid" choices={gaugeChoices} />
      )}
      <QuantityField path="instrument.temperature" />
      {kind === 'inclined' && <QuantityField path="instrument.angle" />}
      {kind === 'well' && <ChoiceField path="instrument.scale" choices={scaleChoices} />}
      {kind === 'inclined' && (
        <UsualChoice path="instrument.scale" choices={[{ value: 'plain', label: 'Plain' }, ...scaleChoices.slice(1)]} />
      )}
      {(kind === 'well' || kind === 'inclined') && (
        <>
          <QuantityField path="instrument.tube" />
          <QuantityField path="instrument.well" />
        </>
      )}
      <ChoiceField
        path="instrument.high"
        choices={limbChoices}
        open={inverted ? 'Upstream limb, as usual' : 'Downstream limb, as usual'}
      />
      <QuantityField path="instrument.division" />
    </>
  );
}

function TransmitterFields() {
  return (
    <>
      <ChoiceField path="instrument.signal" choices={signalChoices} />
      <UsualChoice path="instrument.output" choices={outputChoices} />
      <QuantityField path="instrument.lower" />
      <QuantityField path="instrument.upper" />
      <QuantityField path="instrument.cutOff" />
    </>
  );
}

function LegFields({ kind }: { readonly kind: string }) {
  return (
    <Fold title={words.legs}>
      <LiquidField path="instrument.above" choices={fillChoices.slice(1)} open={fillChoices[0]?.label ?? ''} />
      <LiquidField path="instrument.aboveDownstream" choices={fillChoices} open={words.sameFilling} />
      {COLUMNS.includes(kind) ? (
        <p className={styles.hint}>{words.legsHint}</p>
      ) : (
        <QuantityField path="instrument.temperature" />
      )}
      <QuantityField path="instrument.rise" />
      {kind === 'gauges' ? (
        <>
          <QuantityField path="instrument.heightUpstream" />
          <QuantityField path="instrument.heightThroat" />
        </>
      ) : (
        <QuantityField path="instrument.drop" />
      )}
    </Fold>
  );
}

function ScaleFields() {
  return (
    <Fold title={words.scale}>
      <QuantityField path="instrument.zero" />
      <ChoiceField path="instrument.scaleMetal" choices={metalChoices} open={words.notStated} />
      <QuantityField path="instrument.scaleTrueAt" />
    </Fold>
  );
}

function LimitFields() {
  const signal = useMeterText('instrument.signal');
  const kindPath = `instrument.limits.${signal === '1-5 V' ? 'voltage' : signal === 'percent' ? 'share' : 'current'}`;
  return (
    <>
      <Fold title={words.limits}>
        {(['failLow', 'low', 'high', 'failHigh'] as const).map((name) => (
          <QuantityField key={name} path={`instrument.limits.${name}`} kindPath={kindPath} />
        ))}
      </Fold>
      <Fold title={words.lowRange}>
        <QuantityField path="instrument.lowRange.lower" />
        <QuantityField path="instrument.lowRange.upper" />
        <QuantityField path="instrument.lowRange.up" />
        <QuantityField path="instrument.lowRange.down" />
        <QuantityField path="instrument.lowRange.zero" />
      </Fold>
    </>
  );
}

function SureFields({ kind }: { readonly kind: string }) {
  const spanned = kind === 'transmitter';
  const names = ['accuracy', 'stability', 'ambient', 'staticPressure', ...(spanned ? ['output'] : []), 'legs'];
  return (
    <Fold title={words.sure}>
      {names.map((name) => (
        <QuantityField
          key={name}
          path={`instrument.uncertainty.${name}`}
          kindPath={spanned ? 'instrument.uncertainty.spanned' : 'instrument.uncertainty.plain'}
        />
      ))}
      {kind === 'inclined' && <QuantityField path="instrument.uncertainty.angle" />}
      <UsualChoice path="instrument.uncertainty.as" choices={meantChoices} />
    </Fold>
  );
}
