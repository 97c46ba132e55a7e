import { foamBuild } from '@settlewright/geometry';
import { useState } from 'react';
import { Button } from '@/components/button.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { MassField } from '@/components/mass-field.tsx';
import { Notice } from '@/components/notice.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { Select } from '@/components/select.tsx';
import { TextArea, TextField } from '@/components/text-field.tsx';
import { Problem } from '@/lib/api-client';
import { WEIGHT_KG } from '@/lib/body-limits.ts';
import type { NewTestSit } from '@/lib/contract.ts';
import { useFormat } from '@/lib/format.ts';
import type { CushionedPiece } from '../cushions-make/use-make.ts';
import { useSurroundings } from '../room-context.tsx';
import { useAddTestSit } from './test-sits-api.ts';

const SOMEBODY = '';
const today = (): string => new Date().toLocaleDateString('sv-SE');

/** Somebody sat on just this cushion: who, when, and how far it went down. */
export function TestSitForm({ piece: { seatCushion } }: { piece: CushionedPiece }) {
  const { path, cast } = useSurroundings();
  const { mass } = useFormat();
  const add = useAddTestSit(path);
  const [castId, setCastId] = useState(SOMEBODY);
  const [name, setName] = useState('');
  const [satOn, setSatOn] = useState(today);
  const [weight, setWeight] = useState<QuantityEntry>(entryOf(null));
  const [drop, setDrop] = useState<QuantityEntry>(entryOf(null));
  const [note, setNote] = useState('');
  const [tried, setTried] = useState(false);

  const person = cast.find(({ id }) => id === castId);
  const weighed = person?.weightKg ?? undefined;
  const missing = {
    name: castId === SOMEBODY && name.trim() === '' ? 'Who sat?' : undefined,
    satOn: satOn === '' ? 'On which day?' : undefined,
    weight: weight.problem ?? (weight.value === null && weighed === undefined ? 'How heavy?' : undefined),
    drop: drop.problem ?? (drop.value === null ? 'How far did it go down?' : undefined),
  };
  const told = add.error instanceof Problem ? add.error : undefined;
  const faultAt = (field: string) => told?.fields?.find(({ path: at }) => at === field)?.message;
  const errors: Partial<typeof missing> = tried ? missing : {};

  const send = () => {
    setTried(true);
    if (Object.values(missing).some(Boolean) || add.isPending || drop.value === null) return;
    const sit: NewTestSit = {
      ...(castId === SOMEBODY ? { name: name.trim() } : { castId }),
      ...(weight.value === null ? {} : { weightKg: weight.value }),
      ...(note.trim() === '' ? {} : { note: note.trim() }),
      ...{ satOn, grade: seatCushion.foam.grade, ...foamBuild(seatCushion), measuredMm: drop.value },
    };
    add.mutate(sit, {
      onSuccess: () => {
        setName('');
        setWeight(entryOf(null));
        setDrop(entryOf(null));
        setNote('');
        setTried(false);
      },
    });
  };

  return (
    <form
      className="grid items-start gap-x-6 gap-y-4 phone:grid-cols-2"
      noValidate
      aria-label="Add a test sit"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <Select
        label="Who sat"
        value={castId}
        options={[
          { value: SOMEBODY, words: 'somebody else' },
          ...cast.map((one) => ({ value: one.id, words: one.name })),
        ]}
        onChange={(id) => {
          setCastId(id);
          setWeight(entryOf(null));
        }}
      />
      {castId === SOMEBODY && (
        <TextField
          label="Name"
          value={name}
          maxLength={120}
          error={errors.name ?? faultAt('name')}
          onChange={(event) => setName(event.target.value)}
        />
      )}
      <TextField
        label="Day of the sit"
        type="date"
        value={satOn}
        max={today()}
        error={errors.satOn ?? faultAt('satOn')}
        onChange={(event) => setSatOn(event.target.value)}
      />
      <MassField
        key={castId}
        label="Weight then"
        optional={weighed !== undefined}
        description={
          weighed === undefined ? 'Seen by owner and designers alone.' : `${mass(weighed)} in the cast.`
        }
        entry={weight}
        onChange={setWeight}
        minKg={WEIGHT_KG.min}
        maxKg={WEIGHT_KG.max}
        error={errors.weight ?? faultAt('weightKg')}
      />
      <LengthField
        label="It went down"
        description="Top of the cushion at the front edge, before and under the sitter."
        entry={drop}
        onChange={setDrop}
        minMm={1}
        maxMm={250}
        error={errors.drop ?? faultAt('measuredMm')}
      />
      <TextArea
        label="Note"
        optional
        rows={2}
        value={note}
        maxLength={1000}
        error={faultAt('note')}
        onChange={(event) => setNote(event.target.value)}
      />
      <p className="flex flex-wrap items-center gap-3 phone:col-span-2">
        <Button type="submit" busy={add.isPending} busyWords="Keeping it">
          Keep this sit
        </Button>
      </p>
      {add.isError && (
        <Notice tone="wont" className="phone:col-span-2">
          It was not kept: {add.error.message}
        </Notice>
      )}
    </form>
  );
}
