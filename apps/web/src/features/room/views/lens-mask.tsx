import type { FrameBox } from './lens-frame.ts';

/** The frame of a lens on the sheet; what lies outside it is dimmed. */
export function LensMask({ box }: { box: FrameBox }) {
  return (
    <div aria-hidden="true" className="pointer-events-none absolute inset-0 overflow-hidden" data-lens-frame>
      <div
        className="absolute border-[1.5px] border-ink shadow-[0_0_0_4000px_color-mix(in_srgb,var(--color-paper)_70%,transparent)]"
        style={{ left: box.left, top: box.top, width: box.width, height: box.height }}
      />
    </div>
  );
}
