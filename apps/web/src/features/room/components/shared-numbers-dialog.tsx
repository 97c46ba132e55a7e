import type { Piece } from '@settlewright/geometry';
import { useId } from 'react';
import { Dialog } from '@/components/dialog.tsx';
import { FIELD_LINE, FieldFrame } from '@/components/field-frame.tsx';
import { Measure } from '@/components/measure.tsx';
import { joinWords } from '../choosing-words.ts';
import { useNumberEdit } from '../hooks/use-number-edit.ts';
import { KIND_WORDS } from '../hooks/use-piece-actions.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { showNumber } from '../numbers.ts';
import { useSurroundings } from '../room-context.tsx';
import { setShared, sharedNumbers, type SharedNumber } from '../shared-numbers.ts';
import { useRoomStore } from '../store.ts';
import { NumberSlip } from './number-slip.tsx';

interface Props {
  pieces: readonly Piece[];
  open: boolean;
  onClose: () => void;
}

/** The numbers of several pieces of one kind: each is set for all of them at once. */
export function SharedNumbersDialog({ pieces, open, onClose }: Props) {
  const numbers = sharedNumbers(pieces);
  const marks = joinWords(pieces.map(({ mark }) => mark));
  return (
    <Dialog
      open={open}
      onClose={onClose}
      wide
      title={`Numbers of ${marks}`}
      describe="What is typed is set for all of them. Where they differ, the field says from where to where."
    >
      {(['main', 'more'] as const).map((group) => (
        <fieldset key={group} className="ruled mb-6 pt-2">
          <legend className="sr-only">{group === 'main' ? 'In the sentence' : 'Changed less often'}</legend>
          <div className="mt-2 grid gap-x-8 gap-y-5 phone:grid-cols-2 tablet:grid-cols-3">
            {numbers
              .filter((number) => number.group === group)
              .map((number) => (
                <SharedField key={number.parameter.key} pieces={pieces} number={number} />
              ))}
          </div>
        </fieldset>
      ))}
    </Dialog>
  );
}

function SharedField({ pieces, number }: { pieces: readonly Piece[]; number: SharedNumber }) {
  const { style } = useSurroundings();
  const store = useRoomStore();
  const take = useTakeStep();
  const slipId = useId();
  const { parameter, values } = number;
  const differ = values.most - values.least > 1e-9;
  const show = (value: number) => showNumber(parameter, style, value);
  const edit = useNumberEdit(parameter, style, {
    preview: (value) => {
      const { document, showPreview } = store.getState();
      const set = value === null ? undefined : setShared(document, pieces, parameter.key, value);
      showPreview(set && 'document' in set ? set.document : null);
    },
    commit: (value) => {
      const { document, showPreview } = store.getState();
      showPreview(null);
      if (!differ && Math.abs(value - parameter.value) < 1e-9) return undefined;
      const set = setShared(document, pieces, parameter.key, value);
      if ('refusal' in set) return set.refusal;
      const what = `${pieces.length} ${KIND_WORDS[pieces[0]?.kind ?? 'bench']} pieces`;
      take(set.document, `${parameter.label} of ${what} to ${show(value)}`);
      return undefined;
    },
  });
  return (
    <FieldFrame
      label={parameter.label}
      description={
        differ ? (
          <>
            They differ: <Measure text={show(values.least)} /> to <Measure text={show(values.most)} />
          </>
        ) : (
          parameter.describes
        )
      }
    >
      {(control) => (
        <>
          <input
            {...control}
            aria-describedby={`${control['aria-describedby'] ?? ''} ${slipId}`.trim()}
            aria-invalid={(edit.editing && edit.reading.kind !== 'value') || undefined}
            value={edit.editing ? edit.text : differ ? '' : show(parameter.value)}
            placeholder={differ ? 'differ' : undefined}
            onFocus={(event) => {
              // Where they differ nothing stands there: leaving the field as it is sets nothing.
              if (differ) return;
              edit.begin();
              const field = event.currentTarget;
              requestAnimationFrame(() => field.select());
            }}
            onChange={(event) =>
              differ && event.target.value === '' ? edit.cancel() : edit.type(event.target.value)
            }
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
