import { useId } from 'react';

interface FileInputProps {
  label: string;
  /** Kinds of file that are taken. */
  accept: string;
  /** What is taken, in words. */
  about?: string;
  busy: boolean;
  onPick: (file: File) => void;
}

/** Hands over one file at a time; the same one can be picked again. */
export function FileInput({ label, accept, about, busy, onPick }: FileInputProps) {
  const id = useId();
  return (
    <div className="grid gap-1">
      <label htmlFor={id} className="text-sm font-medium">
        {label}
      </label>
      <input
        id={id}
        type="file"
        accept={accept}
        aria-describedby={about ? `${id}-about` : undefined}
        disabled={busy}
        className="w-full text-sm"
        onChange={(event) => {
          const [file] = event.target.files ?? [];
          event.target.value = '';
          if (file) onPick(file);
        }}
      />
      {about && (
        <p id={`${id}-about`} className="text-xs text-ink-2">
          {about}
        </p>
      )}
      {busy && <p className="text-sm text-ink-2">Sending the file…</p>}
    </div>
  );
}
