/** A liquid by its name, or by the user's own table of figures. */
import { choiceWords } from '../../words/fluid-forms.ts';
import { concentrationChoices, viscosityRuleChoices } from '../../words/fluids.ts';
import { liquidNamed } from '../../words/liquids.ts';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import { LiquidName, useOwnTable } from './LiquidName.tsx';
import { LIQUID_TABLE } from './liquid-columns.ts';
import { PetroleumFields } from './PetroleumFields.tsx';
import { RowsEditor } from './RowsEditor.tsx';
import { ShareField } from './ShareField.tsx';
import { UsualChoice } from './UsualChoice.tsx';

export function LiquidFields() {
  const name = useMeterText('fluid.name');
  const own = useOwnTable();
  const needs = liquidNamed(name)?.needs;
  const written = useMeterText('fluid.concentration') !== '';
  const dissolved = needs === 'concentration' || needs === 'concentration-and-basis' || written;
  return (
    <>
      <LiquidName own={own} />
      {dissolved && <ShareField path="fluid.concentration" />}
      {needs === 'concentration-and-basis' && (
        <UsualChoice path="fluid.concentrationBasis" choices={concentrationChoices} />
      )}
      {needs === 'petroleum' && <PetroleumFields />}
      {own.chosen && <RowsEditor path="fluid.table" columns={LIQUID_TABLE} />}
      {own.chosen && <UsualChoice path="fluid.viscosityRule" choices={viscosityRuleChoices} />}
      <Fold title={choiceWords.ownFigures}>
        {needs !== 'petroleum' && <QuantityField path="fluid.viscosity" label="Viscosity" />}
        <QuantityField path="fluid.vapourPressure" />
        <QuantityField path="fluid.bulkModulus" />
        <QuantityField path="fluid.baseDensity" label="Base density" />
      </Fold>
    </>
  );
}
