import { Button } from '@/components/button.tsx';
import { FoamNumberField } from '@/components/foam-number-field.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf } from '@/components/quantity-entry.ts';
import { TextField } from '@/components/text-field.tsx';
import type { LayerEntry } from './foam-entry.ts';

const MOST = 4;
const BLANK: LayerEntry = {
  name: '',
  thicknessMm: entryOf(null),
  densityKgM3: entryOf(null),
  ifd25N: entryOf(null),
};

interface FoamLayersProps {
  layers: LayerEntry[];
  onChange: (layers: LayerEntry[]) => void;
}

/** Layers of a laminated foam, from the top down. */
export function FoamLayers({ layers, onChange }: FoamLayersProps) {
  const change = (index: number, part: Partial<LayerEntry>) =>
    onChange(layers.map((layer, i) => (i === index ? { ...layer, ...part } : layer)));
  return (
    <div className="grid gap-3 phone:col-span-2">
      {layers.map((layer, index) => (
        <fieldset
          key={index}
          className="grid items-start gap-x-4 gap-y-2 border-t border-rule pt-2 phone:grid-cols-2"
        >
          <legend className="text-sm font-medium">
            Layer {index + 1}
            {index === 0 && ', on top'}
          </legend>
          <TextField
            label="What it is"
            value={layer.name}
            onChange={(event) => change(index, { name: event.target.value })}
          />
          <LengthField
            label="Thickness of the layer"
            entry={layer.thicknessMm}
            onChange={(thicknessMm) => change(index, { thicknessMm })}
            minMm={3}
            maxMm={250}
            error={layer.thicknessMm.problem}
          />
          <FoamNumberField
            what="density"
            label="Density of the layer"
            entry={layer.densityKgM3}
            onChange={(densityKgM3) => change(index, { densityKgM3 })}
            min={10}
            max={200}
          />
          <FoamNumberField
            what="firmness"
            label="Firmness of the layer"
            entry={layer.ifd25N}
            onChange={(ifd25N) => change(index, { ifd25N })}
            min={20}
            max={600}
          />
          <div>
            <Button look="word" onClick={() => onChange(layers.filter((_, i) => i !== index))}>
              Take layer {index + 1} out
            </Button>
          </div>
        </fieldset>
      ))}
      {layers.length < MOST && (
        <div>
          <Button look="word" onClick={() => onChange([...layers, BLANK])}>
            {layers.length === 0 ? 'It is made of layers' : 'One more layer below'}
          </Button>
        </div>
      )}
    </div>
  );
}
