import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { AuditEntry } from './entities/audit-entry.entity';

export interface AuditRecord {
  workshopId: string | null;
  /** null: nobody who signed in, as the upholsterer on a private link */
  userId: string | null;
  action: string;
  subjectType: string;
  subjectId: string | null;
  /** no names, no measures, no addresses */
  detail?: Record<string, unknown>;
}

@Injectable()
export class AuditService {
  /** Part of the caller's transaction: what did not happen is not recorded. */
  async record(manager: EntityManager, record: AuditRecord): Promise<void> {
    await manager.save(AuditEntry, manager.create(AuditEntry, { ...record, detail: record.detail ?? null }));
  }
}
