/** Pressure and temperature upstream; on the saturation line one of them is found from the other. */
import { saturationWords } from '../../words/fluid-forms.ts';
import { temperatureChoices } from '../../words/fluids.ts';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText, useSelectedMeter } from '../meter.ts';
import { UsualChoice } from './UsualChoice.tsx';

export function StateFields() {
  const kind = useMeterText('fluid.kind');
  const phase = useMeterText('fluid.phase');
  const quality = useMeterText('fluid.quality');
  const pressure = useMeterText('upstream.pressure');
  const temperature = useMeterText('upstream.temperature');
  const onLine = kind === 'water' && `${phase}${quality}` !== '' && `${pressure}${temperature}` !== '';
  const note = (text: string) => (onLine && text === '' ? <span>{saturationWords.onLine}</span> : undefined);
  return (
    <>
      <QuantityField path="upstream.pressure" label="Pressure" note={note(pressure)} />
      <QuantityField path="upstream.temperature" label="Temperature" note={note(temperature)} />
      <TemperatureAt kind={kind} />
    </>
  );
}

const AT = 'upstream.temperatureAt';

/** Asked of what changes its temperature as it is throttled; one that is written stays in sight. */
function TemperatureAt({ kind }: { readonly kind: string }) {
  const written = useMeterText(AT) !== '';
  const throttles = useSelectedMeter()?.sizing?.throttles === true;
  if (!written && !throttles && kind !== 'gas' && kind !== 'air') return null;
  return <UsualChoice path={AT} choices={temperatureChoices} />;
}
