/** An oil: its density at a reference temperature, and its viscosity at one temperature or along a line. */
import { choiceWords, tableWords } from '../../words/fluid-forms.ts';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useWritten } from '../hand.tsx';
import { Fold } from '../station/Fold.tsx';
import { OIL_VISCOSITIES } from './liquid-columns.ts';
import { OneOf } from './OneOf.tsx';
import { RowsEditor } from './RowsEditor.tsx';

const API = 'fluid.apiGravity';
const DENSITIES = ['fluid.densityAt15', 'fluid.densityAt60F', API] as const;
const VISCOSITIES = 'fluid.viscosities';

export function PetroleumFields() {
  const along = useWritten(VISCOSITIES) !== undefined;
  return (
    <>
      <OneOf id="oil-density" label={choiceWords.oilDensity} paths={DENSITIES}>
        {(path) =>
          path === API ? <MeterTextField key={path} path={path} decimal /> : <QuantityField key={path} path={path} />
        }
      </OneOf>
      <QuantityField path="fluid.viscosity" label="Viscosity" />
      <Fold title={tableWords.viscosities} open={along}>
        <RowsEditor path={VISCOSITIES} columns={OIL_VISCOSITIES} />
      </Fold>
    </>
  );
}
