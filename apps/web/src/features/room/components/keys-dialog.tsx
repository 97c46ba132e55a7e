import { Dialog } from '@/components/dialog.tsx';
import { chooseSingleKeys, useSingleKeys } from '../hooks/use-shortcuts.ts';
import { Toggle } from './toggle.tsx';

const GROUPS: { title: string; keys: [keys: string, does: string][] }[] = [
  {
    title: 'Anywhere',
    keys: [
      ['Ctrl Z', 'undo the last step'],
      ['Ctrl Shift Z', 'redo it'],
      ['F', 'open or close the fit sheet'],
      ['T', 'take the tape, or put it away'],
      ['U', 'show how small and how large the sitters may be, or hide it'],
      ['A B C D E', 'go to that view'],
      ['?', 'this list'],
    ],
  },
  {
    title: 'On a number',
    keys: [
      ['Enter, F2, a digit', 'edit it'],
      ['Up, Down', 'one step; with Shift eight, with Alt half a step'],
      ['Enter', 'take it and stay'],
      ['Tab', 'take it and go to the next'],
      ['Escape', 'leave it as it was'],
    ],
  },
  {
    title: 'In the drawing',
    keys: [
      ['Arrows', 'move the selected piece one step; with Shift eight'],
      ['Comma, full stop', 'turn it 15° left or right'],
      ['Delete', 'take it out'],
      ['Escape', 'let go of it'],
      ['Alt while dragging', 'do not snap'],
    ],
  },
  {
    title: 'Several pieces',
    keys: [
      ['Shift or Ctrl and a press', 'add a piece to those chosen, or take it out'],
      ['Shift Space, Shift Enter', 'the same, on a row of the list'],
      ['Ctrl A', 'choose all, in the drawing or in the list'],
      ['Arrows, comma, full stop, Delete', 'as for one, in the drawing'],
      ['Ctrl C, Ctrl V', 'copy what is chosen in the drawing, paste it here or in another set'],
    ],
  },
];

/** Every key the room knows, and the switch for those without Ctrl. */
export default function KeysDialog({ open, onClose }: { open: boolean; onClose: () => void }) {
  const on = useSingleKeys((state) => state.on);
  return (
    <Dialog open={open} onClose={onClose} title="Keys" wide>
      <div className="grid gap-x-10 gap-y-6 phone:grid-cols-2">
        {GROUPS.map((group) => (
          <section key={group.title} className="ruled pt-2">
            <h3 className="mb-2 font-semibold">{group.title}</h3>
            <dl className="grid gap-2 text-sm">
              {group.keys.map(([keys, does]) => (
                <div key={keys + does}>
                  <dt className="font-medium">{keys}</dt>
                  <dd className="text-ink-2">{does}</dd>
                </div>
              ))}
            </dl>
          </section>
        ))}
      </div>
      <div className="mt-6 text-sm">
        <Toggle on={on} onChange={chooseSingleKeys}>
          Letters without Ctrl work as keys
        </Toggle>
      </div>
    </Dialog>
  );
}
