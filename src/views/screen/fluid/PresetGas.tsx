/** Typical gases to start from, in one step of undo. */
import { gasPresets } from '../../../core/document/gas-presets.table.ts';
import { compositionWords as words } from '../../words/fluid-forms.ts';
import { presetLabel } from '../../words/fluids.ts';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { useWriteAll } from '../hand.tsx';
import { inUnit } from './composition.ts';

const ID = 'preset-gas';

export function PresetGas() {
  const writeAll = useWriteAll();
  const take = (name: string): void => {
    const preset = gasPresets.find((candidate) => candidate.name === name);
    if (preset === undefined) return;
    writeAll([
      ['fluid.composition', inUnit(preset.composition, '%')],
      ['fluid.basis', undefined], // they are mole fractions, as is what stands where nothing is said
    ]);
  };
  return (
    <Frame id={ID} label={words.preset} note={words.presetNote}>
      <div className={box.box}>
        <select id={ID} className={box.select} value="" onChange={(event) => take(event.target.value)}>
          <option value="">{words.presetChoice}</option>
          {gasPresets.map(({ name }) => (
            <option key={name} value={name}>
              {presetLabel(name)}
            </option>
          ))}
        </select>
      </div>
    </Frame>
  );
}
