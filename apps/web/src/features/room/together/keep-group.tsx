import { groupPieces, type Piece } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { Dialog } from '@/components/dialog.tsx';
import { TextField } from '@/components/text-field.tsx';
import { joinWords } from '../choosing-words.ts';
import { useTakeStep } from '../hooks/use-take-step.ts';
import { useRoomStore } from '../store.ts';

/** Gives the chosen pieces a name, so that one press chooses them again. */
export function KeepGroup({ pieces }: { pieces: readonly Piece[] }) {
  const store = useRoomStore();
  const take = useTakeStep();
  const [open, setOpen] = useState(false);
  const [name, setName] = useState('');
  const close = () => {
    setOpen(false);
    setName('');
  };
  return (
    <>
      <Button size="small" onClick={() => setOpen(true)}>
        Keep as a group
      </Button>
      <Dialog
        open={open}
        onClose={close}
        title="Keep as a group"
        describe={`${joinWords(pieces.map(({ mark }) => mark))}: one press in the list chooses them together.`}
      >
        <form
          className="grid gap-4"
          onSubmit={(event) => {
            event.preventDefault();
            const ids = pieces.map(({ id }) => id);
            const { document, groupId } = groupPieces(store.getState().document, name, ids);
            if (groupId === '') return;
            take(document, `Group “${name.trim()}” of ${pieces.length} pieces`);
            close();
          }}
        >
          <TextField
            label="Name of the group"
            maxLength={80}
            value={name}
            onChange={(event) => setName(event.target.value)}
          />
          <div>
            <Button type="submit" look="main" disabled={name.trim() === ''}>
              Keep it
            </Button>
          </div>
        </form>
      </Dialog>
    </>
  );
}
