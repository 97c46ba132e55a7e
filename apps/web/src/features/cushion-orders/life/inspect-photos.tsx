import { useId } from 'react';
import { announce } from '@/lib/announce.ts';
import { sayProblem } from '@/lib/problem.ts';
import { type Desk, type OrderFile, useAddFile } from './desk.ts';
import { FileInput } from './file-input.tsx';

interface InspectPhotosProps {
  desk: Desk;
  photos: readonly OrderFile[];
  /** The cushion that a new one shows; null is the delivery as a whole. */
  mark: string | null;
  chosen: readonly string[];
  error: string | undefined;
  onChange: (change: (chosen: readonly string[]) => readonly string[]) => void;
}

/** Photographs that go with a sheet: some of those that the order has, and new ones. */
export function InspectPhotos({ desk, photos, mark, chosen, error, onChange }: InspectPhotosProps) {
  const add = useAddFile(desk);
  const id = useId();
  const fault = error ?? (add.error ? sayProblem(add.error) : undefined);
  const send = (file: File) => {
    const known = new Set(photos.map((photo) => photo.id));
    add.mutate(
      { file, cushionMark: mark },
      {
        onSuccess: ({ files }) => {
          const fresh = files.filter((one) => one.type === 'image/jpeg' && one.current && !known.has(one.id));
          onChange((now) => [...now, ...fresh.map((one) => one.id)]);
          announce(`${file.name} added.`);
        },
      },
    );
  };
  return (
    <fieldset aria-describedby={fault ? `${id}-fault` : undefined}>
      <legend className="mb-1 text-sm font-medium">Photographs on the sheet</legend>
      {photos.map((photo) => (
        <label key={photo.id} className="flex min-h-9 items-center gap-2 text-sm">
          <input
            type="checkbox"
            checked={chosen.includes(photo.id)}
            onChange={({ target }) =>
              onChange((now) => (target.checked ? [...now, photo.id] : now.filter((one) => one !== photo.id)))
            }
          />
          {photo.cushionMark ? `${photo.cushionMark}, ${photo.name}` : photo.name}
        </label>
      ))}
      <div className="mt-2">
        <FileInput
          label="Add a photograph"
          accept="image/jpeg,image/png,image/webp"
          busy={add.isPending}
          onPick={send}
        />
      </div>
      {fault && (
        <p id={`${id}-fault`} role="alert" className="text-sm font-medium text-wont">
          {fault}
        </p>
      )}
    </fieldset>
  );
}
