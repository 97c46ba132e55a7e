import { setParameter } from '@settlewright/geometry';
import { Button } from '@/components/button.tsx';
import { Measure } from '@/components/measure.tsx';
import { inOtherUnits, showNumber, stepOf, type NumberParameter, type Reading } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoom } from '../store.ts';
import { sayWishes, wishesFor } from '../verdict-words.ts';
import { BandLink } from './band-link.tsx';

interface Props {
  id: string;
  pieceId: string;
  parameter: NumberParameter;
  reading: Reading;
  editing: boolean;
  onTake: (value: number) => void;
}

/** What was read, in both units, and who minds; or what could not be read, with the ways out. */
export function NumberSlip({ id, pieceId, parameter, reading, editing, onTake }: Props) {
  const { style } = useSurroundings();
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
        <p className="text-sm text-ink-2">
          Up and down keys move it{' '}
          <Measure text={showNumber({ ...parameter, key: 'step' }, style, stepOf(parameter, style))} />.{' '}
          <WhoMinds pieceId={pieceId} parameter={parameter} value={reading.value} />
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
      {reading.kind === 'outside' ? (
        <>
          <strong className="block font-medium text-wont">
            {reading.which === 'longest' ? 'Most possible here is ' : 'Least possible here is '}
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
