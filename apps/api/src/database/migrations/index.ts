import type { MigrationInterface } from 'typeorm';
import { Accounts1796140800000 } from './1796140800000-accounts';

/** In the order in which they run. What is merged is never changed. */
export const MIGRATIONS: (new () => MigrationInterface)[] = [Accounts1796140800000];
