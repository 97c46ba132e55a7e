import { parametersOf, setParameter, type Parameter, type Piece } from '@settlewright/geometry';
import { useId, useState } from 'react';
import { Dialog } from '@/components/dialog.tsx';
import { FIELD_LINE, FieldFrame } from '@/components/field-frame.tsx';
import { Measure } from '@/components/measure.tsx';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import { useChangeNumber } from '../hooks/use-change-number.ts';
import { useNumberEdit } from '../hooks/use-number-edit.ts';
import type { PieceActions } from '../hooks/use-piece-actions.ts';
import { inOtherUnits, showNumber, type NumberParameter } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { useRoomStore } from '../store.ts';
import { NumberSlip } from './number-slip.tsx';

interface Props {
  piece: Piece;
  actions: PieceActions;
  onClose: () => void;
}

/** Every number and choice of a piece as a plain form: the twin of the sentence and the tapes. */
export default function NumbersDialog({ piece, actions, onClose }: Props) {
  const { canEdit } = useSurroundings();
  const parameters = parametersOf(piece);
  const groups = [
    { title: 'In the sentence', items: parameters.filter((parameter) => parameter.group === 'main') },
    { title: 'Changed less often', items: parameters.filter((parameter) => parameter.group === 'more') },
  ];
  return (
    <Dialog open onClose={onClose} wide title={`All numbers of ${piece.mark}`}>
      <div className="grid gap-6">
        {canEdit && (
          <TextField
            key={piece.name}
            label="Name"
            defaultValue={piece.name}
            maxLength={80}
            onBlur={(event) => actions.rename(piece, event.target.value)}
          />
        )}
        {groups.map(({ title, items }) => (
          <fieldset key={title} className="ruled pt-2">
            <legend className="sr-only">{title}</legend>
            <p aria-hidden="true" className="mb-3 text-sm font-medium text-ink-2">
              {title}
            </p>
            <div className="grid gap-x-8 gap-y-5 phone:grid-cols-2 tablet:grid-cols-3">
              {items.map((parameter) => (
                <ParameterField key={parameter.key} piece={piece} parameter={parameter} actions={actions} />
              ))}
            </div>
          </fieldset>
        ))}
        {canEdit && <WhereItStands piece={piece} actions={actions} />}
      </div>
    </Dialog>
  );
}

function ParameterField({
  piece,
  parameter,
  actions,
}: {
  piece: Piece;
  parameter: Parameter;
  actions: PieceActions;
}) {
  const { canEdit } = useSurroundings();
  const store = useRoomStore();
  if (typeof parameter.value === 'number') {
    return <NumberField pieceId={piece.id} parameter={{ ...parameter, value: parameter.value }} />;
  }
  const options = parameter.choices?.map((choice) => ({ value: choice.value, words: choice.label })) ?? [];
  return (
    <Select
      label={parameter.label}
      description={parameter.describes}
      value={parameter.value}
      options={options}
      disabled={!canEdit}
      onChange={(value) => {
        const changed = setParameter(store.getState().document, piece.id, parameter.key, value);
        const words = options.find((option) => option.value === value)?.words ?? value;
        if (changed.ok) {
          actions.replace(changed.value, `${piece.mark} ${parameter.label.toLowerCase()}: ${words}`);
        }
      }}
    />
  );
}

function NumberField({ pieceId, parameter }: { pieceId: string; parameter: NumberParameter }) {
  const { style, canEdit } = useSurroundings();
  const change = useChangeNumber(pieceId, parameter);
  const edit = useNumberEdit(parameter, style, change);
  const slipId = useId();
  const other = inOtherUnits(parameter, style);
  return (
    <FieldFrame
      label={parameter.label}
      description={
        <>
          {parameter.describes}
          {other && (
            <>
              . <Measure text={other} />
            </>
          )}
        </>
      }
    >
      {(control) => (
        <>
          <input
            {...control}
            aria-describedby={`${control['aria-describedby'] ?? ''} ${slipId}`.trim()}
            aria-invalid={edit.reading.kind !== 'value' || undefined}
            disabled={!canEdit}
            value={edit.editing ? edit.text : showNumber(parameter, style)}
            onFocus={(event) => {
              edit.begin();
              const field = event.currentTarget;
              requestAnimationFrame(() => field.select());
            }}
            onChange={(event) => edit.type(event.target.value)}
            onKeyDown={edit.keys}
            onBlur={(event) => {
              if (event.relatedTarget?.closest(`#${CSS.escape(slipId)}`)) return;
              if (!edit.finish()) edit.cancel();
            }}
            autoComplete="off"
            className={`${FIELD_LINE} h-11 font-semibold`}
          />
          {edit.editing && (
            <div className="mt-2">
              <NumberSlip
                id={slipId}
                pieceId={pieceId}
                parameter={parameter}
                reading={edit.reading}
                editing
                onTake={edit.take}
              />
            </div>
          )}
        </>
      )}
    </FieldFrame>
  );
}

const POSITIONS = [
  {
    key: 'xMm',
    label: 'Left to right',
    kind: 'length',
    describes: 'middle of the piece from the origin of the plan',
  },
  {
    key: 'zMm',
    label: 'Back to front',
    kind: 'length',
    describes: 'its rear line from the origin of the plan',
  },
  {
    key: 'turnDeg',
    label: 'Turned',
    kind: 'angle',
    describes: 'anticlockwise from above; 0 faces the aisle',
  },
] as const;

/** Where the piece stands, as numbers: the twin of dragging it. */
function WhereItStands({ piece, actions }: { piece: Piece; actions: PieceActions }) {
  return (
    <fieldset className="ruled pt-2" disabled={piece.locked}>
      <legend className="sr-only">Where it stands</legend>
      <p aria-hidden="true" className="mb-3 text-sm font-medium text-ink-2">
        {piece.locked ? 'Where it stands: locked' : 'Where it stands'}
      </p>
      <div className="grid gap-x-8 gap-y-5 phone:grid-cols-2 tablet:grid-cols-3">
        {POSITIONS.map((position) => (
          <PositionField key={position.key} piece={piece} position={position} actions={actions} />
        ))}
      </div>
    </fieldset>
  );
}

interface PositionProps {
  piece: Piece;
  position: (typeof POSITIONS)[number];
  actions: PieceActions;
}

function PositionField({ piece, position, actions }: PositionProps) {
  const { style } = useSurroundings();
  const [refusal, setRefusal] = useState<string>();
  const reach = position.kind === 'angle' ? 360 : 50_000;
  const parameter: NumberParameter = {
    ...position,
    unit: position.kind === 'angle' ? 'deg' : 'mm',
    min: -reach,
    max: reach,
    value: piece.at[position.key],
  };
  const edit = useNumberEdit(parameter, style, {
    preview: () => undefined,
    commit: (value) => {
      actions.place(piece, { [position.key]: value });
      return undefined;
    },
  });
  return (
    <TextField
      label={position.label}
      description={position.describes}
      error={refusal}
      disabled={piece.locked}
      value={edit.editing ? edit.text : showNumber(parameter, style)}
      onFocus={() => edit.begin()}
      onChange={(event) => {
        setRefusal(undefined);
        edit.type(event.target.value);
      }}
      onKeyDown={edit.keys}
      onBlur={() => {
        if (edit.finish()) return;
        setRefusal('message' in edit.reading ? edit.reading.message : 'That lies outside the plan.');
        edit.cancel();
      }}
    />
  );
}
