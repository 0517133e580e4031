/** Station 1: the section, the rule of the points, and how the probe gets in. */

import { withShape } from '../../../state/plans.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import {
  placeChoices,
  portChoices,
  profileChoices,
  ruleChoices,
  shapeChoices,
  wallChoices,
} from '../../words/surveys.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { UsualChoice } from '../fluid/UsualChoice.tsx';
import { useWriteAll, useWritten } from '../hand.tsx';
import { useMeterText } from '../meter.ts';
import { Station } from '../station/Station.tsx';

export function SectionStation() {
  const shape = useMeterText('section.shape');
  const rule = useMeterText('rule');
  const choose = useShape();
  const single = rule === 'single-point';
  const pattern = rule === 'log-linear' && shape === 'rectangular';
  return (
    <Station number={1} title={words.stations[0]}>
      <ChoiceField path="section.shape" label="Shape" choices={shapeChoices} choose={choose} />
      {shape === 'rectangular' ? (
        <>
          <QuantityField path="section.width" />
          <QuantityField path="section.height" />
          <UsualChoice path="section.ports" label="Ports" choices={portChoices} />
        </>
      ) : (
        <QuantityField path="section.diameter" />
      )}
      <QuantityField path="port" note={<span>{words.fromEnd}</span>} />
      <ChoiceField path="rule" label="Rule" choices={ruleChoices} />
      {single ? <Profile /> : null}
      {!single && !pattern && (
        <>
          <MeterTextField path="lines" label={shape === 'circular' ? 'Diameters' : 'Lines'} decimal />
          <MeterTextField path="pointsPerLine" label="Points on each" decimal />
        </>
      )}
      {pattern && <p>{words.pattern}</p>}
      <UsualChoice path="wallRule" label="Points near the wall" choices={wallChoices} />
    </Station>
  );
}

/** Takes a shape, and in the same step a plan that it has where the one at hand is of the other shape. */
function useShape(): (shape: string) => void {
  const writeAll = useWriteAll();
  const plan = { rule: useWritten('rule'), lines: useWritten('lines'), pointsPerLine: useWritten('pointsPerLine') };
  return (shape) => writeAll(withShape(plan, shape));
}

function Profile() {
  const kind = useMeterText('profile.kind');
  return (
    <>
      <ChoiceField path="profile.kind" choices={profileChoices} />
      {kind !== 'stated' && <ChoiceField path="profile.at" label="Place" choices={placeChoices} />}
      {kind === 'power' && <MeterTextField path="profile.exponent" label="Exponent, usual 7" decimal />}
      {kind === 'stated' && <MeterTextField path="profile.meanOverCentre" label="Mean over centre" decimal />}
    </>
  );
}
