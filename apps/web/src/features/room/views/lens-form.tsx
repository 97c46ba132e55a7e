import { aimAt, formatLength, frameAnglesDeg, type LensCamera, type NamedView } from '@settlewright/geometry';
import backs from '@settlewright/seed-data/film-backs.json';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { Measure } from '@/components/measure.tsx';
import { entryOf } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { announce } from '@/lib/announce.ts';
import type { RoomAddress } from '../hooks/use-address.ts';
import type { RoomPicture } from '../picture.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { NumberField } from './number-field.tsx';
import { aims, subjectOf } from './subject.ts';
import type { ViewActions } from './use-view-actions.ts';

const USUAL_MM = [18, 25, 35, 50, 85, 135];
const RATIOS = [1.33, 1.66, 1.78, 1.85, 2, 2.39];
const OWN = 'own';
const short = (value: number): string => String(Number(value.toFixed(2)));

interface Props {
  view: NamedView;
  lens: LensCamera;
  picture: RoomPicture;
  address: RoomAddress;
  actions: ViewActions;
}

/** The numbers of a lens: what a camera report holds, and where it stands. */
export default function LensForm({ view, lens, picture, address, actions }: Props) {
  const { canEdit, style } = useSurroundings();
  const store = useRoomStore();
  const change = (part: Partial<LensCamera>, words: string) => actions.changeLens(view, part, words);
  const angles = frameAnglesDeg(lens);
  const subject = subjectOf(lens, picture);
  const targets = aims(picture);
  const back = backs.backs.find(
    ({ widthMm, heightMm }) => widthMm === lens.backMm.width && heightMm === lens.backMm.height,
  );
  const [ownBack, setOwnBack] = useState(back === undefined);
  const [ownRatio, setOwnRatio] = useState(!RATIOS.includes(lens.aspect));
  const asked = picture.document.asked.lensHeightMm;

  return (
    <div className="grid gap-3">
      <p className="text-sm text-ink-2" role="status">
        {angles.width.toFixed(1)}° across, {angles.height.toFixed(1)}° up.{' '}
        {subject ? (
          <>
            In the middle: {subject.name},{' '}
            <Measure text={formatLength(subject.distanceMm, { ...style, feet: true })} /> from the lens.
          </>
        ) : (
          'Nothing stands in the middle of the frame.'
        )}
      </p>
      {canEdit && (
        <>
          <NumberField
            label="Focal length"
            unit="mm"
            value={lens.focalLengthMm}
            min={4}
            max={2000}
            offers={USUAL_MM}
            onCommit={(focalLengthMm) => change({ focalLengthMm }, `focal length ${short(focalLengthMm)} mm`)}
          />
          <Select
            label="Film back"
            value={ownBack || !back ? OWN : back.id}
            options={[
              ...backs.backs.map(({ id, widthMm, heightMm, name }) => ({
                value: id,
                words: `${widthMm.toFixed(1)} × ${heightMm.toFixed(1)} mm`,
                detail: name,
              })),
              { value: OWN, words: 'Another size', detail: 'typed' },
            ]}
            description={
              !ownBack && back
                ? `${back.name}; ${back.source.cite}, ${back.source.mark.toLowerCase()}`
                : undefined
            }
            onChange={(id) => {
              const next = backs.backs.find((candidate) => candidate.id === id);
              setOwnBack(next === undefined);
              if (next) {
                const size = `${next.widthMm.toFixed(1)} × ${next.heightMm.toFixed(1)} mm`;
                change({ backMm: { width: next.widthMm, height: next.heightMm } }, `film back ${size}`);
              }
            }}
          />
          {(ownBack || !back) && (
            <div className="grid grid-cols-2 gap-3">
              {(['width', 'height'] as const).map((side) => (
                <NumberField
                  key={side}
                  label={side === 'width' ? 'Its width' : 'Its height'}
                  unit="mm"
                  value={lens.backMm[side]}
                  min={2}
                  max={200}
                  onCommit={(mm) =>
                    change({ backMm: { ...lens.backMm, [side]: mm } }, `film back ${side} ${mm} mm`)
                  }
                />
              ))}
            </div>
          )}
          <Select
            label="Frame"
            value={ownRatio ? OWN : String(lens.aspect)}
            options={[
              ...RATIOS.map((ratio) => ({ value: String(ratio), words: `${ratio.toFixed(2)} : 1` })),
              { value: OWN, words: 'Another ratio' },
            ]}
            onChange={(value) => {
              setOwnRatio(value === OWN);
              if (value !== OWN) change({ aspect: Number(value) }, `frame ${value} : 1`);
            }}
          />
          {ownRatio && (
            <NumberField
              label="Width over height"
              unit=": 1"
              value={lens.aspect}
              min={0.5}
              max={4}
              onCommit={(aspect) => change({ aspect }, `frame ${short(aspect)} : 1`)}
            />
          )}
          <LensLength
            label="Height above the floor"
            mm={lens.heightMm}
            minMm={0}
            maxMm={10_000}
            onCommit={(heightMm) =>
              change({ heightMm }, `height ${formatLength(heightMm, { ...style, feet: true })}`)
            }
          />
          <LensLength
            label="Across, from the middle to the right"
            mm={lens.at.xMm}
            minMm={-50_000}
            maxMm={50_000}
            onCommit={(xMm) => change({ at: { ...lens.at, xMm } }, 'moved')}
          />
          <LensLength
            label="From the middle to the front"
            mm={lens.at.zMm}
            minMm={-50_000}
            maxMm={50_000}
            onCommit={(zMm) => change({ at: { ...lens.at, zMm } }, 'moved')}
          />
          <div className="grid grid-cols-2 gap-3">
            <NumberField
              label="Turned left"
              unit="°"
              value={lens.turnDeg}
              min={-360}
              max={360}
              onCommit={(turnDeg) => change({ turnDeg }, `turned left ${short(turnDeg)}°`)}
            />
            <NumberField
              label="Tilted up"
              unit="°"
              value={lens.tiltDeg}
              min={-89}
              max={89}
              onCommit={(tiltDeg) => change({ tiltDeg }, `tilted up ${short(tiltDeg)}°`)}
            />
          </div>
          {targets.length > 0 && (
            <Select
              label="Aim at"
              value=""
              options={targets.map(({ id, name }) => ({ value: id, words: name }))}
              onChange={(id) => {
                const target = targets.find((candidate) => candidate.id === id);
                if (target) change(aimAt(lens, target.at), `aimed at ${target.name}`);
              }}
            />
          )}
        </>
      )}
      <p className="flex flex-wrap gap-x-4">
        {address.throughNamed ? (
          <Button look="word" onClick={() => address.show('D')}>
            Show it on the plan
          </Button>
        ) : (
          <Button
            look="word"
            onClick={() => address.showNamed({ id: view.id, clientView: view.shown.clientView })}
          >
            Look through it
          </Button>
        )}
        {canEdit && asked !== lens.heightMm && (
          <Button
            look="word"
            className="text-left"
            onClick={() => {
              const { document, commit } = store.getState();
              const step = `Height of the lens asked for: ${formatLength(lens.heightMm, { ...style, feet: true })}`;
              commit({ ...document, asked: { ...document.asked, lensHeightMm: lens.heightMm } }, step);
              announce(step);
            }}
          >
            Check eyes and heads against this height
          </Button>
        )}
      </p>
    </div>
  );
}

/** A length that is taken on leaving the field. */
function LensLength({
  mm,
  onCommit,
  ...field
}: {
  label: string;
  mm: number;
  minMm: number;
  maxMm: number;
  onCommit: (mm: number) => void;
}) {
  const [entry, setEntry] = useState(entryOf(mm));
  const [kept, setKept] = useState(mm);
  if (kept !== mm) {
    setKept(mm);
    setEntry(entryOf(mm));
  }
  return (
    <LengthField
      {...field}
      feet
      entry={entry}
      onChange={setEntry}
      error={entry.problem}
      onBlur={() => {
        if (entry.value !== null && entry.problem === undefined && entry.value !== mm) onCommit(entry.value);
      }}
    />
  );
}
