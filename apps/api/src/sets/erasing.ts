import type { EntityManager } from 'typeorm';

/** Lets this transaction take a person out of issued revisions while the work lasts; nothing else may. */
export async function whileErasing<T>(manager: EntityManager, work: () => Promise<T>): Promise<T> {
  await manager.query("SELECT set_config('settlewright.erasing', 'on', true)");
  const done = await work();
  await manager.query("SELECT set_config('settlewright.erasing', 'off', true)");
  return done;
}
