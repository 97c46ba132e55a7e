import { TextArea, TextField } from '@/components/text-field.tsx';
import { ClothLength, type ClothFieldsProps } from './cloth-length.tsx';

/** What was seen of a cloth that the workshop sends in. */
export function OwnClothFields(form: Omit<ClothFieldsProps, 'per'>) {
  const { draft, faults, onChange } = form;
  return (
    <>
      <label className="flex min-h-11 items-center gap-3 phone:col-span-2">
        <input
          type="checkbox"
          className="size-4"
          checked={draft.own}
          onChange={(event) => onChange({ own: event.target.checked })}
        />
        Our own cloth, sent in
      </label>
      {draft.own && (
        <>
          <ClothLength
            {...form}
            {...{ at: 'measured', path: 'com.measuredWidthMm', range: [300, 3500] }}
            label="Width as measured"
            description="Goes before the width above."
          />
          <ClothLength
            {...form}
            {...{ at: 'received', path: 'com.receivedMm', range: [0, 1_000_000] }}
            label="Length that came"
          />
          <TextField
            label="Dye lot"
            value={draft.dyeLot}
            maxLength={60}
            error={faults['com.dyeLot']}
            onChange={(event) => onChange({ dyeLot: event.target.value })}
          />
          <TextField
            label="Came on"
            type="date"
            value={draft.receivedOn}
            error={faults['com.receivedOn']}
            onChange={(event) => onChange({ receivedOn: event.target.value })}
          />
          <TextArea
            label="Flaws noted"
            className="phone:col-span-2"
            value={draft.flaws}
            maxLength={1000}
            error={faults['com.flaws']}
            onChange={(event) => onChange({ flaws: event.target.value })}
          />
          <label className="flex min-h-11 items-center gap-3 phone:col-span-2">
            <input
              type="checkbox"
              className="size-4"
              checked={draft.sampleKept}
              onChange={(event) => onChange({ sampleKept: event.target.checked })}
            />
            A sample was kept
          </label>
        </>
      )}
    </>
  );
}
