import { FOAM_PRESETS, foamGradeSchema, type FoamGrade } from '@settlewright/geometry';
import { useState } from 'react';
import { toast } from 'sonner';
import { Button } from '@/components/button.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { FoamNumberField } from '@/components/foam-number-field.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import { useSaveCushionSettings, type KeptCushionSettings } from '@/lib/cushion-settings.ts';
import { sayProblem } from '@/lib/problem.ts';
import { FoamLayers } from './foam-layers.tsx';
import type { FoamEntry } from './foam-entry.ts';
import { entryOfFoam, foamOfEntry } from './foam-entry.ts';

const USES = [
  { value: 'seat', words: 'Seats' },
  { value: 'back', words: 'Backs' },
  { value: 'either', words: 'Either' },
] as const;

function blank(): FoamGrade {
  const { source: _, ...first } = FOAM_PRESETS[0]!;
  return { ...first, name: '' };
}

interface FoamDialogProps {
  workshopId: string;
  kept: KeptCushionSettings;
  /** Which of the workshop's foams; null for a new one. */
  index: number | null;
  onClose: () => void;
}

/** One foam of the shop. */
export function FoamDialog({ workshopId, kept, index, onClose }: FoamDialogProps) {
  const { foams } = kept.settings;
  const entry = index === null ? undefined : foams[index];
  const save = useSaveCushionSettings(workshopId);
  const [typed, setTyped] = useState<FoamEntry>(() => entryOfFoam(entry ?? blank()));
  const [problem, setProblem] = useState<string | null>(null);
  const set = (change: Partial<FoamEntry>) => setTyped((all) => ({ ...all, ...change }));

  const store = (next: FoamGrade[], words: string) =>
    save.mutate(
      { baseNumber: kept.number, settings: { ...kept.settings, foams: next } },
      {
        onSuccess: () => {
          toast(words);
          onClose();
        },
        onError: (error) => setProblem(sayProblem(error)),
      },
    );

  const submit = () => {
    const foam = foamOfEntry(typed);
    const read = foamGradeSchema.safeParse(foam);
    if (!read.success) {
      setProblem('A field is empty or cannot be read; look at each.');
      return;
    }
    const others = foams.filter((_, i) => i !== index);
    if (others.some(({ name }) => name.toLowerCase() === read.data.name.toLowerCase())) {
      setProblem(`There is a foam “${read.data.name}” already.`);
      return;
    }
    setProblem(null);
    const next =
      index === null ? [...foams, read.data] : foams.map((one, i) => (i === index ? read.data : one));
    store(next, `${read.data.name} saved.`);
  };

  return (
    <FormDialog
      open
      onClose={onClose}
      title={entry ? entry.name : 'Add a foam'}
      verb={entry ? 'Save' : 'Add'}
      busyWords="Saving"
      busy={save.isPending}
      problem={problem}
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <div className="grid items-start gap-4 phone:grid-cols-2">
        <TextField
          label="Name of the grade"
          className="phone:col-span-2"
          value={typed.name}
          onChange={(event) => set({ name: event.target.value })}
        />
        <Select label="For" options={USES} value={typed.use} onChange={(use) => set({ use })} />
        <LengthField
          label="Thickness"
          entry={typed.thicknessMm}
          onChange={(thicknessMm) => set({ thicknessMm })}
          minMm={5}
          maxMm={250}
          error={typed.thicknessMm.problem}
        />
        <FoamNumberField
          what="density"
          label="Density"
          description="How long it lasts."
          entry={typed.densityKgM3}
          onChange={(densityKgM3) => set({ densityKgM3 })}
          min={10}
          max={200}
        />
        <FoamNumberField
          what="firmness"
          label="Firmness"
          description="25 % IFD: how it feels."
          entry={typed.ifd25N}
          onChange={(ifd25N) => set({ ifd25N })}
          min={20}
          max={600}
        />
        <FoamNumberField
          what="factor"
          label="Support factor"
          description="Force at 65 % over force at 25 %."
          entry={typed.supportFactor}
          onChange={(supportFactor) => set({ supportFactor })}
          min={1.2}
          max={4}
        />
        <LengthField
          label="Wrap, both faces"
          entry={typed.wrapMm}
          onChange={(wrapMm) => set({ wrapMm })}
          minMm={0}
          maxMm={60}
          description="Bonded polyester, over the thickness; nothing for none."
          error={typed.wrapMm.problem}
        />
        <FoamLayers layers={typed.layers} onChange={(layers) => set({ layers })} />
      </div>
      {entry && (
        <div className="mt-4">
          <Button
            look="word"
            busy={save.isPending}
            onClick={() =>
              store(
                foams.filter((_, i) => i !== index),
                `${entry.name} removed.`,
              )
            }
          >
            Remove it from the foams of the shop
          </Button>
        </div>
      )}
    </FormDialog>
  );
}
