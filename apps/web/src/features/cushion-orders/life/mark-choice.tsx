import { Select } from '@/components/select.tsx';

const WHOLE = 'order';

/** Which cushion something is pinned to; null is the order as a whole. */
export function MarkChoice({
  marks,
  mark,
  onChange,
  label = 'About',
}: {
  marks: readonly string[];
  mark: string | null;
  onChange: (mark: string | null) => void;
  label?: string;
}) {
  return (
    <Select
      label={label}
      value={mark ?? WHOLE}
      options={[
        { value: WHOLE, words: 'The order' },
        ...marks.map((value) => ({ value, words: `Cushion ${value}` })),
      ]}
      onChange={(value) => onChange(value === WHOLE ? null : value)}
    />
  );
}
