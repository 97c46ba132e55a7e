import { setParameter, type RoomFor } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { inOtherUnits, showNumber, stepOf, type NumberParameter, type Reading } from '../numbers.ts';
import { usePiece, useSurroundings } from '../room-context.tsx';
import { beyondRoom, limitWord, roomOf, sayBeyond, type BeyondRoom } from '../room-limits.ts';
import { useRoom } from '../store.ts';
import { sayWishes, wishesFor } from '../verdict-words.ts';
import { BandLink } from './band-link.tsx';

interface Props {
  id: string;
  /** The one piece it is about; left out for a number of several. */
  pieceId?: string;
  parameter: NumberParameter;
  reading: Reading;
  editing: boolean;
  /** The room it has, where that is not the room of growing about the middle. */
  room?: RoomFor;
  onTake: (value: number) => void;
}

/** What was read, in both units, and who minds; or what could not be read, with the ways out. */
export function NumberSlip({ id, pieceId, parameter, reading, editing, room, onTake }: Props) {
  const { style } = useSurroundings();
  const document = useRoom((state) => state.document);
  const beyond =
    'value' in reading && pieceId !== undefined
      ? beyondRoom(parameter, reading.value, room ?? roomOf(document, pieceId, parameter.key), style)
      : undefined;
  const offered = (value: number): string => {
    const other = inOtherUnits(parameter, style, value);
    return other ? `${showNumber(parameter, style, value)}, ${other}` : showNumber(parameter, style, value);
  };

  if (reading.kind === 'value') {
    const other = inOtherUnits(parameter, style, reading.value);
    return (
      <div id={id} className="border-l-[3px] border-chalk pl-4">
        <strong className="block text-lg font-medium">
          <Measure text={showNumber(parameter, style, reading.value)} />
          {other && (
            <>
              {' '}
              is <Measure text={other} />
            </>
          )}
        </strong>
        {beyond && (
          <div
            role={editing ? 'alert' : undefined}
            onMouseDown={(event) => event.preventDefault()}
            className="my-1"
          >
            <RoomEnd pieceId={pieceId} parameter={parameter} beyond={beyond} onTake={onTake} />
            {editing && (
              <Button look="word" className="ml-3" onClick={() => onTake(reading.value)}>
                <span>
                  Keep <Measure text={showNumber(parameter, style, reading.value)} />
                </span>
              </Button>
            )}
          </div>
        )}
        <p className="text-sm text-ink-2">
          Up and down keys move it{' '}
          <Measure text={showNumber({ ...parameter, key: 'step' }, style, stepOf(parameter, style))} />.{' '}
          {pieceId !== undefined && (
            <WhoMinds pieceId={pieceId} parameter={parameter} value={reading.value} />
          )}
        </p>
      </div>
    );
  }

  return (
    <div
      id={id}
      role={editing ? 'alert' : undefined}
      // A press on a button here must not end the edit it is about.
      onMouseDown={(event) => event.preventDefault()}
      className="border-l-[3px] border-wont pl-4"
    >
      {reading.kind === 'outside' && beyond ? (
        <RoomEnd pieceId={pieceId} parameter={parameter} beyond={beyond} onTake={onTake} />
      ) : reading.kind === 'outside' ? (
        <>
          <strong className="block font-medium text-wont">
            {limitWord(parameter, reading.which === 'longest' ? 'most' : 'least')} possible is{' '}
            <Measure text={showNumber(parameter, style, reading.limit)} />
          </strong>
          <Button look="word" onClick={() => onTake(reading.limit)}>
            Use it
          </Button>
        </>
      ) : (
        <>
          <strong className="block text-sm font-medium text-wont">{reading.message}</strong>
          {reading.kind === 'ambiguous' && (
            <div className="mt-2 flex flex-wrap gap-2">
              {reading.readings.map((value) => (
                <Button key={value} size="small" onClick={() => onTake(value)}>
                  <Measure text={offered(value)} />
                </Button>
              ))}
            </div>
          )}
        </>
      )}
      <p className="mt-1 text-sm text-ink-2">
        It stays at <Measure text={showNumber(parameter, style)} /> until you choose.
      </p>
    </div>
  );
}

/** The end of the room: how far it goes, what stands there, and the way to take it. */
function RoomEnd({
  pieceId,
  parameter,
  beyond,
  onTake,
}: Pick<Props, 'pieceId' | 'parameter' | 'onTake'> & { beyond: BeyondRoom }) {
  const { style } = useSurroundings();
  const piece = usePiece(pieceId);
  if (!piece) return null;
  return (
    <>
      <strong className="block font-medium">
        {limitWord(parameter, beyond.side)} here is{' '}
        <Measure text={showNumber(parameter, style, beyond.offer)} /> ({sayBeyond(beyond.limit, piece)}).
      </strong>
      <Button look="word" onClick={() => onTake(beyond.offer)}>
        Use it
      </Button>
    </>
  );
}

function WhoMinds({
  pieceId,
  parameter,
  value,
}: {
  pieceId: string;
  parameter: NumberParameter;
  value: number;
}) {
  const { maker, style, detail } = useSurroundings();
  const document = useRoom((state) => state.document);
  if (detail === 'verdicts') return null;
  const at = (wanted: number) => {
    const changed = setParameter(document, pieceId, parameter.key, wanted);
    return changed.ok ? changed.value : undefined;
  };
  const now = at(value);
  if (!now) return null;
  const step = stepOf(parameter, style);
  const wishes = wishesFor(maker.check, now, at(value - step), at(value + step));
  return (
    <>
      {sayWishes(wishes)} <BandLink pieceId={pieceId} parameterKey={parameter.key} />
    </>
  );
}
