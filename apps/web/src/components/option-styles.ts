/** The slip a list of choices opens on. */
export const OPTIONS_SLIP =
  'z-50 max-h-80 overflow-auto rounded-md bg-sheet py-1.5 text-ink shadow-slip outline-2 outline-transparent focus-visible:shadow-slip';

/** One choice in it; the one under the pointer or the keys is washed with chalk. */
export const OPTION =
  'flex min-h-10 cursor-pointer items-center gap-2 px-3 py-1.5 text-base select-none data-focus:bg-chalk-wash data-disabled:cursor-default data-disabled:text-ink-3';
