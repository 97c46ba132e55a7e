const RELOADED_KEY = 'settlewright.reloaded-at';
/** A page that fails again so soon is not helped by another reload. */
const ONCE_IN_MS = 5 * 60_000;

/** What browsers, and the loader of styles, say of a part of the app that is no longer on the server. */
const MISSING_PART =
  /failed to fetch dynamically imported module|error loading dynamically imported module|importing a module script failed|unable to preload css/i;

export function isMissingPart(error: unknown): boolean {
  return error instanceof Error && MISSING_PART.test(error.message);
}

type Memory = Pick<Storage, 'getItem' | 'setItem'>;

/** True once, then not again for a while; without a memory never, since a reload could then go on for ever. */
export function takeReload(memory: Memory, nowMs: number): boolean {
  try {
    const last = Number(memory.getItem(RELOADED_KEY) ?? Number.NEGATIVE_INFINITY);
    if (nowMs - last < ONCE_IN_MS) return false;
    memory.setItem(RELOADED_KEY, String(nowMs));
    return true;
  } catch {
    return false;
  }
}

/**
 * Fetches the page anew when a part of it has gone with the version it belonged to. Unsent work waits on
 * this device; a server that does not answer leaves the page as it stands.
 */
export function reloadWhenPartsAreMissing(): void {
  window.addEventListener('vite:preloadError', () => {
    void fetch('/', { cache: 'no-store' }).then(
      (answer) => {
        if (answer.ok && takeReload(window.sessionStorage, Date.now())) window.location.reload();
      },
      () => undefined,
    );
  });
}
