import {
  MAX_WEAR,
  WEAR_LOOK_WORDS,
  WEAR_LOOKS,
  WEAR_PLACE_WORDS,
  WEAR_PLACES,
  wearMark,
  type WearArea,
  type WearPlace,
} from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import { capital } from '@/lib/capital.ts';
import { TakenLength } from './taken-length.tsx';
import type { Making } from './use-make.ts';

type Rectangle = NonNullable<WearArea['areaMm']>;

const FIRST: WearArea = { place: 'front-edge', look: 'fade' };
/** A rectangle that is easy to see and to move. */
const FIRST_RECTANGLE: Rectangle = {
  fromEnd: 'left',
  fromSideMm: 100,
  fromFrontMm: 100,
  widthMm: 200,
  depthMm: 150,
};
const LOOKS = WEAR_LOOKS.map((value) => ({ value, words: WEAR_LOOK_WORDS[value] }));

const placed = ({ areaMm = FIRST_RECTANGLE, ...area }: WearArea, place: WearPlace): WearArea =>
  place === 'area' ? { ...area, place, areaMm } : { ...area, place };

/** Areas of a cushion that are to look used, numbered as they are hatched on its plan. */
export function WearFields({ spec, choice, choose }: Making) {
  const wear = choice.wear ?? [];
  const set = (areas: WearArea[], words: string) =>
    choose({ wear: areas.length === 0 ? undefined : areas }, words);
  const change = (index: number, area: WearArea) =>
    set(
      wear.map((one, i) => (i === index ? area : one)),
      `marked wear ${wearMark(index)} changed`,
    );
  return (
    <div className="grid gap-4">
      {wear.map((area, index) => (
        <fieldset key={index} className="grid gap-3 border-t border-rule pt-2">
          <legend className="text-sm font-semibold">{wearMark(index)}</legend>
          <div className="grid items-start gap-x-6 gap-y-3 phone:grid-cols-2">
            <Select
              label="Where"
              value={area.place}
              options={WEAR_PLACES.map((value) => ({ value, words: WEAR_PLACE_WORDS[spec.kind][value] }))}
              onChange={(place) => change(index, placed(area, place))}
            />
            <Select
              label="Looks"
              value={area.look}
              options={LOOKS}
              onChange={(look) => change(index, { ...area, look })}
            />
          </div>
          {area.areaMm && (
            <RectangleFields
              rectangle={area.areaMm}
              front={WEAR_PLACE_WORDS[spec.kind]['front-edge']}
              onChange={(areaMm) => change(index, { ...area, areaMm })}
            />
          )}
          <NoteField
            key={area.note}
            note={area.note ?? ''}
            onTake={(note) => change(index, { ...area, note: note === '' ? undefined : note })}
          />
          <p>
            <Button
              look="word"
              onClick={() =>
                set(
                  wear.filter((_, i) => i !== index),
                  `marked wear ${wearMark(index)} taken away`,
                )
              }
            >
              Take {wearMark(index)} away
            </Button>
          </p>
        </fieldset>
      ))}
      {wear.length < MAX_WEAR && (
        <p>
          <Button look="word" onClick={() => set([...wear, FIRST], `marked wear ${wearMark(wear.length)}`)}>
            {wear.length === 0 ? 'Mark an area' : 'Mark another area'}
          </Button>
        </p>
      )}
    </div>
  );
}

interface RectangleFieldsProps {
  rectangle: Rectangle;
  /** What the edge is called that it is measured from. */
  front: string;
  onChange: (rectangle: Rectangle) => void;
}

function RectangleFields({ rectangle, front, onChange }: RectangleFieldsProps) {
  const lengths = [
    ['widthMm', 'Wide', 5, 12000],
    ['depthMm', 'Deep', 5, 2500],
    ['fromSideMm', 'From that end', 0, 12000],
    ['fromFrontMm', `From the ${front}`, 0, 2500],
  ] as const;
  return (
    <div className="grid items-start gap-x-6 gap-y-3 phone:grid-cols-2">
      <Select
        label="Measured from the sitter’s"
        value={rectangle.fromEnd}
        options={(['left', 'right'] as const).map((value) => ({ value, words: capital(value) }))}
        onChange={(fromEnd) => onChange({ ...rectangle, fromEnd })}
      />
      {lengths.map(([key, label, minMm, maxMm]) => (
        <TakenLength
          key={key}
          label={label}
          valueMm={rectangle[key]}
          minMm={minMm}
          maxMm={maxMm}
          onTake={(mm) => onChange({ ...rectangle, [key]: mm })}
        />
      ))}
    </div>
  );
}

/** A note that is taken when the field is left: one undoable step. */
function NoteField({ note, onTake }: { note: string; onTake: (note: string) => void }) {
  return (
    <TextField
      label="Note"
      optional
      maxLength={200}
      defaultValue={note}
      onBlur={(event) => {
        const text = event.target.value.trim();
        if (text !== note) onTake(text);
      }}
    />
  );
}
