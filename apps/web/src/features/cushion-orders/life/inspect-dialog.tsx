import type { CushionSpec } from '@settlewright/geometry';
import { useState } from 'react';
import { ChoiceGroup } from '@/components/choice-group.tsx';
import { FormDialog } from '@/components/dialog.tsx';
import { LengthField } from '@/components/length-field.tsx';
import { MarkTag } from '@/components/mark-tag.tsx';
import { Measure } from '@/components/measure.tsx';
import { entryOf, type QuantityEntry } from '@/components/quantity-entry.ts';
import { TextArea, TextField } from '@/components/text-field.tsx';
import { useFormat } from '@/lib/format.ts';
import { type Desk, type Inspection, type OrderFile, useLifeStep } from './desk.ts';
import { InspectPhotos } from './inspect-photos.tsx';
import { refusalOf } from './refusal.ts';

/** Fields of the form as the server names them. */
const FIELDS = /^(note|photoIds|cushions\.\d+\.(widthMm|depthMm|thicknessMm|note))$/;

const SIZES = ['widthMm', 'depthMm', 'thicknessMm'] as const;
type Size = (typeof SIZES)[number];
const WORDS: Record<Size, string> = { widthMm: 'width', depthMm: 'depth', thicknessMm: 'thickness' };

interface Row {
  sizes: Record<Size, QuantityEntry>;
  note: string;
}
const BLANK: Row = {
  sizes: { widthMm: entryOf(null), depthMm: entryOf(null), thicknessMm: entryOf(null) },
  note: '',
};

interface InspectDialogProps {
  desk: Desk;
  kind: Inspection['kind'];
  cushions: readonly CushionSpec[];
  files: readonly OrderFile[];
  onClose: () => void;
}

/** Finished sizes as measured, cushion by cushion; what is left empty counts as not measured. */
export function InspectDialog({ desk, kind, cushions, files, onClose }: InspectDialogProps) {
  const format = useFormat();
  const step = useLifeStep(desk);
  const asked = kind === 'first-article' ? cushions.slice(0, 1) : cushions;
  const [mark, setMark] = useState(asked[0]?.mark ?? '');
  const [rows, setRows] = useState<Record<string, Row>>({});
  const [outcome, setOutcome] = useState<Inspection['outcome']>('accepted');
  const [note, setNote] = useState('');
  const [photoIds, setPhotoIds] = useState<readonly string[]>([]);
  const photos = files.filter(({ type, current }) => current && type === 'image/jpeg');
  const shown = kind === 'first-article' ? cushions.filter((one) => one.mark === mark) : cushions;
  const change = (of: string, more: Partial<Row>) =>
    setRows({ ...rows, [of]: { ...(rows[of] ?? BLANK), ...more } });
  const thing = kind === 'first-article' ? 'first article' : 'delivery';
  const unread = shown.some((one) => SIZES.some((size) => rows[one.mark]?.sizes[size].problem !== undefined));
  const refused = refusalOf(step.error, (path) => FIELDS.test(path));
  const faultOf = (index: number, field: string) => refused.at[`cushions.${index}.${field}`];
  return (
    <FormDialog
      open
      onClose={onClose}
      wide
      title={`Inspect the ${thing}`}
      describe="Measure seam to seam. The sheet goes to the upholsterer by mail and stands on the page."
      verb={outcome === 'accepted' ? `Accept the ${thing}` : `Reject the ${thing}`}
      busy={step.isPending}
      problem={refused.whole}
      onSubmit={(event) => {
        event.preventDefault();
        if (unread) return;
        const measured = shown.map((one) => {
          const row = rows[one.mark] ?? BLANK;
          const sizes = Object.fromEntries(SIZES.map((size) => [size, row.sizes[size].value]));
          return { mark: one.mark, ...sizes, note: row.note };
        });
        step.mutate(
          { step: 'inspections', body: { kind, outcome, note, photoIds, cushions: measured } },
          { onSuccess: onClose },
        );
      }}
    >
      <div className="grid gap-5">
        {kind === 'first-article' && cushions.length > 1 && (
          <label className="text-sm font-medium">
            Which cushion was made first
            <select
              className="ml-3 min-h-11 rounded-sm border border-rule-strong bg-paper px-3"
              value={mark}
              onChange={(event) => setMark(event.target.value)}
            >
              {cushions.map((one) => (
                <option key={one.mark}>{one.mark}</option>
              ))}
            </select>
          </label>
        )}
        {shown.map((one, index) => {
          const row = rows[one.mark] ?? BLANK;
          return (
            <fieldset key={one.mark} className="ruled pt-3">
              <legend className="sr-only">Cushion {one.mark}</legend>
              <p className="mb-2 flex items-center gap-2 text-sm">
                <MarkTag timber="cushion" mark={one.mark} />
                asked <Measure text={SIZES.map((size) => format.length(one.finishedMm[size])).join(' × ')} />
              </p>
              <div className="grid gap-3 phone:grid-cols-2 tablet:grid-cols-4">
                {SIZES.map((size) => (
                  <LengthField
                    key={size}
                    label={`${one.mark}, ${WORDS[size]}`}
                    entry={row.sizes[size]}
                    minMm={1}
                    maxMm={10_000}
                    error={row.sizes[size].problem ?? faultOf(index, size)}
                    onChange={(entry) => change(one.mark, { sizes: { ...row.sizes, [size]: entry } })}
                  />
                ))}
                <TextField
                  label={`${one.mark}, note`}
                  optional
                  maxLength={500}
                  value={row.note}
                  error={faultOf(index, 'note')}
                  onChange={(event) => change(one.mark, { note: event.target.value })}
                />
              </div>
            </fieldset>
          );
        })}
        <InspectPhotos
          desk={desk}
          photos={photos}
          mark={kind === 'first-article' ? mark : null}
          chosen={photoIds}
          error={refused.at.photoIds}
          onChange={setPhotoIds}
        />
        <ChoiceGroup
          label="Outcome"
          value={outcome}
          columns={2}
          onChange={setOutcome}
          choices={[
            { value: 'accepted', words: 'Accepted' },
            { value: 'rejected', words: 'Rejected' },
          ]}
        />
        <TextArea
          label="Note"
          optional
          maxLength={2000}
          description="Asked for when something is rejected, out, or was not measured."
          error={refused.at.note}
          value={note}
          onChange={(event) => setNote(event.target.value)}
        />
      </div>
    </FormDialog>
  );
}
