import { namedPoints, type MeasureEnd, type MeasuringScene } from '@settlewright/geometry';
import { useMemo } from 'react';
import { Combobox } from '@/components/combobox.tsx';
import { Select } from '@/components/select.tsx';

/** One end as it is being chosen: first the piece, then a point of it or of who sits there. */
export interface ChosenEnd {
  pieceId?: string;
  pointId?: string;
  end?: MeasureEnd;
}

interface Props {
  label: 'From' | 'To';
  scene: MeasuringScene;
  chosen: ChosenEnd;
  onChange: (chosen: ChosenEnd) => void;
}

/** Chooses an end of a measured line by name. */
export function EndFields({ label, scene, chosen, onChange }: Props) {
  const pieces = [...scene.pieces.values()];
  const pieceId = chosen.pieceId ?? pieces[0]?.id ?? '';
  const points = useMemo(() => namedPoints(pieceId, scene), [pieceId, scene]);
  return (
    <fieldset className="grid gap-2">
      <legend className="sr-only">{label}</legend>
      <Select
        label={`${label}, piece`}
        value={pieceId}
        options={pieces.map(({ id, mark, name }) => ({ value: id, words: `${mark} ${name}` }))}
        onChange={(next) => onChange({ pieceId: next })}
      />
      <Combobox
        label={`${label}, point`}
        value={chosen.pointId ?? null}
        choices={points}
        placeholder="corner, edge, knee"
        onChange={(pointId) => {
          const end = points.find(({ id }) => id === pointId)?.end;
          onChange(pointId === null || !end ? { pieceId } : { pieceId, pointId, end });
        }}
      />
    </fieldset>
  );
}
