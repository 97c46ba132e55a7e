import type { ViewDirection } from '@settlewright/geometry';
import { useId, useState } from 'react';
import { LengthField } from '@/components/length-field.tsx';
import { entryOf } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { announce } from '@/lib/announce.ts';
import { useFormat } from '@/lib/format.ts';
import { Toggle } from '../components/toggle.tsx';
import { CUT_WORDS, usualCut } from '../export/views-to-save.ts';
import type { RoomPicture } from '../picture.ts';
import { usePicture, useSurroundings } from '../room-context.tsx';
import type { SceneView } from '../scene/views.ts';
import { keyMovesCut } from './section-keys.ts';
import { firstPlane, type SectionPlane } from './section-plane.ts';
import { sectionRange } from './section-range.ts';
import { cutAt, useSectionPlane } from './section-store.ts';

const DIRECTIONS: readonly { value: ViewDirection; words: string }[] = [
  { value: 'above', words: 'Level, from above' },
  { value: 'front', words: 'Upright, from the front' },
  { value: 'rear', words: 'Upright, from the rear' },
  { value: 'left', words: 'Upright, from the left' },
  { value: 'right', words: 'Upright, from the right' },
];

const wordsOf = (direction: ViewDirection): string =>
  DIRECTIONS.find(({ value }) => value === direction)?.words.toLowerCase() ?? '';

/** The switch that cuts the set. */
export function SectionToggle({ letter }: { letter: SceneView }) {
  const { path } = useSurroundings();
  const { document } = usePicture();
  const plane = useSectionPlane(path.setId);
  const format = useFormat();
  return (
    <Toggle
      on={plane !== undefined}
      onChange={(on) => {
        const next = on ? firstPlane(document, letter) : undefined;
        cutAt(path.setId, next);
        announce(
          next
            ? `The set is cut ${wordsOf(next.direction)}, at ${format.length(next.atMm, { feet: true })}.`
            : 'The set stands whole.',
        );
      }}
    >
      Cut
    </Toggle>
  );
}

/** Where the set is cut: from which side, and how far in. */
export function SectionBar({ picture }: { picture: RoomPicture }) {
  const { path } = useSurroundings();
  const plane = useSectionPlane(path.setId);
  return plane && <SectionFields key={plane.direction} plane={plane} picture={picture} />;
}

function SectionFields({ plane, picture }: { plane: SectionPlane; picture: RoomPicture }) {
  const { path, style } = useSurroundings();
  const format = useFormat();
  const id = useId();
  const [problem, setProblem] = useState<string>();
  const { direction, atMm } = plane;
  const range = sectionRange(picture, direction, style);
  const said = (mm: number) => format.length(mm, { feet: true });
  const move = (mm: number) => cutAt(path.setId, { direction, atMm: mm });
  return (
    <div
      role="group"
      aria-label="Cut through the set"
      className="flex flex-wrap items-start gap-x-5 gap-y-2 border-t border-rule py-1.5 text-sm"
    >
      <div className="w-full phone:w-64">
        <Select
          label="Cut"
          value={direction}
          options={DIRECTIONS}
          onChange={(next) => {
            const at = usualCut(picture.document, next);
            cutAt(path.setId, { direction: next, atMm: at });
            announce(`The set is cut ${wordsOf(next)}, at ${said(at)}.`);
          }}
        />
      </div>
      <div className="min-w-40 flex-1">
        <label htmlFor={id} className="mb-1.5 block text-sm font-medium">
          Move the cut
        </label>
        <input
          id={id}
          type="range"
          min={range.min}
          max={range.max}
          step={range.step}
          value={atMm}
          aria-valuetext={`${said(atMm)}, ${wordsOf(direction)}`}
          onChange={(event) => move(Number(event.target.value))}
          onKeyDown={(event) => {
            const next = keyMovesCut(event.key, atMm, range);
            if (next === undefined) return;
            event.preventDefault();
            move(next);
          }}
          className="h-11 w-full accent-(--color-chalk)"
        />
      </div>
      <div className="min-w-64 flex-1">
        <LengthField
          label={CUT_WORDS[direction]}
          feet
          entry={{ ...entryOf(atMm), problem }}
          onChange={(entry) => {
            setProblem(entry.problem);
            if (entry.problem === undefined && entry.value !== null) move(entry.value);
          }}
          onBlur={() => announce(`The cut is at ${said(atMm)}.`)}
          minMm={range.min}
          maxMm={range.max}
        />
      </div>
    </div>
  );
}
