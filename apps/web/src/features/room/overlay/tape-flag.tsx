import type { LengthStyle, TapeLine } from '@settlewright/geometry';
import { useId, useLayoutEffect, useRef, useState } from 'react';
import { classNames } from '@/components/class-names.ts';
import { Measure } from '@/components/measure.tsx';
import { NumberInput } from '../components/number-input.tsx';
import { NumberSlip } from '../components/number-slip.tsx';
import { numbersOf } from '../components/piece-numbers.ts';
import { useChangeNumber } from '../hooks/use-change-number.ts';
import { useNumberEdit } from '../hooks/use-number-edit.ts';
import type { NumberParameter } from '../numbers.ts';
import { usePiece, useSurroundings } from '../room-context.tsx';
import { sayTape, showTape, tapeTone } from './tape-words.ts';

interface Props {
  tape: TapeLine;
  style: LengthStyle;
  litCellId: string | null;
  selectedPieceId: string | undefined;
  onOpenCell: (cellId: string) => void;
  onLayout: () => void;
}

const REST = {
  chalk: 'border-chalk text-chalk hover:bg-chalk-wash',
  ink: 'border-ink text-ink',
  fits: 'border-fits text-fits hover:bg-fits-wash',
  tight: 'border-tight text-tight hover:bg-tight-wash',
  wont: 'border-wont text-wont hover:bg-wont-wash',
  unknown: 'border-unknown text-unknown hover:bg-unknown-wash',
};
const LIT = {
  chalk: 'border-chalk bg-chalk text-on-chalk',
  ink: 'border-ink bg-ink text-paper',
  fits: 'border-fits bg-fits text-paper',
  tight: 'border-tight bg-tight text-paper',
  wont: 'border-wont bg-wont text-paper',
  unknown: 'border-unknown bg-unknown text-paper',
};
const FLAG = 'rounded-sm border-[1.25px] px-2 text-[0.84rem] leading-[1.35rem] whitespace-nowrap';

/** The flag of a tape: a number to edit, or the gap of a check to open. */
export function TapeFlag(props: Props) {
  const { tape } = props;
  const piece = usePiece(tape.pieceId);
  const { canEdit } = useSurroundings();
  const parameter = piece && tape.parameterKey ? numbersOf(piece).get(tape.parameterKey) : undefined;
  if (tape.kind === 'dimension' && canEdit && piece && parameter) {
    return <EditableFlag {...props} pieceId={piece.id} parameter={parameter} />;
  }
  return <PlainFlag {...props} />;
}

function PlainFlag({ tape, style, litCellId, onOpenCell }: Props) {
  const { detail } = useSurroundings();
  const lit = tape.cellId !== undefined && tape.cellId === litCellId;
  const tone = tapeTone(tape);
  const look = classNames(FLAG, lit ? LIT[tone] : classNames('bg-sheet', REST[tone]));
  const words = (
    <>
      {tape.name}{' '}
      <strong className="font-semibold">
        <Measure text={showTape(tape, style, detail)} />
      </strong>
    </>
  );
  const { cellId } = tape;
  if (cellId === undefined) {
    return (
      <span role="img" aria-label={sayTape(tape, style, detail)} className={classNames('block', look)}>
        {words}
      </span>
    );
  }
  return (
    <button
      type="button"
      aria-label={`${sayTape(tape, style, detail)}, open the check`}
      onClick={() => onOpenCell(cellId)}
      className={classNames('quick reach block', look)}
    >
      {words}
    </button>
  );
}

function EditableFlag({
  tape,
  style,
  pieceId,
  parameter,
  onLayout,
}: Props & { pieceId: string; parameter: NumberParameter }) {
  const { detail } = useSurroundings();
  const change = useChangeNumber(pieceId, parameter);
  const field = useRef<HTMLInputElement>(null);
  const button = useRef<HTMLButtonElement>(null);
  const [back, setBack] = useState(false);
  const edit = useNumberEdit(parameter, style, change, { left: () => setBack(true) });
  const slipId = useId();
  const selectAll = useRef(true);
  const slip = useRef<HTMLDivElement>(null);

  function begin(text?: string) {
    selectAll.current = text === undefined;
    edit.begin(text);
  }

  useLayoutEffect(() => {
    if (edit.editing) {
      field.current?.focus();
      if (selectAll.current) field.current?.select();
    } else if (back) button.current?.focus({ preventScroll: true });
    onLayout();
    if (slip.current) keepOnSheet(slip.current);
  }, [edit.editing, back, onLayout]);

  if (!edit.editing) {
    return (
      <button
        ref={button}
        type="button"
        aria-label={`${sayTape(tape, style, detail)}, edit`}
        onClick={() => begin()}
        onBlur={() => setBack(false)}
        onKeyDown={(event) => {
          if (/^[0-9.]$/.test(event.key) && !event.ctrlKey && !event.metaKey && !event.altKey) {
            event.preventDefault();
            event.stopPropagation();
            begin(event.key);
          } else if (event.key === 'F2') begin();
          else if (event.key.startsWith('Arrow')) {
            event.stopPropagation();
            edit.keys(event);
          }
        }}
        className={classNames('quick reach block bg-sheet', FLAG, REST.chalk)}
      >
        {tape.name}{' '}
        <strong className="font-semibold">
          <Measure text={showTape(tape, style, detail)} />
        </strong>
      </button>
    );
  }
  const wrong = edit.reading.kind !== 'value';
  return (
    <div
      className={classNames(
        'relative flex items-center',
        FLAG,
        wrong ? 'border-wont bg-wont-wash' : LIT.chalk,
      )}
    >
      <span aria-hidden="true">{tape.name}&nbsp;</span>
      <NumberInput
        ref={field}
        edit={edit}
        label={parameter.label}
        slipId={slipId}
        style={{ width: `${Math.max(4, edit.text.length + 1)}ch` }}
        className="bg-transparent text-center font-semibold outline-2 outline-transparent focus-visible:shadow-none"
      />
      <div
        ref={slip}
        className="absolute top-full left-1/2 z-20 mt-2 w-64 rounded-md bg-sheet p-3 whitespace-normal text-ink shadow-slip"
      >
        <NumberSlip
          id={slipId}
          pieceId={pieceId}
          parameter={parameter}
          reading={edit.reading}
          editing
          onTake={edit.take}
        />
      </div>
    </div>
  );
}

/** Centres the slip under its flag, moved as far as it takes to stay on the sheet. */
function keepOnSheet(slip: HTMLElement) {
  slip.style.transform = 'translateX(-50%)';
  const sheet = slip.closest('[data-overlay]')?.getBoundingClientRect();
  if (!sheet) return;
  const box = slip.getBoundingClientRect();
  const aside = Math.max(0, sheet.left + 4 - box.left) - Math.max(0, box.right + 4 - sheet.right);
  const flag = slip.parentElement?.offsetHeight ?? 0;
  const above = box.bottom > sheet.bottom ? -(box.height + flag + 16) : 0;
  slip.style.transform = `translate(calc(-50% + ${aside}px), ${above}px)`;
}
