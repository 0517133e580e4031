/** Station 3: what flows in the duct, at which pressure and temperature. */
import { fluidChoices } from '../../words/fluids.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { BaseState } from '../fluid/BaseState.tsx';
import { FluidFields } from '../fluid/FluidFields.tsx';
import { LostOverrides } from '../fluid/LostOverrides.tsx';
import { Station } from '../station/Station.tsx';
import { useSelectedSurvey } from './selected.ts';

export function DuctStation() {
  const survey = useSelectedSurvey()?.survey;
  return (
    <Station number={3} title={words.stations[2]}>
      <ChoiceField path="fluid.kind" choices={fluidChoices} />
      <FluidFields />
      <LostOverrides state={survey?.state} />
      <QuantityField path="state.pressure" label="Static pressure" />
      <QuantityField path="state.temperature" label="Temperature" />
      {survey?.results.some(({ id }) => id === 'baseVolumeFlow') && <BaseState />}
    </Station>
  );
}
