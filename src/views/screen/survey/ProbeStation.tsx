/** Station 2: the probe, and the gauge it is read on. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import { probeChoices } from '../../words/surveys.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import { Station } from '../station/Station.tsx';
import { ManometerFields } from './ManometerFields.tsx';
import { ProbeCalibration } from './ProbeCalibration.tsx';

export function ProbeStation() {
  const head = useMeterText('probe.head');
  return (
    <Station number={2} title={words.stations[1]}>
      <ChoiceField path="probe.kind" label="Probe" choices={probeChoices} />
      <MeterTextField path="probe.coefficient" label="Coefficient" decimal />
      <QuantityField path="probe.head" label="Head diameter" note={head === '' && <span>{words.headNote}</span>} />
      <ManometerFields />
      <Fold title="Stem, hole, angle, calibration">
        <QuantityField path="probe.stem" label="Stem diameter" />
        <QuantityField path="probe.hole" label="Hole diameter" />
        <QuantityField path="probe.alignment" label="Off the axis" />
        <ProbeCalibration />
      </Fold>
    </Station>
  );
}
