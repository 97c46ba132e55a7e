import { DIRECTION_WORDS, NAP_WORDS } from '@settlewright/geometry';
import { Select } from '@/components/select.tsx';
import { TextField } from '@/components/text-field.tsx';
import type { Covered, PartChoice } from './cloth-draft.ts';
import { ClothLength, type ClothFieldsProps } from './cloth-length.tsx';
import { OwnClothFields } from './own-cloth-fields.tsx';

const sentence = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
const optionsOf = <T extends string>(words: Record<T, string>) =>
  (Object.keys(words) as T[]).map((value) => ({ value, words: sentence(words[value]) }));

const COVERED: Record<Covered, string> = {
  all: 'every cushion',
  seat: 'the seats',
  back: 'the backs',
  marks: 'some, by mark',
};
const PARTS: Record<PartChoice, string> = {
  whole: 'the whole cover',
  'no-welt': 'all but the welt',
  'no-faces': 'all but the faces',
  'no-edges': 'all but the edges',
  faces: 'the faces only',
  edges: 'the edges only',
  welt: 'the welt only',
};

/** All that is said of one cloth. */
export function ClothFields({ per, ...form }: ClothFieldsProps) {
  const { draft, faults, onChange } = form;
  return (
    <div className="grid gap-4 phone:grid-cols-2">
      <TextField
        label="Name"
        value={draft.name}
        maxLength={120}
        error={faults.name}
        onChange={(event) => onChange({ name: event.target.value })}
      />
      <ClothLength {...form} at="width" path="widthMm" range={[300, 3500]} label="Width of the roll" />
      <Select
        label="Lies"
        value={draft.direction}
        options={optionsOf(DIRECTION_WORDS)}
        error={faults.direction}
        onChange={(direction) => onChange({ direction })}
      />
      <Select
        label="Nap"
        value={draft.nap}
        options={optionsOf(NAP_WORDS)}
        onChange={(nap) => onChange({ nap })}
      />
      <ClothLength
        {...form}
        {...{ at: 'along', path: 'repeatMm.alongMm', range: [0, 2000] }}
        label="Vertical repeat"
        description="Along the roll; 0 for a plain cloth."
      />
      <ClothLength
        {...form}
        {...{ at: 'across', path: 'repeatMm.acrossMm', range: [0, 2000] }}
        label="Horizontal repeat"
        description="Across the roll."
      />
      <Select
        label="Pattern centered on"
        value={draft.controlLine}
        options={optionsOf({ cushion: 'each cushion', run: 'the run of cushions' })}
        onChange={(controlLine) => onChange({ controlLine })}
      />
      <ClothLength
        {...form}
        {...{ at: 'start', path: 'startMm', range: [0, 5000] }}
        label="Left out for flaws"
        description="At the start of the roll, for flaws and for centering."
      />
      <ClothLength {...form} at="selvedge" path="selvedgeMm" range={[0, 100]} label="Selvedge, each edge" />
      <ClothLength {...form} at="step" path="stepMm" range={[1, 5000]} label="Bought in steps of" />
      <TextField
        label={`Price of a ${per}`}
        optional
        inputMode="decimal"
        description="Yours alone: the upholsterer does not see it."
        value={draft.price}
        error={faults.pricePerMetreMinor}
        onChange={(event) => onChange({ price: event.target.value })}
      />
      <TextField
        label="Currency"
        value={draft.currency}
        maxLength={3}
        error={faults.currency}
        onChange={(event) => onChange({ currency: event.target.value })}
      />
      <Select
        label="Covers"
        value={draft.covered}
        options={optionsOf(COVERED)}
        error={draft.covered === 'marks' ? undefined : faults.cushionMarks}
        onChange={(covered) => onChange({ covered })}
      />
      <Select
        label="Cut from it"
        value={draft.parts}
        options={optionsOf(PARTS)}
        description="For welt or edges in contrast, say one cloth for all but these and another for them."
        onChange={(parts) => onChange({ parts })}
      />
      {draft.covered === 'marks' && (
        <TextField
          label="Marks"
          description="Such as C1, C2."
          value={draft.marks}
          error={faults.cushionMarks}
          onChange={(event) => onChange({ marks: event.target.value })}
        />
      )}
      <OwnClothFields {...form} />
    </div>
  );
}
