import { useAnnouncement } from '@/lib/announce.ts';

/** Reads out what changed where the focus is not. */
export function LiveRegion() {
  const { text, count } = useAnnouncement();
  return (
    <div aria-live="polite" aria-atomic="true" className="sr-only">
      {/* A new key makes the same words be read again. */}
      <span key={count}>{text}</span>
    </div>
  );
}
